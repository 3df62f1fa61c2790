import type { DataSource, EntityManager } from 'typeorm';
import { PICTURE_SIZES, type PictureSize } from '../../shared/contracts/prints';
import type { StudioId } from '../../shared/model/ids';
import { FileEntity } from '../entities/file-entity';
import { StudioEntity } from '../entities/studio-entity';
import { originalKey, pictureKey, type Storage, type StorageKey } from '../storage/storage';

export interface Content {
  readonly studioId: StudioId;
  readonly sha256: string;
}

export const SIZES = Object.keys(PICTURE_SIZES) as PictureSize[];

/** Every key under which one original and what was made of it are stored. */
export const keysOf = ({ studioId, sha256 }: Content): StorageKey[] => [
  originalKey(studioId, sha256),
  ...SIZES.map((size) => pictureKey(studioId, sha256, size)),
];

/** Holds the studio's row until the transaction ends: its files and its quota change one upload at a time. */
export async function lockStudio(manager: EntityManager, studioId: StudioId): Promise<StudioEntity> {
  return manager.findOneOrFail(StudioEntity, { where: { id: studioId }, lock: { mode: 'pessimistic_write' } });
}

/** Deletes what is stored for a content of which no row knows: after an intake that failed or died. */
export async function removeUnlessKnown(dataSource: DataSource, storage: Storage, content: Content): Promise<void> {
  await dataSource.transaction(async (manager) => {
    const studio = await manager.findOne(StudioEntity, {
      where: { id: content.studioId },
      lock: { mode: 'pessimistic_write' },
    });
    const isKnown = studio !== null && (await manager.existsBy(FileEntity, { ...content }));
    if (isKnown) return;
    for (const key of keysOf(content)) await storage.delete(key);
  });
}
