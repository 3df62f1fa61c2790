import { In, IsNull, Not, type DataSource, type EntityManager } from 'typeorm';
import type { CreateSpread, UpdateSpread } from '../../shared/contracts/albums';
import { documentSchema } from '../../shared/contracts/document';
import { AppError } from '../../shared/errors';
import { newDocument } from '../../shared/model/new-document';
import type { Actor, Target } from '../../shared/model/people';
import { SCHEMA_VERSION, type SpreadDocument } from '../../shared/model/spread';
import { upgradeDocument } from '../../shared/model/upgrade-document';
import { AlbumEntity } from '../entities/album-entity';
import { SpreadEntity } from '../entities/spread-entity';
import { SpreadSnapshotEntity } from '../entities/spread-snapshot-entity';
import type { Storage } from '../storage/storage';
import { recordAudit } from './audit';
import { createOnce } from './create-once';
import { removeWithExports } from './export-files';

/** The only way to read a stored document. */
export const readDocument = (row: Pick<SpreadEntity, 'document'>): SpreadDocument => upgradeDocument(row.document);

export class SpreadService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly storage: Storage,
    private readonly now: () => Date,
  ) {}

  /** @throws AppError('not-found'). */
  async get(id: string): Promise<SpreadEntity> {
    const spread = await this.dataSource.manager.findOneBy(SpreadEntity, { id });
    if (!spread) throw new AppError('not-found');
    return spread;
  }

  async locate(id: string): Promise<{ readonly target: Target; readonly subject: SpreadEntity }> {
    const subject = await this.get(id);
    return { target: targetOfSpread(subject), subject };
  }

  /** An album's spreads in their order: those in use, or those in the bin. */
  list(albumId: string, { binned }: { readonly binned: boolean }): Promise<SpreadEntity[]> {
    return this.dataSource.manager.find(SpreadEntity, {
      where: { albumId, binnedAt: binned ? Not(IsNull()) : IsNull() },
      order: { position: 'ASC', createdAt: 'ASC', id: 'ASC' },
    });
  }

  /**
   * A bare spread after the album's others; its first snapshot is where its history starts.
   *
   * @throws AppError `not-found` when the album was deleted meanwhile, `already-exists`.
   */
  async create(album: AlbumEntity, { id, title, pages }: CreateSpread): Promise<SpreadEntity> {
    const at = this.now();
    const document = documentSchema.parse(newDocument(album.format, album.binding, pages));
    return this.dataSource.transaction(async (manager) => {
      await lockAlbum(manager, album.id);
      const last = await manager.maximum(SpreadEntity, 'position', { albumId: album.id });
      const row = {
        id,
        albumId: album.id,
        studioId: album.studioId,
        title,
        position: (last ?? -1) + 1,
        state: 'draft' as const,
        document,
        schemaVersion: SCHEMA_VERSION,
        revision: 0,
        binnedAt: null,
        createdAt: at,
        updatedAt: at,
      };
      const made = await createOnce(manager, SpreadEntity, row, 'spread', (existing) => existing.albumId === album.id);
      if (made.isNew) await manager.insert(SpreadSnapshotEntity, { spreadId: id, revision: 0, document, schemaVersion: SCHEMA_VERSION, at });
      return made.row;
    });
  }

  /** Title, place in the album and bin; the document changes through edits only. */
  async update(spread: SpreadEntity, { title, position, binned }: UpdateSpread): Promise<SpreadEntity> {
    const at = this.now();
    await this.dataSource.transaction(async (manager) => {
      if (position !== undefined) await moveTo(manager, spread, position);
      await manager.update(
        SpreadEntity,
        { id: spread.id },
        {
          updatedAt: at,
          ...(title !== undefined && { title }),
          ...(binned !== undefined && { binnedAt: binned ? (spread.binnedAt ?? at) : null }),
        },
      );
    });
    return this.get(spread.id);
  }

  /** For good, with its history and the pictures made of it. */
  async remove(spread: SpreadEntity, actor: Actor): Promise<void> {
    await this.dataSource.transaction(async (manager) => {
      await removeWithExports(manager, this.storage, { spreadId: spread.id }, () => manager.delete(SpreadEntity, { id: spread.id }));
      const { studioId, id: subjectId } = spread;
      await recordAudit(manager, { studioId, actor, action: 'spread.delete', subjectId, at: this.now() });
    });
  }

  /** Titles of these spreads, for messages. */
  titles(ids: readonly string[]): Promise<Pick<SpreadEntity, 'id' | 'title'>[]> {
    return this.dataSource.manager.find(SpreadEntity, { select: { id: true, title: true }, where: { id: In([...ids]) }, order: { title: 'ASC' } });
  }
}

export const targetOfSpread = (spread: Pick<SpreadEntity, 'studioId' | 'albumId' | 'id'>): Target => ({
  studioId: spread.studioId,
  albumId: spread.albumId,
  spreadId: spread.id,
});

/** Orders of one album's spreads change one after the other. @throws AppError('not-found'). */
async function lockAlbum(manager: EntityManager, albumId: string): Promise<void> {
  const album = await manager.findOne(AlbumEntity, { where: { id: albumId }, lock: { mode: 'pessimistic_write' } });
  if (!album) throw new AppError('not-found');
}

/** Puts the spread at that place and closes the ranks; a place past the end is the end. */
async function moveTo(manager: EntityManager, spread: SpreadEntity, position: number): Promise<void> {
  await lockAlbum(manager, spread.albumId);
  const all = await manager.find(SpreadEntity, {
    select: { id: true, position: true },
    where: { albumId: spread.albumId },
    order: { position: 'ASC', createdAt: 'ASC', id: 'ASC' },
  });
  const ids = all.map(({ id }) => id).filter((id) => id !== spread.id);
  ids.splice(position, 0, spread.id);
  const before = new Map(all.map((row) => [row.id, row.position]));
  for (const [index, id] of ids.entries()) {
    if (before.get(id) !== index) await manager.update(SpreadEntity, { id }, { position: index });
  }
}
