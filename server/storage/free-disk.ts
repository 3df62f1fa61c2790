import { AppError } from '../../shared/errors';
import type { Storage } from './storage';

/** Kept free for the database and the logs, which must never be the ones to find the disk full. */
export const RESERVED_BYTES = 512 * 1024 * 1024;

/** @throws AppError('disk-full') when storing `bytes` more would eat into the reserve. */
export async function requireFreeDisk(storage: Storage, bytes: number, reservedBytes = RESERVED_BYTES): Promise<void> {
  const free = await storage.freeBytes();
  if (free !== null && free - bytes < reservedBytes) throw new AppError('disk-full', {});
}
