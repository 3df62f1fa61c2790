import { randomUUID } from 'node:crypto';
import { constants } from 'node:fs';
import { copyFile, mkdir, open, rename, rm, stat, statfs } from 'node:fs/promises';
import { dirname, resolve } from 'node:path';
import type { Storage, StorageKey } from './storage';

/**
 * Storage on the local disk, one file per key under `folder`.
 *
 * Paths that it gives out are absolute. A put syncs the file's bytes, renames it into place and syncs the folder, so that after a power cut a key is
 * either whole or absent.
 */
export function localDiskStorage(folder: string): Storage {
  const pathOf = (key: StorageKey): string => resolve(folder, key);

  return {
    async put(key, sourcePath) {
      const target = pathOf(key);
      await mkdir(dirname(target), { recursive: true });
      await syncPath(sourcePath);
      await moveInto(sourcePath, target);
      await syncPath(dirname(target));
    },

    async get(key) {
      const file = await open(pathOf(key)).catch(nullWhenMissing);
      if (!file) return null;
      const { size } = await file.stat();
      return { sizeBytes: size, stream: file.createReadStream() };
    },

    async localCopy(key) {
      const path = pathOf(key);
      const found = await stat(path).catch(nullWhenMissing);
      return found && { path, release: async () => undefined };
    },

    async exists(key) {
      return (await stat(pathOf(key)).catch(nullWhenMissing)) !== null;
    },

    async delete(key) {
      await rm(pathOf(key), { force: true });
    },

    async freeBytes() {
      await mkdir(folder, { recursive: true });
      const { bavail, bsize } = await statfs(folder);
      return bavail * bsize;
    },
  };
}

/** Renames; across file systems copies beside the target first, so that the last step is still a rename. */
async function moveInto(sourcePath: string, target: string): Promise<void> {
  try {
    await rename(sourcePath, target);
  } catch (error) {
    if (!isErrno(error, 'EXDEV')) throw error;
    const beside = `${target}.${randomUUID()}.part`;
    try {
      await copyFile(sourcePath, beside, constants.COPYFILE_EXCL);
      await syncPath(beside);
      await rename(beside, target);
    } finally {
      await rm(beside, { force: true });
    }
    await rm(sourcePath, { force: true });
  }
}

async function syncPath(path: string): Promise<void> {
  const file = await open(path, 'r');
  try {
    await file.sync();
  } finally {
    await file.close();
  }
}

const isErrno = (error: unknown, code: string): boolean => error instanceof Error && 'code' in error && error.code === code;

function nullWhenMissing(error: unknown): null {
  if (isErrno(error, 'ENOENT')) return null;
  throw error;
}
