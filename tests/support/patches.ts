import { randomUUID } from 'node:crypto';
import type { Patch } from '#shared/model/patch';
import type { Mat } from '#shared/model/spread';

interface PostedEdit {
  readonly id: string;
  readonly command: string;
  readonly patch: Patch;
}

const edit = (command: string, patch: Patch): PostedEdit => ({ id: randomUUID(), command, patch });

/** Edits as a client posts them, each with an id of its own. */
export class PatchBuilder {
  private lastTable: readonly string[] = [];

  add(mat: Mat): PostedEdit {
    return edit('mats.add', { [`mat/${mat.id}`]: { before: null, after: mat } });
  }

  change(after: Mat, before: Mat): PostedEdit {
    return edit('mats.change', { [`mat/${after.id}`]: { before, after } });
  }

  /** The prints that lie ready, after those that this builder put there before. */
  table(printIds: readonly string[]): PostedEdit {
    const before = this.lastTable;
    this.lastTable = printIds;
    return edit('table.set', { table: { before, after: printIds } });
  }
}
