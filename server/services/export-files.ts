import type { EntityManager, FindOptionsWhere } from 'typeorm';
import { z } from 'zod';
import { EXPORT_FORMATS } from '../../shared/contracts/exports';
import { JobEntity } from '../entities/job-entity';
import { exportKey, type Storage, type StorageKey } from '../storage/storage';

export const EXPORT_EXTENSIONS = { png: 'png', jpeg: 'jpg' } as const;

const payloadSchema = z.object({ format: z.enum(EXPORT_FORMATS) });

/** Where a job's picture is stored, once it is; null for a job that makes none. */
function exportKeyOf({ id, studioId, payload }: JobEntity): StorageKey | null {
  const parsed = payloadSchema.safeParse(payload);
  return parsed.success ? exportKey(studioId, id, EXPORT_EXTENSIONS[parsed.data.format]) : null;
}

/**
 * Deletes rows with which jobs go, and the pictures that those jobs made. The files go before the transaction ends: a
 * crash between the two leaves a job whose picture is gone, never a picture that nobody knows of.
 *
 * @param jobs - those that go.
 * @param removeRows - deletes the rows, in the same transaction.
 */
export async function removeWithExports(
  manager: EntityManager,
  storage: Storage,
  jobs: FindOptionsWhere<JobEntity>,
  removeRows: () => Promise<unknown>,
): Promise<void> {
  const found = await manager.find(JobEntity, { where: jobs, lock: { mode: 'pessimistic_write' } });
  await removeRows();
  for (const key of found.map(exportKeyOf)) if (key !== null) await storage.delete(key);
}

/** Whether a job is still there; waits for a deletion that is under way. */
export const isJobKept = (manager: EntityManager, id: string): Promise<boolean> =>
  manager.transaction(async (inner) => (await inner.findOne(JobEntity, { where: { id }, lock: { mode: 'pessimistic_read' } })) !== null);
