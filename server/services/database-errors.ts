import { QueryFailedError } from 'typeorm';

/** MariaDB's own code of a failed statement, or null for any other error. */
function databaseCode(error: unknown): string | null {
  if (!(error instanceof QueryFailedError)) return null;
  const { code } = error.driverError as { readonly code?: unknown };
  return typeof code === 'string' ? code : null;
}

export const isDuplicateKey = (error: unknown): boolean => databaseCode(error) === 'ER_DUP_ENTRY';

/** A row that others still point to was to be deleted. */
export const isReferenced = (error: unknown): boolean => databaseCode(error) === 'ER_ROW_IS_REFERENCED_2';

/** A row was to point to one that does not exist. */
export const isDangling = (error: unknown): boolean => databaseCode(error) === 'ER_NO_REFERENCED_ROW_2';
