import { existsSync, readFileSync } from 'node:fs';
import { fileURLToPath } from 'node:url';

const FOLDER = fileURLToPath(new URL('../../../shared/refs/', import.meta.url));

/**
 * The text of one of the published instance files, which lie beside the repository and are never part of it.
 *
 * @throws Error saying what is missing: a suite that cannot read its references has failed.
 */
export function readReference(path: string): string {
  if (!existsSync(FOLDER)) {
    throw new Error('The references are missing: test:refs reads them from ../shared/refs, beside the folder of this repository.');
  }
  if (!existsSync(FOLDER + path)) throw new Error(`The reference ${path} is missing in ../shared/refs.`);
  return readFileSync(FOLDER + path, 'utf8');
}

/** Full path of a reference that a library opens by itself, such as a picture. */
export function referencePath(path: string): string {
  readReference(path);
  return FOLDER + path;
}
