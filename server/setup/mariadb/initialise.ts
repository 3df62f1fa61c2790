import { existsSync, renameSync, rmSync } from 'node:fs';
import { join } from 'node:path';
import { findMariadbInstallDb } from '../find-program.mjs';
import { runQuietly } from '../run-quietly';
import { SetupFailure, tailOf } from '../setup-failure';
import type { RunAs } from './run-as';

/** Small redo log: a planner's database is small, and the file is allocated whole. */
export const REDO_LOG_OPTION = '--innodb-log-file-size=16M';

/** Where mariadbd's own files are, below the folder that is Pairleaf's. */
export const dataFolderIn = (folder: string): string => join(folder, 'data');

export const isInitialised = (folder: string): boolean => existsSync(join(dataFolderIn(folder), 'mysql'));

/** Makes an empty data folder; one that was interrupted half-way is never taken for a whole one. */
export async function initialise(folder: string, runAs: RunAs): Promise<void> {
  const program = findMariadbInstallDb();
  if (!program) throw missingProgram('mariadb-install-db');
  const draft = join(folder, 'data.new');
  rmSync(draft, { recursive: true, force: true });
  const args = [
    '--no-defaults', // must be the first option
    `--datadir=${draft}`,
    '--auth-root-authentication-method=normal',
    '--skip-test-db',
    REDO_LOG_OPTION,
    ...(runAs.isRoot ? ['--user=root'] : []),
  ];
  const { code, output } = await runQuietly(program, args, { cwd: folder, ...accountOf(runAs) });
  if (code !== 0) {
    throw new SetupFailure(
      'Making the database failed.',
      `Check that there is free disk space and that ${folder} can be written, then start again.`,
      tailOf(output),
    );
  }
  renameSync(draft, dataFolderIn(folder));
}

export const missingProgram = (name: string): SetupFailure =>
  new SetupFailure(
    `MariaDB's ${name} is not on this machine.`,
    'Start with "npm start", which installs it, or set DATABASE_URL to the address of a MariaDB server that you run.',
  );

export const accountOf = ({ uid, gid }: RunAs): { uid?: number; gid?: number } =>
  uid === null || gid === null ? {} : { uid, gid };
