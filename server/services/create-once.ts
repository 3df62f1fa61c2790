import type { DeepPartial, EntityManager, EntityTarget, FindOptionsWhere, ObjectLiteral } from 'typeorm';
import { AppError } from '../../shared/errors';
import { isDuplicateKey } from './database-errors';

/**
 * Inserts a row whose id the client made. A repeat of the same creation finds its row and is answered the same;
 * the same id for anything else is refused.
 *
 * @param isSame - whether the row that is there is what this request would have made.
 * @throws AppError('already-exists').
 */
export async function createOnce<T extends ObjectLiteral & { id: string }>(
  manager: EntityManager,
  entity: EntityTarget<T>,
  row: DeepPartial<T> & { readonly id: string },
  what: string,
  isSame: (existing: T) => boolean,
): Promise<{ readonly row: T; readonly isNew: boolean }> {
  const made = manager.create(entity, row);
  try {
    await manager.insert(entity, made);
    return { row: made, isNew: true };
  } catch (error) {
    if (!isDuplicateKey(error)) throw error;
    const existing = await manager.findOneBy(entity, { id: row.id } as FindOptionsWhere<T>);
    if (existing && isSame(existing)) return { row: existing, isNew: false };
    throw new AppError('already-exists', { what, id: row.id });
  }
}
