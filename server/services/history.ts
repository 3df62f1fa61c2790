import { LessThanOrEqual, type EntityManager } from 'typeorm';
import { AppError } from '../../shared/errors';
import { applyPatch } from '../../shared/model/patch';
import type { SpreadDocument } from '../../shared/model/spread';
import { SpreadEditEntity } from '../entities/spread-edit-entity';
import type { SpreadEntity } from '../entities/spread-entity';
import { SpreadSnapshotEntity } from '../entities/spread-snapshot-entity';
import { readDocument } from './spread-service';

/** A snapshot stands at every multiple of this, so that at most so many edits are replayed less one. */
export const SNAPSHOT_EVERY = 50;

/** A part of the log: edits after `after` up to `upTo`, oldest first, with who made them. */
export function readLog(
  manager: EntityManager,
  spreadId: string,
  range: { readonly after: number; readonly upTo?: number; readonly limit?: number },
): Promise<SpreadEditEntity[]> {
  const query = manager
    .createQueryBuilder(SpreadEditEntity, 'edit')
    .leftJoinAndSelect('edit.user', 'user')
    .where('edit.spreadId = :spreadId AND edit.revision > :after', { spreadId, after: range.after })
    .orderBy('edit.revision', 'ASC');
  if (range.upTo !== undefined) query.andWhere('edit.revision <= :upTo', { upTo: range.upTo });
  if (range.limit !== undefined) query.take(range.limit);
  return query.getMany();
}

/**
 * The document as it stood at a revision: the last snapshot before it and the edits since.
 *
 * @throws AppError('not-found') for a revision that the spread has not reached.
 */
export async function documentAt(manager: EntityManager, spread: SpreadEntity, revision: number): Promise<SpreadDocument> {
  if (revision === spread.revision) return readDocument(spread);
  if (revision > spread.revision) throw new AppError('not-found');
  const snapshot = await manager.findOneOrFail(SpreadSnapshotEntity, {
    where: { spreadId: spread.id, revision: LessThanOrEqual(revision) },
    order: { revision: 'DESC' },
  });
  const edits = await readLog(manager, spread.id, { after: snapshot.revision, upTo: revision });
  return edits.reduce((doc, edit) => applyPatch(doc, edit.patch), readDocument(snapshot));
}
