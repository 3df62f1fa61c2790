import type { DataSource, EntityManager } from 'typeorm';
import { MAX_STASH_SHEETS, type BulkStash, type CreateStashSheet, type UpdateStashSheet } from '../../shared/contracts/stash';
import { AppError } from '../../shared/errors';
import type { Target } from '../../shared/model/people';
import { StashSheetEntity } from '../entities/stash-sheet-entity';
import { StashSideEntity } from '../entities/stash-side-entity';
import { presentStashSheet } from '../presenters/present-stash';
import { createOnce } from './create-once';
import { isReferenced } from './database-errors';
import { invalidField } from './invalid-field';
import { columnsOf, counted, countReserved, lockSheets, requireQuantity, sideRows, writeSides, type CountedSheet } from './stash-rows';
import { lockStudio } from './stored-pictures';

export class StashService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly now: () => Date,
  ) {}

  /** @throws AppError('not-found'). */
  private async get(id: string, manager: EntityManager = this.dataSource.manager): Promise<CountedSheet> {
    const sheet = await manager.findOne(StashSheetEntity, { where: { id }, relations: { sides: true } });
    if (!sheet) throw new AppError('not-found');
    return (await counted(manager, [sheet]))[0]!;
  }

  async locate(id: string): Promise<{ readonly target: Target; readonly subject: StashSheetEntity }> {
    const { sheet } = await this.get(id);
    return { target: { studioId: sheet.studioId }, subject: sheet };
  }

  /** The whole stash, in the order in which it was entered. */
  async list(studioId: string): Promise<CountedSheet[]> {
    const { manager } = this.dataSource;
    const sheets = await manager.find(StashSheetEntity, { where: { studioId }, relations: { sides: true }, order: { createdAt: 'ASC', id: 'ASC' } });
    return counted(manager, sheets);
  }

  /** @throws AppError `already-exists` · `invalid-input` when the stash holds no more. */
  async create(studioId: string, { id, sides, ...columns }: CreateStashSheet): Promise<CountedSheet> {
    const at = this.now();
    return this.dataSource.transaction(async (manager) => {
      await lockStudio(manager, studioId);
      await requireRoomFor(manager, studioId, 1);
      const row = { ...columns, id, studioId, revision: 0, createdAt: at, updatedAt: at };
      const { isNew } = await createOnce(manager, StashSheetEntity, row, 'sheet', (existing) => existing.studioId === studioId);
      if (isNew) await manager.insert(StashSideEntity, sideRows(id, sides));
      return this.get(id, manager);
    });
  }

  /** @throws AppError `stale-revision` with the sheet as it stands · `stash-short` for fewer sheets than are reserved. */
  async update({ id, studioId }: StashSheetEntity, { baseRevision, ...changes }: UpdateStashSheet): Promise<CountedSheet> {
    return this.dataSource.transaction(async (manager) => {
      const [locked] = await lockSheets(manager, studioId, [id]);
      if (!locked) throw new AppError('not-found');
      if (locked.revision !== baseRevision) throw new AppError('stale-revision', { sheet: presentStashSheet(await this.get(id, manager)) });
      const { quantity, sides } = changes;
      if (quantity !== undefined) requireQuantity(locked, quantity, (await countReserved(manager, [id])).get(id) ?? 0);
      await manager.update(StashSheetEntity, { id }, { ...columnsOf(changes), revision: baseRevision + 1, updatedAt: this.now() });
      if (sides) await writeSides(manager, id, sides);
      return this.get(id, manager);
    });
  }

  /** Gives many sheets the same values, all of them or none. */
  async updateMany(studioId: string, { sheetIds, change: { quantityBy, ...columns } }: BulkStash): Promise<CountedSheet[]> {
    await this.dataSource.transaction(async (manager) => {
      const locked = await lockSheets(manager, studioId, sheetIds);
      if (locked.length !== new Set(sheetIds).size) throw invalidField('sheetIds', 'not all of these sheets are in this stash');
      const reserved = await countReserved(manager, sheetIds);
      for (const sheet of locked) {
        const quantity = sheet.quantity + (quantityBy ?? 0);
        if (quantityBy !== undefined) requireQuantity(sheet, quantity, reserved.get(sheet.id) ?? 0);
        await manager.update(StashSheetEntity, { id: sheet.id }, { ...columns, quantity, revision: sheet.revision + 1, updatedAt: this.now() });
      }
    });
    return this.list(studioId);
  }

  /** @throws AppError('in-use') while a spread has reserved some of them. */
  async remove({ id }: StashSheetEntity): Promise<void> {
    try {
      await this.dataSource.manager.delete(StashSheetEntity, { id });
    } catch (error) {
      if (isReferenced(error)) throw new AppError('in-use');
      throw error;
    }
  }
}

/** @throws AppError('invalid-input') where so many more kinds of sheet would be too many. */
export async function requireRoomFor(manager: EntityManager, studioId: string, more: number): Promise<void> {
  const there = await manager.countBy(StashSheetEntity, { studioId });
  if (there + more > MAX_STASH_SHEETS) throw invalidField('id', `a stash holds ${MAX_STASH_SHEETS} kinds of sheet at most; this one has ${there}`);
}
