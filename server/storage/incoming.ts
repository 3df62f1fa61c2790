import { randomUUID } from 'node:crypto';
import { mkdir, readdir, readFile, rm, writeFile } from 'node:fs/promises';
import { join, resolve } from 'node:path';
import { z } from 'zod';
import { idSchema } from '../../shared/contracts/common';
import { isRunning } from '../running-process';

/** What an intake means to store; written before the first file is stored and removed after its row is. */
const pendingSchema = z.object({ studioId: idSchema, sha256: z.string().regex(/^[0-9a-f]{64}$/) });
export type Pending = z.infer<typeof pendingSchema>;

const PENDING = '.pending.json';
const FOLDER_NAME = /^(\d+)-[0-9a-f-]{36}$/;

/**
 * This process's folder for files that are on their way in or out: uploads as they arrive, what workers write.
 * Whatever a crashed process left in its own folder is swept when the next one starts.
 */
export class Incoming {
  private constructor(readonly folder: string) {}

  /** @param parent - folder that all processes of this installation share, on the storage's disk. */
  static async open(parent: string): Promise<Incoming> {
    const folder = resolve(parent, `${process.pid}-${randomUUID()}`);
    await mkdir(folder, { recursive: true, mode: 0o700 });
    return new Incoming(folder);
  }

  /** A path that nothing uses yet. */
  path(extension = ''): string {
    return join(this.folder, `${randomUUID()}${extension}`);
  }

  /** Runs `use` with an empty folder of its own, which is removed whatever happens. */
  async withFolder<T>(use: (folder: string) => Promise<T>): Promise<T> {
    const folder = this.path();
    await mkdir(folder, { mode: 0o700 });
    try {
      return await use(folder);
    } finally {
      await rm(folder, { recursive: true, force: true });
    }
  }

  /**
   * Runs `store` under a marker, by which a later start finds what was stored without its row if we die inside.
   *
   * @param undo - removes what was stored when `store` throws.
   */
  async withPending<T>(pending: Pending, store: () => Promise<T>, undo: (pending: Pending) => Promise<void>): Promise<T> {
    const marker = join(this.folder, `${randomUUID()}${PENDING}`);
    await writeFile(marker, JSON.stringify(pending), { flush: true });
    try {
      return await store();
    } catch (error) {
      await undo(pending);
      throw error;
    } finally {
      await rm(marker, { force: true });
    }
  }

  async close(): Promise<void> {
    await rm(this.folder, { recursive: true, force: true });
  }
}

/**
 * Sweeps the folders of processes that are gone.
 *
 * @param undo - removes what a marker names unless its row exists; called before the marker is removed.
 * @returns how many folders were swept.
 */
export async function sweepIncoming(parent: string, own: Incoming, undo: (pending: Pending) => Promise<void>): Promise<number> {
  await mkdir(parent, { recursive: true });
  const folders = (await readdir(parent)).filter((name) => resolve(parent, name) !== own.folder && isAbandoned(name));
  for (const name of folders) {
    const folder = join(parent, name);
    for (const file of await readdir(folder)) {
      if (!file.endsWith(PENDING)) continue;
      const pending = parsePending(await readFile(join(folder, file), 'utf8'));
      if (pending) await undo(pending);
    }
    await rm(folder, { recursive: true, force: true });
  }
  return folders.length;
}

/** Ours is excluded before: a folder with our own number was left by an earlier process, as in a container. */
function isAbandoned(name: string): boolean {
  const pid = Number(FOLDER_NAME.exec(name)?.[1]);
  return Number.isInteger(pid) && (pid === process.pid || !isRunning(pid));
}

/** A marker that the crash cut short names nothing: the first file is stored only after the marker is whole. */
function parsePending(text: string): Pending | null {
  try {
    return pendingSchema.parse(JSON.parse(text));
  } catch {
    return null;
  }
}
