import { spawnSync } from 'node:child_process';
import { chmodSync, chownSync, lstatSync, mkdirSync, readdirSync, statSync } from 'node:fs';
import { dirname, join } from 'node:path';

/** The account that mariadbd runs under. `null` ids mean: this process's own. */
export interface RunAs {
  readonly uid: number | null;
  readonly gid: number | null;
  /** True where only root can reach the folder. */
  readonly isRoot: boolean;
}

/** Debian's accounts for a database server, best first. */
const CANDIDATES = ['mysql', 'nobody'];

/**
 * Chooses who runs mariadbd over `folder`, and gives them the folder. An ordinary user runs it as themselves;
 * root hands it to `mysql` or `nobody`, unless a folder above is closed to them (a checkout in root's home).
 */
export function prepareFolder(folder: string): RunAs {
  mkdirSync(folder, { recursive: true, mode: 0o700 });
  if (process.getuid?.() !== 0) return { uid: null, gid: null, isRoot: false };
  // Pairleaf's own folder may be passed through, not read, on the way to the database's.
  const parent = dirname(folder);
  chmodSync(parent, (statSync(parent).mode & 0o777) | 0o011);
  const account = CANDIDATES.map(findAccount).find((found) => found !== null);
  if (account) {
    giveTo(folder, account);
    if (canWrite(folder, account)) return { ...account, isRoot: false };
  }
  giveTo(folder, { uid: 0, gid: 0 });
  return { uid: null, gid: null, isRoot: true };
}

function findAccount(name: string): { uid: number; gid: number } | null {
  const [uid, gid] = ['-u', '-g'].map((flag) => spawnSync('id', [flag, name], { encoding: 'utf8' }));
  if (uid?.status !== 0 || gid?.status !== 0) return null;
  return { uid: Number(uid.stdout), gid: Number(gid.stdout) };
}

const canWrite = (folder: string, account: { uid: number; gid: number }): boolean =>
  spawnSync('test', ['-w', folder], { ...account, cwd: '/' }).status === 0;

/** Changes owners only where they differ: the folder's own owner tells. */
function giveTo(folder: string, account: { uid: number; gid: number }): void {
  if (statSync(folder).uid === account.uid) return;
  chownTree(folder, account);
}

function chownTree(path: string, account: { uid: number; gid: number }): void {
  const entry = lstatSync(path);
  if (entry.isSymbolicLink()) return;
  if (entry.isDirectory()) for (const name of readdirSync(path)) chownTree(join(path, name), account);
  // The folder itself comes last, so that an interrupted change is taken up again.
  chownSync(path, account.uid, account.gid);
}
