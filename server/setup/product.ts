import { fileURLToPath } from 'node:url';
import type { Config } from '../config';
import { readConfig } from '../config';
import { openApp } from '../index';
import { buildPages } from './build-pages';
import { DEMO_ACCOUNTS } from './demo/accounts';
import { clearHalfLoadedDemo } from './demo/half-loaded';
import { loadDemoWhereEmpty } from './demo/load-where-empty';
import { asListenFailure, portTaken } from './listen-failure';
import { isPortFree } from './mariadb/ports';
import { startPrivateMariadb } from './mariadb/private-mariadb';
import { migrate } from './migrate';
import { keptSessionSecret } from './session-secret';
import { SetupFailure } from './setup-failure';

export const ROOT = fileURLToPath(new URL('../../', import.meta.url));

type Environment = Readonly<Record<string, string | undefined>>;

export interface ProductOptions {
  readonly env: Environment;
  /** Whether this process serves the built pages; in development Vite serves them. */
  readonly withPages: boolean;
  readonly onProgress: (line: string) => void;
  /** Called when the private database ends without being told to. */
  readonly onLost: () => void;
  /** Called with each thing that must be closed again, as soon as it is open. */
  readonly onOpened: (close: () => Promise<void>) => void;
}

export interface Product {
  readonly url: string;
  readonly config: Config;
}

/**
 * Brings the whole product up: database, tables, pages, app, and the demo where there is nobody yet.
 *
 * @throws SetupFailure saying which step failed; what was opened until then has been given to `onOpened`.
 */
export async function startProduct({ env, withPages, onProgress, onLost, onOpened }: ProductOptions): Promise<Product> {
  const settings = checkSettings(env);
  let databaseUrl = env.DATABASE_URL;
  let migrationUrl = env.MIGRATION_DATABASE_URL ?? databaseUrl;
  if (databaseUrl === undefined || migrationUrl === undefined) {
    const database = await startPrivateMariadb({ folder: settings.dataDir, onProgress, onLost });
    onOpened(database.stop);
    databaseUrl = database.appUrl;
    migrationUrl = database.migrationUrl;
    await clearHalfLoadedDemo(settings.dataDir, migrationUrl);
  }
  await checkPort(settings);
  if (withPages) await buildPages(ROOT, onProgress);
  await migrate(migrationUrl, onProgress);
  const config = { ...settings, databaseUrl };
  const app = await openApp(config, { demoAccounts: DEMO_ACCOUNTS, ...(!withPages && { pagesDir: null }) });
  onOpened(app.close);
  if (config.mode === 'demo') await loadDemoWhereEmpty(app.deps, onProgress);
  const url = await app.listen().catch((error: unknown) => {
    throw asListenFailure(error, config);
  });
  return { url, config };
}

/** The settings, with a stand-in for the address of a database that is yet to be started. */
function checkSettings(env: Environment): Config {
  const withDatabase = { ...env, DATABASE_URL: env.DATABASE_URL ?? 'mariadb://private' };
  try {
    const { dataDir } = readConfig({ ...withDatabase, SESSION_SECRET: env.SESSION_SECRET ?? 'x'.repeat(32) });
    return readConfig({ ...withDatabase, SESSION_SECRET: env.SESSION_SECRET ?? keptSessionSecret(dataDir) });
  } catch (error) {
    throw new SetupFailure(error instanceof Error ? error.message : String(error), '');
  }
}

async function checkPort({ port, host }: Config): Promise<void> {
  if (port === 0 || host !== '127.0.0.1' || (await isPortFree(port))) return;
  throw portTaken(port);
}
