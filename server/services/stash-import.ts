import { createHash } from 'node:crypto';
import { In, type DataSource, type EntityManager } from 'typeorm';
import { MAX_STASH_SHEETS, type ImportedStash } from '../../shared/contracts/stash';
import { mergeStashRow, readStashCsv, type ReadStash, type StashRow, type StashRowFault } from '../../shared/csv/stash-csv';
import { StashSheetEntity } from '../entities/stash-sheet-entity';
import { StashSideEntity } from '../entities/stash-side-entity';
import { presentStashSheet } from '../presenters/present-stash';
import { columnsOf, counted, sideRows, writeSides, type CountedSheet } from './stash-rows';
import { lockStudio } from './stored-pictures';

const ROWS_AT_ONCE = 500;

/** Takes a CSV file into the stash. */
export class StashImport {
  constructor(
    private readonly dataSource: DataSource,
    private readonly now: () => Date,
  ) {}

  /**
   * Rows that fit are taken; each other one comes back by its line with what is wrong and with its own text. A row
   * with the id of a sheet in this stash changes it in the columns that the file has.
   *
   * @param importId - rows without an id get one made from it and their line, so that a repeat adds nothing twice.
   */
  async take(studioId: string, importId: string, csv: string): Promise<ImportedStash> {
    const read = readStashCsv(csv);
    return this.dataSource.transaction(async (manager) => {
      // Locks the studio: what is counted and looked up here stays true until the end.
      await lockStudio(manager, studioId);
      const rows = read.rows.map((row) => ({ ...row, id: row.id ?? idOfRow(importId, row.line) }));
      const known = await findKnown(manager, rows.map(({ id }) => id));
      let room = MAX_STASH_SHEETS - (await manager.countBy(StashSheetEntity, { studioId }));
      const faults: StashRowFault[] = [...read.faults];
      const added: (StashRow & { readonly id: string })[] = [];
      const seen = new Set<string>();
      let changed = 0;
      for (const row of rows) {
        const there = known.get(row.id);
        const message = seen.has(row.id) ? 'The same “id” stands further up in this file.' : this.whyNot(studioId, row, there, room, read);
        seen.add(row.id);
        if (message !== null) faults.push({ line: row.line, message, text: row.text });
        else if (there) changed += await this.change(manager, there, row, read);
        else {
          added.push(row);
          room -= 1;
        }
      }
      await this.add(manager, studioId, added);
      return { added: added.length, changed, faults: faults.sort((a, b) => a.line - b.line), heading: read.heading };
    });
  }

  private whyNot(studioId: string, row: StashRow, there: CountedSheet | undefined, room: number, { columns }: ReadStash): string | null {
    if (!there) return room > 0 ? null : `The stash holds ${MAX_STASH_SHEETS} kinds of sheet at most.`;
    if (there.sheet.studioId !== studioId) return '“id” is not one of this stash: leave it empty for a new sheet.';
    const { quantity } = mergeStashRow(presentStashSheet(there), row.facts, columns);
    return quantity < there.reserved ? `“quantity” is ${quantity}, and spreads have reserved ${there.reserved}.` : null;
  }

  private async change(manager: EntityManager, there: CountedSheet, { facts }: StashRow, { columns }: ReadStash): Promise<1> {
    const { sheet } = there;
    const merged = mergeStashRow(presentStashSheet(there), facts, columns);
    await manager.update(StashSheetEntity, { id: sheet.id }, { ...columnsOf(merged), revision: sheet.revision + 1, updatedAt: this.now() });
    await writeSides(manager, sheet.id, merged.sides);
    return 1;
  }

  private async add(manager: EntityManager, studioId: string, rows: readonly (StashRow & { readonly id: string })[]): Promise<void> {
    const at = this.now();
    for (let from = 0; from < rows.length; from += ROWS_AT_ONCE) {
      const some = rows.slice(from, from + ROWS_AT_ONCE);
      await manager.insert(StashSheetEntity, some.map(({ id, facts }) => ({ ...columnsOf(facts), id, studioId, revision: 0, createdAt: at, updatedAt: at })));
      await manager.insert(StashSideEntity, some.flatMap(({ id, facts }) => sideRows(id, facts.sides)));
    }
  }
}

async function findKnown(manager: EntityManager, ids: readonly string[]): Promise<ReadonlyMap<string, CountedSheet>> {
  if (ids.length === 0) return new Map();
  const sheets = await manager.find(StashSheetEntity, { where: { id: In([...ids]) }, relations: { sides: true } });
  return new Map((await counted(manager, sheets)).map((found) => [found.sheet.id, found]));
}

/** A UUID (version 8, RFC 9562) that is the same for the same row of the same import. */
function idOfRow(importId: string, line: number): string {
  const bytes = createHash('sha256').update(`${importId}:${line}`).digest().subarray(0, 16);
  bytes[6] = (bytes[6]! & 0x0f) | 0x80;
  bytes[8] = (bytes[8]! & 0x3f) | 0x80;
  const hex = bytes.toString('hex');
  return [hex.slice(0, 8), hex.slice(8, 12), hex.slice(12, 16), hex.slice(16, 20), hex.slice(20)].join('-');
}
