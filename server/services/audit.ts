import { randomUUID } from 'node:crypto';
import type { EntityManager } from 'typeorm';
import type { Actor } from '../../shared/model/people';
import { AuditEntryEntity } from '../entities/audit-entry-entity';

export type AuditAction = 'grant.create' | 'grant.withdraw' | 'album.delete' | 'spread.delete' | 'print.delete';

/** Notes who did it, in the same transaction as the deed. */
export async function recordAudit(
  manager: EntityManager,
  entry: { readonly studioId: string; readonly actor: Actor; readonly action: AuditAction; readonly subjectId: string; readonly at: Date },
): Promise<void> {
  const { studioId, actor, action, subjectId, at } = entry;
  await manager.insert(AuditEntryEntity, { id: randomUUID(), studioId, userId: actor.userId, action, subjectId, at });
}
