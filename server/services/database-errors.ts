import { EntityNotFoundError, QueryFailedError } from 'typeorm';
import { AppError } from '../../shared/errors';

/** MariaDB's own code of a failed statement, or null for any other error. */
const databaseCode = (error: unknown): string | null => (error instanceof QueryFailedError ? codeOf(error.driverError) : null);

function codeOf(error: unknown): string | null {
  const code = typeof error === 'object' && error !== null && 'code' in error ? error.code : null;
  return typeof code === 'string' ? code : null;
}

export const isDuplicateKey = (error: unknown): boolean => databaseCode(error) === 'ER_DUP_ENTRY';

/** A row that others still point to was to be deleted. */
export const isReferenced = (error: unknown): boolean => databaseCode(error) === 'ER_ROW_IS_REFERENCED_2';

/** A row was to point to one that does not exist. */
export const isDangling = (error: unknown): boolean => databaseCode(error) === 'ER_NO_REFERENCED_ROW_2';

/** A row that another one names was deleted between the reading of both. */
export const isGone = (error: unknown): boolean => error instanceof EntityNotFoundError;

/** The server is away, is going away, or has no connection left; the first ones are the operating system's. */
const AWAY = new Set([
  'ECONNREFUSED',
  'ECONNRESET',
  'EPIPE',
  'ETIMEDOUT',
  'ENOTFOUND',
  'EAI_AGAIN',
  'EHOSTUNREACH',
  'PROTOCOL_CONNECTION_LOST',
  'ER_SERVER_SHUTDOWN',
  'ER_CON_COUNT_ERROR',
  'ER_TOO_MANY_USER_CONNECTIONS',
]);
/** Two transactions stood in each other's way, and this one was rolled back. */
const CROSSED = new Set(['ER_LOCK_DEADLOCK', 'ER_LOCK_WAIT_TIMEOUT']);
const FULL = new Set(['ENOSPC', 'EDQUOT', 'ER_DISK_FULL', 'ER_RECORD_FILE_FULL']);

/** What a failure of the machine rather than of our code is to whoever asked, or null: a repeat can succeed. */
export function asMachineFailure(error: unknown): AppError | null {
  const code = databaseCode(error) ?? codeOf(error) ?? '';
  if (AWAY.has(code)) return new AppError('unavailable', { reason: 'database' });
  if (CROSSED.has(code)) return new AppError('unavailable', { reason: 'busy' });
  return FULL.has(code) ? new AppError('disk-full') : null;
}
