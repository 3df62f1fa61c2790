import type { ChildProcess } from 'node:child_process';
import { spawn } from 'node:child_process';
import { chownSync, readFileSync, rmSync, statSync, truncateSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { setTimeout as sleep } from 'node:timers/promises';
import { createConnection } from 'mysql2/promise';
import { findMariadbd } from '../find-program.mjs';
import { SetupFailure, tailOf } from '../setup-failure';
import { accountStatements, APP_USER, DATABASE_NAME, databaseUrl } from './accounts';
import { accountOf, dataFolderIn, missingProgram, REDO_LOG_OPTION } from './initialise';
import type { RunAs } from './run-as';
import type { DatabaseSecrets } from './secrets';

export interface ServerRequest {
  /** The folder of the database, with `data` in it. */
  readonly folder: string;
  readonly secrets: DatabaseSecrets;
  readonly runAs: RunAs;
  readonly fast: boolean;
  readonly onStarted: (pid: number) => void;
  readonly onLost?: () => void;
}

export interface RunningServer {
  readonly pid: number;
  stop(): Promise<void>;
}

/** Recovery of a large database after a power cut can take a while. */
const READY_WAIT_MS = 120_000;
const STOP_WAIT_MS = 30_000;
const POLL_MS = 40;
const MAX_LOG_BYTES = 5_000_000;

const FAULTS = {
  portTaken: /Bind on TCP\/IP port/,
  folderInUse: /(Unable to lock|Can't lock|Unable to acquire lock)/i,
  diskFull: /(No space left on device|Disk is full)/i,
};

/** The server could not have its port: another program listens there. */
export class PortTaken extends Error {}

/** Starts mariadbd and waits until the app's account can use it. */
export async function startServer(request: ServerRequest): Promise<RunningServer> {
  const { folder, secrets } = request;
  const logFile = join(folder, 'server.log');
  const logFrom = openLog(logFile);
  const accountsFile = writeAccounts(request);
  const child = launch(request, logFile, accountsFile);
  const ended = new Promise<void>((resolve) => child.once('exit', () => resolve()).once('error', () => resolve()));
  let isEnded = false;
  void ended.then(() => (isEnded = true));
  // If this process dies of a bug, the database must not be left behind.
  const stopWithUs = (): void => void child.kill('SIGTERM');
  process.once('exit', stopWithUs);
  const readLog = (): string => readLogFrom(logFile, logFrom);
  try {
    if (child.pid) request.onStarted(child.pid);
    await waitUntilReady(secrets, () => isEnded, readLog);
  } catch (error) {
    child.kill('SIGKILL'); // one that waits for another's lock ignores SIGTERM for half a minute
    await ended;
    process.off('exit', stopWithUs);
    throw error;
  } finally {
    rmSync(accountsFile, { force: true });
  }
  let isStopping = false;
  void ended.then(() => {
    process.off('exit', stopWithUs);
    if (!isStopping) request.onLost?.();
  });
  return {
    pid: child.pid ?? 0,
    stop: async () => {
      isStopping = true;
      child.kill('SIGTERM');
      await Promise.race([ended, sleep(STOP_WAIT_MS, undefined, { ref: false })]);
      if (!isEnded) child.kill('SIGKILL'); // InnoDB recovers from this at the next start
      await ended;
    },
  };
}

function launch({ folder, secrets, runAs, fast }: ServerRequest, logFile: string, accountsFile: string): ChildProcess {
  const program = findMariadbd();
  if (!program) throw missingProgram('mariadbd');
  const args = [
    '--no-defaults', // must be the first option: the machine's own server and its settings are none of our business
    `--datadir=${dataFolderIn(folder)}`,
    // Relative to the data folder, so that a long path cannot exceed the 107 bytes of a socket's name.
    '--socket=server.sock',
    '--pid-file=server.pid',
    '--bind-address=127.0.0.1',
    `--port=${secrets.port}`,
    '--character-set-server=utf8mb4',
    '--collation-server=utf8mb4_unicode_ci',
    '--default-time-zone=+00:00',
    '--skip-name-resolve',
    '--local-infile=OFF',
    REDO_LOG_OPTION,
    `--init-file=${accountsFile}`,
    `--log-error=${logFile}`,
    ...(runAs.isRoot ? ['--user=root'] : []),
    ...(fast ? ['--innodb-flush-log-at-trx-commit=0'] : []),
  ];
  // A process group of its own: Ctrl-C at the terminal reaches the app, which finishes its work and then stops the database.
  return spawn(program, args, { cwd: folder, stdio: 'ignore', detached: true, ...accountOf(runAs) });
}

/** Written for mariadbd's eyes only, and removed as soon as it has read it. */
function writeAccounts({ folder, secrets, runAs }: ServerRequest): string {
  const file = join(folder, 'accounts.sql');
  rmSync(file, { force: true });
  writeFileSync(file, accountStatements(secrets), { mode: 0o600 });
  if (runAs.uid !== null && runAs.gid !== null) chownSync(file, runAs.uid, runAs.gid);
  return file;
}

async function waitUntilReady(secrets: DatabaseSecrets, isEnded: () => boolean, readLog: () => string): Promise<void> {
  const url = databaseUrl(APP_USER, secrets.appPassword, secrets.port, DATABASE_NAME);
  const deadline = Date.now() + READY_WAIT_MS;
  while (!(await canConnect(url))) {
    const log = readLog();
    if (FAULTS.portTaken.test(log)) throw new PortTaken();
    if (FAULTS.folderInUse.test(log)) {
      throw new SetupFailure(
        'Another database server is using the same data folder.',
        'Stop it (it is a mariadbd process), then start again.',
        tailOf(log, 4),
      );
    }
    if (FAULTS.diskFull.test(log)) {
      throw new SetupFailure('The database cannot start: the disk is full.', 'Free some space and start again.', tailOf(log, 4));
    }
    if (isEnded() || Date.now() > deadline) {
      throw new SetupFailure(
        isEnded() ? 'The database ended while starting.' : 'The database did not answer within two minutes.',
        'Its last words are above; the whole log is server.log in the folder db of the data folder.',
        tailOf(log),
      );
    }
    await sleep(POLL_MS);
  }
}

async function canConnect(url: string): Promise<boolean> {
  try {
    const connection = await createConnection({ uri: url.replace(/^mariadb:/, 'mysql:'), connectTimeout: 2_000 });
    await connection.end();
    return true;
  } catch {
    return false;
  }
}

/** Where this run's part of the log begins; a log that has grown too long is begun anew. */
function openLog(logFile: string): number {
  const size = statSync(logFile, { throwIfNoEntry: false })?.size ?? 0;
  if (size <= MAX_LOG_BYTES) return size;
  truncateSync(logFile);
  return 0;
}

function readLogFrom(logFile: string, offset: number): string {
  try {
    return readFileSync(logFile).subarray(offset).toString();
  } catch {
    return ''; // not written yet
  }
}
