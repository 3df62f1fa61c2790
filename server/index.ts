import { createServer, type Server } from 'node:http';
import type { AddressInfo } from 'node:net';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import type { Logger } from 'pino';
import { createApp } from './app';
import type { AppDeps, DemoAccounts } from './app-deps';
import type { Config } from './config';
import { createDataSource } from './data-source';
import { createExportPool, createIntakePool, createReadingPool } from './images/pools';
import { startJobRunner } from './jobs/job-runner';
import { createLog } from './log';
import { pruneLimits } from './middleware/attempt-limit';
import { SESSION_MAX_AGE_MS } from './middleware/sessions';
import { SessionStore } from './middleware/session-store';
import { createPassport } from './middleware/sign-in';
import { EXPORT_KIND } from './services/export-service';
import { createServices } from './services/services';
import { removeUnlessKnown } from './services/stored-pictures';
import { Incoming, sweepIncoming } from './storage/incoming';
import { localDiskStorage } from './storage/local-disk';

const PAGES_DIR = fileURLToPath(new URL('../dist', import.meta.url));
const PRUNE_EVERY_MS = 60 * 60_000;
const STOP_WITHIN_MS = 5_000;

export interface OpenOptions {
  /** Null where something else serves the pages. */
  readonly pagesDir?: string | null;
  /** Told by `/api/health` in demo mode; in any other nobody gets in with them, should an earlier demo have left them behind. */
  readonly demoAccounts?: DemoAccounts;
  readonly log?: Logger;
  readonly now?: () => Date;
  readonly checkAnswers?: boolean;
}

/** The app with everything that it needs, not yet listening. */
export interface OpenedApp {
  readonly deps: AppDeps;
  /** Starts to answer. @returns the app's address. */
  listen(): Promise<string>;
  /** Answers what was asked, gives the running job back to the queue and lets go of everything. */
  close(): Promise<void>;
}

/**
 * The composition root: builds everything once from the settings.
 *
 * @param config - its database must have all its tables.
 */
export async function openApp(config: Config, options: OpenOptions = {}): Promise<OpenedApp> {
  const { pagesDir = PAGES_DIR, log = createLog(config), now = () => new Date(), checkAnswers = false } = options;
  const dataSource = await createDataSource(config.databaseUrl).initialize();
  const storage = localDiskStorage(join(config.dataDir, 'files'));
  const incomingDir = join(config.dataDir, 'incoming');
  const incoming = await Incoming.open(incomingDir);
  await sweepIncoming(incomingDir, incoming, (pending) => removeUnlessKnown(dataSource, storage, pending));
  const [intakePool, exportPool, readingPool] = [createIntakePool(), createExportPool(), createReadingPool()];

  const demoAccounts = config.mode === 'demo' ? (options.demoAccounts ?? null) : null;
  const closedAccounts = new Set(demoAccounts ? [] : options.demoAccounts?.map(({ email }) => email));
  const base = { config, dataSource, storage, incoming, intakePool, exportPool, readingPool, closedAccounts, now };
  const services = createServices(base);
  const sessionStore = new SessionStore({ dataSource, now, maxAgeMs: SESSION_MAX_AGE_MS });
  const deps: AppDeps = { ...base, log, services, sessionStore, passport: createPassport(services.accounts), demoAccounts };

  const handlers = { [EXPORT_KIND]: services.exports.run.bind(services.exports) };
  const runner = startJobRunner({ dataSource, handlers, log, now });
  services.jobs.whenEnqueued(runner.wake);
  const prune = (): void => {
    Promise.all([sessionStore.prune(), pruneLimits(deps), services.exports.dropExpired()]).catch((error: unknown) => log.warn({ err: error }, 'could not prune'));
  };
  const pruning = setInterval(prune, PRUNE_EVERY_MS);
  pruning.unref();

  const server = createServer(createApp(deps, { pagesDir, checkAnswers }));
  return {
    deps,
    listen: () => listen(server, config),
    close: async () => {
      clearInterval(pruning);
      await stopServer(server);
      await runner.close();
      await Promise.all([intakePool.close(), exportPool.close(), readingPool.close()]);
      await incoming.close();
      await dataSource.destroy();
    },
  };
}

function listen(server: Server, { port, host }: Config): Promise<string> {
  return new Promise((resolve, reject) => {
    server.once('error', reject);
    server.listen(port, host, () => {
      server.off('error', reject);
      const bound = (server.address() as AddressInfo).port;
      resolve(`http://${host.includes(':') ? `[${host}]` : host}:${bound}`);
    });
  });
}

function stopServer(server: Server): Promise<void> {
  if (!server.listening) return Promise.resolve();
  return new Promise((resolve) => {
    // Whoever is still being answered after this long is cut off, so that stopping ends.
    const cutOff = setTimeout(() => server.closeAllConnections(), STOP_WITHIN_MS);
    server.close(() => {
      clearTimeout(cutOff);
      resolve();
    });
    server.closeIdleConnections();
  });
}
