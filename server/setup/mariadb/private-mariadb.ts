import { resolve } from 'node:path';
import { APP_USER, DATABASE_NAME, databaseUrl, MIGRATION_USER } from './accounts';
import { initialise, isInitialised } from './initialise';
import { noteDatabase, releaseLock, takeLock } from './lock';
import { findFreePort, isPortFree } from './ports';
import type { RunAs } from './run-as';
import { prepareFolder } from './run-as';
import type { DatabaseSecrets } from './secrets';
import { makeSecrets, readSecrets, writeSecrets } from './secrets';
import type { RunningServer } from './server-process';
import { PortTaken, startServer } from './server-process';

export interface PrivateMariadbOptions {
  /** Pairleaf's data folder: the database is made in `db` below it. */
  readonly folder: string;
  /** For tests: commits are not flushed to disk one by one. */
  readonly fast?: boolean;
  /** Called with a line for each long step. */
  readonly onProgress?: (line: string) => void;
  /** Called when the server ends without being told to. */
  readonly onLost?: () => void;
}

/** A MariaDB server of our own, on 127.0.0.1 alone. */
export interface PrivateMariadb {
  /** All rights, for the set-up of tests. */
  readonly rootUrl: string;
  /** May change the tables of Pairleaf's database. */
  readonly migrationUrl: string;
  /** May read and write rows of Pairleaf's database, and nothing else. */
  readonly appUrl: string;
  readonly port: number;
  readonly pid: number;
  stop(): Promise<void>;
}

const START_TRIES = 4;

/**
 * Starts the private server, making it first where there is none. After a crash it recovers by itself.
 *
 * @throws SetupFailure when the folder is in use, a program is missing, or the server does not come up.
 */
export async function startPrivateMariadb(options: PrivateMariadbOptions): Promise<PrivateMariadb> {
  const folder = resolve(options.folder);
  const databaseFolder = resolve(folder, 'db');
  const runAs = prepareFolder(databaseFolder);
  await takeLock(folder);
  try {
    if (runAs.isRoot) options.onProgress?.('The database runs as root: a folder above its data is closed to other accounts.');
    if (!isInitialised(databaseFolder)) {
      options.onProgress?.('Making the database …');
      await initialise(databaseFolder, runAs);
    }
    const { secrets, server } = await startOnFreePort(options, folder, databaseFolder, runAs);
    const urlOf = (user: string, password: string, name: string): string => databaseUrl(user, password, secrets.port, name);
    return {
      rootUrl: urlOf('root', secrets.rootPassword, 'mysql'),
      migrationUrl: urlOf(MIGRATION_USER, secrets.migrationPassword, DATABASE_NAME),
      appUrl: urlOf(APP_USER, secrets.appPassword, DATABASE_NAME),
      port: secrets.port,
      pid: server.pid,
      stop: async () => {
        await server.stop();
        releaseLock(folder);
      },
    };
  } catch (error) {
    releaseLock(folder);
    throw error;
  }
}

/** The kept port where it is free, another where it is not; the choice is kept for the next start. */
async function startOnFreePort(
  { fast = false, onLost }: PrivateMariadbOptions,
  folder: string,
  databaseFolder: string,
  runAs: RunAs,
): Promise<{ secrets: DatabaseSecrets; server: RunningServer }> {
  let secrets = readSecrets(folder) ?? makeSecrets(await findFreePort());
  for (let attempt = 1; ; attempt++) {
    if (attempt > 1 || !(await isPortFree(secrets.port))) secrets = { ...secrets, port: await findFreePort() };
    writeSecrets(folder, secrets);
    try {
      const onStarted = (pid: number): void => noteDatabase(folder, pid);
      return { secrets, server: await startServer({ folder: databaseFolder, secrets, runAs, fast, onStarted, onLost }) };
    } catch (error) {
      // Another program can take the port between the look and the start.
      if (!(error instanceof PortTaken) || attempt === START_TRIES) throw error;
    }
  }
}
