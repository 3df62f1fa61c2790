import { readFileSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { setTimeout as sleep } from 'node:timers/promises';
import { isRunning, startOf } from '../../running-process';
import { SetupFailure } from '../setup-failure';

/** Who uses a data folder: the Pairleaf process, and the mariadbd that it started. */
interface Holder {
  readonly pid: number;
  readonly started: string | null;
  readonly databasePid: number | null;
}

const STOP_WAIT_MS = 30_000;

const fileIn = (folder: string): string => join(folder, 'in-use.json');

/**
 * Takes the data folder for this process. Two servers over one folder would wait for each other's locks for half a
 * minute and then die, so the second is refused at once. A database left running by a Pairleaf that was
 * killed is stopped first.
 */
export async function takeLock(folder: string): Promise<void> {
  const mine: Holder = { pid: process.pid, started: startOf(process.pid), databasePid: null };
  for (;;) {
    try {
      writeFileSync(fileIn(folder), JSON.stringify(mine), { flag: 'wx', mode: 0o600 });
      return;
    } catch (error) {
      if (!isExisting(error)) throw error;
    }
    const holder = readHolder(folder);
    if (holder && isAlive(holder.pid, holder.started)) {
      throw new SetupFailure(
        `Pairleaf is already running with the data in ${folder} (process ${holder.pid}).`,
        'Use that one, or stop it with Ctrl-C and start again.',
      );
    }
    if (holder?.databasePid) await stopLeftOver(holder.databasePid, folder);
    rmSync(fileIn(folder), { force: true });
  }
}

/** Notes which mariadbd belongs to this process, for a next start after a crash. */
export function noteDatabase(folder: string, databasePid: number): void {
  const holder: Holder = { pid: process.pid, started: startOf(process.pid), databasePid };
  writeFileSync(fileIn(folder), JSON.stringify(holder), { mode: 0o600 });
}

export const releaseLock = (folder: string): void => rmSync(fileIn(folder), { force: true });

function readHolder(folder: string): Holder | null {
  try {
    return JSON.parse(readFileSync(fileIn(folder), 'utf8')) as Holder;
  } catch {
    return null;
  }
}

async function stopLeftOver(pid: number, folder: string): Promise<void> {
  if (!isDatabaseOver(pid, folder)) return;
  process.kill(pid, 'SIGTERM');
  const deadline = Date.now() + STOP_WAIT_MS;
  while (isDatabaseOver(pid, folder)) {
    if (Date.now() > deadline) {
      throw new SetupFailure(
        `The database that an earlier Pairleaf left running (process ${pid}) does not stop.`,
        `End it with "kill ${pid}" and start again.`,
      );
    }
    await sleep(50);
  }
}

/** A process id can be given to another program; the command line tells whether it is a database over this folder. */
function isDatabaseOver(pid: number, folder: string): boolean {
  try {
    return readFileSync(`/proc/${pid}/cmdline`, 'utf8').includes(`--datadir=${folder}/`);
  } catch {
    return false;
  }
}

/** A process id can be given to another program, which started at another time. */
const isAlive = (pid: number, started: string | null): boolean => isRunning(pid) && (started === null || startOf(pid) === started);

const isExisting = (error: unknown): boolean => (error as NodeJS.ErrnoException).code === 'EEXIST';
