import { readdirSync, statSync } from 'node:fs';
import { join } from 'node:path';
import { runQuietly } from './run-quietly';
import { SetupFailure, tailOf } from './setup-failure';

/** Everything that the built pages are made from. */
const SOURCES = ['src', 'shared', 'fonts', 'public', 'index.html', 'vite.config.ts', 'package-lock.json'];

/**
 * Builds the pages with Vite unless `dist` is there and younger than every source.
 *
 * @throws SetupFailure with the end of Vite's output.
 */
export async function buildPages(root: string, onProgress: (line: string) => void): Promise<void> {
  const built = modifiedAt(join(root, 'dist', 'index.html'));
  if (built > Math.max(...SOURCES.map((path) => newestIn(join(root, path))))) return;
  onProgress('Building the pages …');
  const vite = join(root, 'node_modules', 'vite', 'bin', 'vite.js');
  const { code, output } = await runQuietly(process.execPath, [vite, 'build', '--logLevel=warn'], { cwd: root });
  if (code !== 0) {
    throw new SetupFailure('Building the pages failed.', 'Put the fault named above right and start again.', tailOf(output, 25));
  }
}

/** When the youngest thing in a folder changed; folders count too, so that a removed file is noticed. */
function newestIn(path: string): number {
  const own = modifiedAt(path);
  if (own === 0 || !statSync(path).isDirectory()) return own;
  return Math.max(own, ...readdirSync(path).map((name) => newestIn(join(path, name))));
}

const modifiedAt = (path: string): number => statSync(path, { throwIfNoEntry: false })?.mtimeMs ?? 0;
