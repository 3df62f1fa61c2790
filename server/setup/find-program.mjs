import { accessSync, constants, statSync } from 'node:fs';
import { delimiter, join } from 'node:path';

/** Debian keeps servers in sbin folders, which the PATH of an ordinary user lacks. */
const EXTRA_FOLDERS = ['/usr/sbin', '/usr/local/sbin', '/usr/bin', '/usr/local/bin', '/usr/libexec'];

/** The full path of the first of these programs that this machine has, or null. */
export function findProgram(...names) {
  const folders = [...(process.env.PATH ?? '').split(delimiter), ...EXTRA_FOLDERS].filter(Boolean);
  for (const name of names) {
    for (const folder of folders) {
      const path = join(folder, name);
      if (isProgram(path)) return path;
    }
  }
  return null;
}

function isProgram(path) {
  try {
    accessSync(path, constants.X_OK);
    return statSync(path).isFile();
  } catch {
    return false;
  }
}

/** The programs that Pairleaf uses, by the names that Debian and others give them. */
export const findMariadbd = () => findProgram('mariadbd', 'mysqld');
export const findMariadbInstallDb = () => findProgram('mariadb-install-db', 'mysql_install_db');
export const findPrintDefaults = () => findProgram('my_print_defaults');
export const findChromium = () => findProgram('chromium', 'chromium-browser');
