import type { DataSource } from 'typeorm';
import { AppError } from '../../shared/errors';
import { SpreadEntity } from '../entities/spread-entity';
import { StashReservationEntity } from '../entities/stash-reservation-entity';
import { invalidField } from './invalid-field';
import { countReserved, lockSheets } from './stash-rows';

interface Wanted {
  readonly sheetId: string;
  readonly sheets: number;
}

/** Sets sheets aside for spreads: no sheet is ever counted for two of them. */
export class ReservationService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly now: () => Date,
  ) {}

  list(spreadId: string): Promise<StashReservationEntity[]> {
    return this.dataSource.manager.find(StashReservationEntity, { where: { spreadId }, order: { sheetId: 'ASC' } });
  }

  /**
   * Sets aside exactly these sheets for the spread, in the place of what it had, all of them or none.
   *
   * @throws AppError `stash-short` naming what is not free · `invalid-input` for a sheet that is not in this stash.
   */
  async reserve({ id: spreadId, studioId }: Pick<SpreadEntity, 'id' | 'studioId'>, wanted: readonly Wanted[]): Promise<StashReservationEntity[]> {
    await this.dataSource.transaction(async (manager) => {
      // One spread's own requests wait for each other; then the sheets, so that two spreads do.
      await manager.findOneOrFail(SpreadEntity, { select: { id: true }, where: { id: spreadId }, lock: { mode: 'pessimistic_write' } });
      const ids = wanted.map(({ sheetId }) => sheetId);
      const sheets = new Map((await lockSheets(manager, studioId, ids)).map((sheet) => [sheet.id, sheet]));
      const others = await countReserved(manager, ids, spreadId);
      const short = wanted.flatMap(({ sheetId, sheets: count }) => {
        const sheet = sheets.get(sheetId);
        if (!sheet) throw invalidField('sheets', 'not all of these sheets are in this stash');
        const free = Math.max(0, sheet.quantity - (others.get(sheetId) ?? 0));
        return free < count ? [{ sheetId, name: sheet.name, wanted: count, free }] : [];
      });
      if (short.length > 0) throw new AppError('stash-short', { sheets: short });
      await manager.delete(StashReservationEntity, { spreadId });
      if (wanted.length > 0) {
        await manager.insert(StashReservationEntity, wanted.map((row) => ({ ...row, spreadId, createdAt: this.now() })));
      }
    });
    return this.list(spreadId);
  }
}
