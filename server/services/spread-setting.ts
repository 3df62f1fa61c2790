import { In, type DataSource } from 'typeorm';
import type { SpreadDocument } from '../../shared/model/spread';
import { namedPrints } from '../../shared/model/print-use';
import type { CheckSettingEntity } from '../entities/check-setting-entity';
import { AlbumEntity } from '../entities/album-entity';
import { PrintEntity } from '../entities/print-entity';
import type { SpreadEntity } from '../entities/spread-entity';
import { SpreadPrintEntity } from '../entities/spread-print-entity';
import { StudioEntity } from '../entities/studio-entity';
import type { CheckSettingService } from './check-setting-service';
import { readDocument } from './spread-service';

/** What a spread stands in: all that Compose needs beside the document. */
export interface SpreadSetting {
  readonly album: AlbumEntity;
  readonly studio: StudioEntity;
  readonly prints: readonly PrintEntity[];
  /** Copies of each of the studio's prints that its other live spreads use. */
  readonly usedElsewhere: Readonly<Record<string, number>>;
  /** What the studio and the spread say about checks. */
  readonly checks: { readonly studio: readonly CheckSettingEntity[]; readonly spread: readonly CheckSettingEntity[] };
}

export async function loadSpreadSetting(dataSource: DataSource, checkSettings: CheckSettingService, spread: SpreadEntity): Promise<SpreadSetting> {
  const { studioId } = spread;
  const [album, studio, prints, ofStudio, ofSpread] = await Promise.all([
    dataSource.manager.findOneByOrFail(AlbumEntity, { id: spread.albumId }),
    dataSource.manager.findOneByOrFail(StudioEntity, { id: spread.studioId }),
    loadNamedPrints(dataSource, studioId, [readDocument(spread)]),
    checkSettings.list({ studioId, spreadId: null }),
    checkSettings.list({ studioId, spreadId: spread.id }),
  ]);
  return { album, studio, prints, usedElsewhere: await countElsewhere(dataSource, spread), checks: { studio: ofStudio, spread: ofSpread } };
}

/** Every print of the studio that one of the documents names, oldest first. */
export async function loadNamedPrints(dataSource: DataSource, studioId: string, docs: readonly SpreadDocument[]): Promise<PrintEntity[]> {
  const ids = new Set(docs.flatMap((doc) => [...namedPrints(doc)]));
  if (ids.size === 0) return [];
  return dataSource.manager.find(PrintEntity, { where: { studioId, id: In([...ids]) }, order: { createdAt: 'ASC', id: 'ASC' } });
}

/** Spreads in the bin use nothing, nor do those of an album in the bin. */
async function countElsewhere(dataSource: DataSource, spread: SpreadEntity): Promise<Record<string, number>> {
  const rows = await dataSource.manager
    .createQueryBuilder(SpreadPrintEntity, 'use')
    .innerJoin('use.spread', 'spread')
    .innerJoin('spread.album', 'album')
    .select('use.printId', 'printId')
    .addSelect('SUM(use.copies)', 'copies')
    .where('spread.studioId = :studioId AND spread.id <> :spreadId', { studioId: spread.studioId, spreadId: spread.id })
    .andWhere('spread.binnedAt IS NULL AND album.binnedAt IS NULL')
    .groupBy('use.printId')
    .having('SUM(use.copies) > 0')
    .getRawMany<{ printId: string; copies: string }>();
  return Object.fromEntries(rows.map(({ printId, copies }) => [printId, Number(copies)]));
}
