import { IsNull, Not, type DataSource } from 'typeorm';
import type { CreateAlbum, UpdateAlbum } from '../../shared/contracts/albums';
import { AppError } from '../../shared/errors';
import { DEFAULT_BINDING } from '../../shared/model/page-format';
import type { Actor, Target } from '../../shared/model/people';
import { AlbumEntity } from '../entities/album-entity';
import { SpreadEntity } from '../entities/spread-entity';
import type { Storage } from '../storage/storage';
import { recordAudit } from './audit';
import { createOnce } from './create-once';
import { removeWithExports } from './export-files';
import type { FormatService } from './format-service';
import { invalidField } from './invalid-field';

export interface CountedAlbum {
  readonly album: AlbumEntity;
  /** Spreads that are not in the bin. */
  readonly spreadCount: number;
}

export class AlbumService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly formats: FormatService,
    private readonly storage: Storage,
    private readonly now: () => Date,
  ) {}

  /** @throws AppError('not-found'). */
  async get(id: string): Promise<AlbumEntity> {
    const album = await this.dataSource.manager.findOneBy(AlbumEntity, { id });
    if (!album) throw new AppError('not-found');
    return album;
  }

  async locate(id: string): Promise<{ readonly target: Target; readonly subject: AlbumEntity }> {
    const subject = await this.get(id);
    return { target: { studioId: subject.studioId, albumId: id }, subject };
  }

  /** A studio's albums, oldest first: those in use, or those in the bin. */
  async list(studioId: string, { binned }: { readonly binned: boolean }): Promise<CountedAlbum[]> {
    const albums = await this.dataSource.manager.find(AlbumEntity, {
      where: { studioId, binnedAt: binned ? Not(IsNull()) : IsNull() },
      order: { createdAt: 'ASC', id: 'ASC' },
    });
    const counts = await this.dataSource.manager
      .createQueryBuilder(SpreadEntity, 'spread')
      .select('spread.albumId', 'albumId')
      .addSelect('COUNT(*)', 'count')
      .where('spread.studioId = :studioId AND spread.binnedAt IS NULL', { studioId })
      .groupBy('spread.albumId')
      .getRawMany<{ albumId: string; count: string }>();
    const countOf = new Map(counts.map(({ albumId, count }) => [albumId, Number(count)]));
    return albums.map((album) => ({ album, spreadCount: countOf.get(album.id) ?? 0 }));
  }

  async count(album: AlbumEntity): Promise<CountedAlbum> {
    const spreadCount = await this.dataSource.manager.countBy(SpreadEntity, { albumId: album.id, binnedAt: IsNull() });
    return { album, spreadCount };
  }

  /** @throws AppError `invalid-input` for a format that the studio does not have, `already-exists`. */
  async create(studioId: string, { id, title, formatId }: CreateAlbum): Promise<CountedAlbum> {
    const format = await this.formats.find(studioId, formatId);
    if (!format) throw invalidField('formatId', 'the studio has no such page format');
    const row = { id, studioId, title, format, binding: DEFAULT_BINDING, binnedAt: null, createdAt: this.now() };
    const made = await createOnce(this.dataSource.manager, AlbumEntity, row, 'album', (existing) => existing.studioId === studioId);
    return this.count(made.row);
  }

  /** A changed binding is copied into spreads that are begun after it. */
  async update({ id, binnedAt }: AlbumEntity, { binned, ...rest }: UpdateAlbum): Promise<CountedAlbum> {
    const changes = { ...rest, ...(binned !== undefined && { binnedAt: binned ? (binnedAt ?? this.now()) : null }) };
    if (Object.keys(changes).length > 0) await this.dataSource.manager.update(AlbumEntity, { id }, changes);
    return this.count(await this.get(id));
  }

  /** For good, with all its spreads and the pictures made of them. */
  async remove(album: AlbumEntity, actor: Actor): Promise<void> {
    await this.dataSource.transaction(async (manager) => {
      await removeWithExports(manager, this.storage, { spread: { albumId: album.id } }, () => manager.delete(AlbumEntity, { id: album.id }));
      const { studioId, id: subjectId } = album;
      await recordAudit(manager, { studioId, actor, action: 'album.delete', subjectId, at: this.now() });
    });
  }
}
