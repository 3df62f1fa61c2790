import type { ChildProcess } from 'node:child_process';
import { spawn } from 'node:child_process';
import { once } from 'node:events';
import { mkdtemp, readFile, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { setTimeout as sleep } from 'node:timers/promises';
import { findFreePort } from '#server/setup/mariadb/ports';

const ROOT = fileURLToPath(new URL('../../', import.meta.url));
/** The first start makes a database and loads the demo's pictures; two cores may be busy with other tests. */
const READY_WAIT_MS = 150_000;
const STOP_WAIT_MS = 40_000;

/** The whole product in a process of its own, with a database and files of its own. */
export interface AppProcess {
  readonly url: string;
  readonly dataDir: string;
  readonly pid: number;
  /** What it has printed so far. */
  output(): string;
  /** As Ctrl-C does it; resolves to the exit code. */
  interrupt(): Promise<number | null>;
  /** As a power cut does it: app and database are gone at once. */
  kill(): Promise<void>;
  /** Stops it and removes its data. */
  remove(): Promise<void>;
}

export interface AppOptions {
  /** A data folder to go on with, from an earlier process. */
  readonly dataDir?: string;
  readonly env?: Readonly<Record<string, string>>;
}

/**
 * Starts the product as `npm start` does, on a free port, and waits until it says that it is ready.
 *
 * @throws Error with all that it printed, when it ends or takes too long.
 */
export async function startApp({ dataDir, env = {} }: AppOptions = {}): Promise<AppProcess> {
  const folder = dataDir ?? (await mkdtemp(join(tmpdir(), 'pairleaf-app-')));
  const port = await findFreePort();
  const child = spawn(process.execPath, ['--import', 'tsx', 'server/setup/start.ts'], {
    cwd: ROOT,
    env: { ...withoutTestRunner(process.env), PORT: String(port), DATA_DIR: folder, ...env },
    stdio: ['ignore', 'pipe', 'pipe'],
  });
  let output = '';
  for (const stream of [child.stdout, child.stderr]) stream.on('data', (chunk: Buffer) => (output += chunk.toString()));
  await waitUntilReady(child, () => output);

  const end = async (signal: NodeJS.Signals): Promise<number | null> => {
    if (child.exitCode === null && child.signalCode === null) {
      const exit = once(child, 'exit');
      child.kill(signal);
      const late = sleep(STOP_WAIT_MS, 'late' as const, { ref: false });
      if ((await Promise.race([exit, late])) === 'late') {
        child.kill('SIGKILL');
        throw new Error(`The product did not stop within ${STOP_WAIT_MS / 1000} s of ${signal}. It printed:\n${output}`);
      }
    }
    return child.exitCode;
  };
  return {
    url: `http://127.0.0.1:${port}`,
    dataDir: folder,
    pid: child.pid ?? 0,
    output: () => output,
    interrupt: () => end('SIGINT'),
    kill: async () => {
      const { databasePid } = JSON.parse(await readFile(join(folder, 'in-use.json'), 'utf8')) as { databasePid: number };
      process.kill(databasePid, 'SIGKILL');
      await end('SIGKILL');
    },
    remove: async () => {
      await end('SIGTERM');
      await rm(folder, { recursive: true, force: true });
    },
  };
}

async function waitUntilReady(child: ChildProcess, output: () => string): Promise<void> {
  const deadline = Date.now() + READY_WAIT_MS;
  while (!output().includes('Pairleaf is ready')) {
    if (child.exitCode !== null) throw new Error(`The product ended with ${child.exitCode} while starting:\n${output()}`);
    if (Date.now() > deadline) {
      child.kill('SIGTERM');
      throw new Error(`The product was not ready within ${READY_WAIT_MS / 1000} s. It printed:\n${output()}`);
    }
    await sleep(50);
  }
}

/** The product must not notice that a test runner started it, nor use a database that the developer has set. */
function withoutTestRunner(env: NodeJS.ProcessEnv): NodeJS.ProcessEnv {
  const { DATABASE_URL: _url, MIGRATION_DATABASE_URL: _migration, NODE_ENV: _node, NODE_OPTIONS: _options, ...rest } = env;
  return Object.fromEntries(Object.entries(rest).filter(([name]) => !name.startsWith('VITEST')));
}
