import { isIP } from 'node:net';
import { z } from 'zod';

const MEBIBYTE = 1024 * 1024;
const GIBIBYTE = 1024 * MEBIBYTE;

/** Limits that a test or an operator can set; each has its unit in its name. */
const limitsSchema = z.object({
  /** Failed sign-ins that one account may have within the window. */
  SIGN_IN_PER_ACCOUNT: z.coerce.number().int().positive().default(10),
  /** Failed sign-ins that one address may have within the window. */
  SIGN_IN_PER_ADDRESS: z.coerce.number().int().positive().default(60),
  SIGN_UP_PER_ADDRESS: z.coerce.number().int().positive().default(20),
  RATE_WINDOW_MS: z.coerce.number().int().positive().default(15 * 60_000),
  /** Originals that all members of a studio may keep in it together. */
  STUDIO_QUOTA_BYTES: z.coerce.number().int().positive().default(20 * GIBIBYTE),
  /** Originals that one account may keep, in whatever studios. */
  ACCOUNT_QUOTA_BYTES: z.coerce.number().int().positive().default(40 * GIBIBYTE),
  /** Uploads are refused while the data folder's disk has less than this free. */
  FREE_DISK_BYTES: z.coerce.number().int().nonnegative().default(512 * MEBIBYTE),
});

const NAMED_NETWORKS = ['loopback', 'linklocal', 'uniquelocal'];

/** Whether Express's `trust proxy` takes it: a name, an address, or an address with the length of its subnet's prefix. */
function isNetwork(text: string): boolean {
  if (NAMED_NETWORKS.includes(text)) return true;
  const [address = '', bits = '1', ...rest] = text.split('/');
  const longest = { 0: 0, 4: 32, 6: 128 }[isIP(address)] ?? 0;
  return rest.length === 0 && /^\d+$/.test(bits) && Number(bits) >= 1 && Number(bits) <= longest;
}

const envSchema = limitsSchema.extend({
  DATABASE_URL: z.url({ protocol: /^(mariadb|mysql)$/ }),
  PORT: z.coerce.number().int().min(0).max(65_535).default(3000),
  HOST: z.string().min(1).default('127.0.0.1'),
  PAIRLEAF_MODE: z.enum(['demo', 'production']).default('demo'),
  DATA_DIR: z.string().min(1).default('.data'),
  /** Addresses or subnets of the proxies in front, comma separated; `loopback` and `uniquelocal` work too. */
  TRUSTED_PROXIES: z
    .string()
    .default('')
    .transform((list) => list.split(',').map((part) => part.trim()).filter((part) => part !== ''))
    .pipe(z.array(z.string().refine(isNetwork, 'give an address such as 10.0.0.2, a subnet such as 10.0.0.0/8, or loopback'))),
  /** Signs the session cookie; setup keeps a random one under `.data`. */
  SESSION_SECRET: z.string().min(32),
  LOG_LEVEL: z.enum(['fatal', 'error', 'warn', 'info', 'debug', 'silent']).default('warn'),
});

export type Mode = 'demo' | 'production';

export interface Limits {
  readonly signInPerAccount: number;
  readonly signInPerAddress: number;
  readonly signUpPerAddress: number;
  readonly rateWindowMs: number;
  readonly studioQuotaBytes: number;
  readonly accountQuotaBytes: number;
  readonly freeDiskBytes: number;
}

export interface Config {
  readonly databaseUrl: string;
  readonly port: number;
  readonly host: string;
  readonly mode: Mode;
  /** Folder of originals, derived pictures and exports. */
  readonly dataDir: string;
  readonly trustedProxies: readonly string[];
  readonly sessionSecret: string;
  readonly logLevel: z.infer<typeof envSchema>['LOG_LEVEL'];
  readonly limits: Limits;
}

/** Only the machine itself can reach these. */
const isLoopback = (host: string): boolean => host === 'localhost' || host === '::1' || (isIP(host) === 4 && host.startsWith('127.'));

/**
 * Settings from the environment; the only place that reads it.
 *
 * @throws Error naming every variable that does not fit, and when demo mode is asked to listen on a public address.
 */
export function readConfig(env: Readonly<Record<string, string | undefined>> = process.env): Config {
  const parsed = envSchema.safeParse(env);
  if (!parsed.success) {
    const lines = parsed.error.issues.map((issue) => `  ${issue.path.join('.')}: ${issue.message}`);
    throw new Error(`The settings do not fit. Correct these environment variables and start again:\n${lines.join('\n')}`);
  }
  const values = parsed.data;
  if (values.PAIRLEAF_MODE === 'demo' && !isLoopback(values.HOST)) {
    throw new Error(
      `Demo mode has accounts with known passwords, so it listens on this machine only, not on ${values.HOST}. ` +
        'Leave HOST out, or set PAIRLEAF_MODE=production.',
    );
  }
  return {
    databaseUrl: values.DATABASE_URL,
    port: values.PORT,
    host: values.HOST,
    mode: values.PAIRLEAF_MODE,
    dataDir: values.DATA_DIR,
    trustedProxies: values.TRUSTED_PROXIES,
    sessionSecret: values.SESSION_SECRET,
    logLevel: values.LOG_LEVEL,
    limits: {
      signInPerAccount: values.SIGN_IN_PER_ACCOUNT,
      signInPerAddress: values.SIGN_IN_PER_ADDRESS,
      signUpPerAddress: values.SIGN_UP_PER_ADDRESS,
      rateWindowMs: values.RATE_WINDOW_MS,
      studioQuotaBytes: values.STUDIO_QUOTA_BYTES,
      accountQuotaBytes: values.ACCOUNT_QUOTA_BYTES,
      freeDiskBytes: values.FREE_DISK_BYTES,
    },
  };
}
