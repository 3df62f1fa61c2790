import { createHash, randomBytes } from 'node:crypto';
import type { DataSource } from 'typeorm';
import type { z } from 'zod';
import type { createGrantSchema } from '../../shared/contracts/grants';
import { AppError } from '../../shared/errors';
import type { Actor, Grant, GrantScope, Target } from '../../shared/model/people';
import { GrantEntity } from '../entities/grant-entity';
import { SpreadEntity } from '../entities/spread-entity';
import { recordAudit } from './audit';
import { isDuplicateKey } from './database-errors';
import { invalidField } from './invalid-field';

type CreateGrant = z.output<typeof createGrantSchema>;

/** 256 random bits: nobody guesses one, so the hash needs no salt and attempts need no limit. */
const TOKEN_BYTES = 32;
const hashToken = (token: string): string => createHash('sha256').update(token).digest('hex');

export class GrantService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly now: () => Date,
  ) {}

  async locate(id: string): Promise<{ readonly target: Target; readonly subject: GrantEntity }> {
    const grant = await this.dataSource.manager.findOneBy(GrantEntity, { id });
    if (!grant) throw new AppError('not-found');
    return { target: { studioId: grant.studioId }, subject: grant };
  }

  list(studioId: string): Promise<GrantEntity[]> {
    return this.dataSource.manager.find(GrantEntity, { where: { studioId }, order: { createdAt: 'ASC', id: 'ASC' } });
  }

  /**
   * @returns the grant and its token, which is told this once.
   * @throws AppError `invalid-input` for a scope that names nothing in this studio or an end in the past,
   *   `already-exists` for a repeat, because the first token cannot be told again.
   */
  async create(studioId: string, input: CreateGrant, actor: Actor): Promise<{ readonly grant: GrantEntity; readonly token: string }> {
    const createdAt = this.now();
    const expiresAt = input.expiresAt === null ? null : new Date(input.expiresAt);
    if (expiresAt && expiresAt <= createdAt) throw invalidField('expiresAt', 'the end must lie in the future');
    await this.requireScope(studioId, input.scope);
    const token = randomBytes(TOKEN_BYTES).toString('base64url');
    const grant = this.dataSource.manager.create(GrantEntity, {
      id: input.id,
      studioId,
      tokenHash: hashToken(token),
      scope: input.scope,
      expiresAt,
      withdrawnAt: null,
      createdBy: actor.userId,
      createdAt,
    });
    try {
      await this.dataSource.transaction(async (manager) => {
        await manager.insert(GrantEntity, grant);
        await recordAudit(manager, { studioId, actor, action: 'grant.create', subjectId: grant.id, at: createdAt });
      });
    } catch (error) {
      if (isDuplicateKey(error)) throw new AppError('already-exists', { what: 'grant', id: input.id });
      throw error;
    }
    return { grant, token };
  }

  private async requireScope(studioId: string, scope: GrantScope): Promise<void> {
    if (scope.kind === 'workshop') throw invalidField('scope.workshopId', 'there is no such workshop in this studio');
    const exists = await this.dataSource.manager.existsBy(SpreadEntity, { id: scope.spreadId, studioId });
    if (!exists) throw invalidField('scope.spreadId', 'there is no such spread in this studio');
  }

  /** Withdraws for good; a second time changes nothing. */
  async withdraw(grant: GrantEntity, actor: Actor): Promise<void> {
    if (grant.withdrawnAt) return;
    const at = this.now();
    await this.dataSource.transaction(async (manager) => {
      await manager.update(GrantEntity, { id: grant.id }, { withdrawnAt: at });
      await recordAudit(manager, { studioId: grant.studioId, actor, action: 'grant.withdraw', subjectId: grant.id, at });
    });
  }

  /** The right that a token carries, or null when it is unknown, over or withdrawn. */
  async findLive(token: string): Promise<Grant | null> {
    const grant = await this.dataSource.manager.findOneBy(GrantEntity, { tokenHash: hashToken(token) });
    if (!grant || grant.withdrawnAt || (grant.expiresAt && grant.expiresAt <= this.now())) return null;
    return { id: grant.id, studioId: grant.studioId, scope: grant.scope };
  }
}
