import { In, type EntityManager } from 'typeorm';
import { AppError } from '../../shared/errors';
import type { StashFacts, StashSides } from '../../shared/model/stash';
import { StashReservationEntity } from '../entities/stash-reservation-entity';
import { StashSheetEntity } from '../entities/stash-sheet-entity';
import { FACES, StashSideEntity } from '../entities/stash-side-entity';

/** A sheet with its sides, and how many of it are reserved. */
export interface CountedSheet {
  readonly sheet: StashSheetEntity;
  readonly reserved: number;
}

/** How many of each sheet spreads have reserved; sheets without any are left out. */
export async function countReserved(manager: EntityManager, sheetIds: readonly string[], exceptSpreadId?: string): Promise<ReadonlyMap<string, number>> {
  if (sheetIds.length === 0) return new Map();
  const query = manager
    .createQueryBuilder(StashReservationEntity, 'reservation')
    .select('reservation.sheetId', 'sheetId')
    .addSelect('SUM(reservation.sheets)', 'sheets')
    .where('reservation.sheetId IN (:...sheetIds)', { sheetIds })
    .groupBy('reservation.sheetId');
  if (exceptSpreadId !== undefined) query.andWhere('reservation.spreadId <> :exceptSpreadId', { exceptSpreadId });
  const rows = await query.getRawMany<{ sheetId: string; sheets: string }>();
  return new Map(rows.map(({ sheetId, sheets }) => [sheetId, Number(sheets)]));
}

/** The sheets, with sides and counts, in the given order. */
export async function counted(manager: EntityManager, sheets: readonly StashSheetEntity[]): Promise<CountedSheet[]> {
  const reserved = await countReserved(manager, sheets.map(({ id }) => id));
  return sheets.map((sheet) => ({ sheet, reserved: reserved.get(sheet.id) ?? 0 }));
}

/**
 * Holds these sheets' rows until the transaction ends, always in the same order, so that two spreads that want the
 * same sheets wait for each other and do not lock up.
 *
 * @returns the rows found, without their sides.
 */
export async function lockSheets(manager: EntityManager, studioId: string, sheetIds: readonly string[]): Promise<StashSheetEntity[]> {
  if (sheetIds.length === 0) return [];
  return manager.find(StashSheetEntity, { where: { studioId, id: In([...sheetIds]) }, order: { id: 'ASC' }, lock: { mode: 'pessimistic_write' } });
}

/** @throws AppError('stash-short') where fewer sheets would be left than are reserved. */
export function requireQuantity({ name }: { readonly name: string }, quantity: number, reserved: number): void {
  if (quantity < reserved) throw new AppError('stash-short', { sheets: [{ name, wanted: reserved, free: Math.max(0, quantity) }] });
}

/** Puts these sides in the place of whatever sides the sheet has. */
export async function writeSides(manager: EntityManager, sheetId: string, sides: StashSides): Promise<void> {
  await manager.delete(StashSideEntity, { sheetId });
  await manager.insert(StashSideEntity, sideRows(sheetId, sides));
}

export const sideRows = (sheetId: string, sides: StashSides) =>
  sides.map(({ hex, source, uncertainty, pattern, palette }, i) => ({ sheetId, face: FACES[i]!, hex, source, uncertainty, pattern, palette: [...palette] }));

/** The columns of a sheet, without its sides. */
export function columnsOf<T extends Partial<StashFacts>>(facts: T): Omit<T, 'sides'> {
  const { sides: _sides, ...columns } = facts;
  return columns;
}
