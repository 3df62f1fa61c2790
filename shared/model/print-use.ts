import { copiesNeeded, type CopyUse } from '../geometry/copies';
import { contentRect } from '../geometry/grid';
import { windowOnPaper } from '../geometry/window';
import type { MatId, PrintId } from './ids';
import type { SpreadDocument } from './spread';

/** One use of a print: by a mat, or by all the panes of a split print together. */
export interface PrintUse {
  readonly matIds: readonly MatId[];
  readonly asked: CopyUse;
}

/**
 * Every use of each print in a document, in drawing order, split prints last. A print that only lies ready has none;
 * colours that came from a print do not use it.
 *
 * @returns prints in the order in which the document first names them.
 */
export function printUses(doc: SpreadDocument): Map<PrintId, PrintUse[]> {
  const uses = new Map<PrintId, PrintUse[]>();
  const usesOf = (id: PrintId): PrintUse[] => {
    let list = uses.get(id);
    if (!list) uses.set(id, (list = []));
    return list;
  };
  for (const mat of doc.mats) {
    const { content } = mat;
    if (content.kind !== 'print') continue;
    const window = windowOnPaper(content, contentRect(doc.format, doc.reveal, mat));
    usesOf(content.printId).push({ matIds: [mat.id], asked: content.mode === 'whole' ? { kind: 'all' } : { kind: 'piece', window } });
  }
  for (const group of doc.panes) if (group.content) usesOf(group.content.printId).push({ matIds: group.matIds, asked: { kind: 'all' } });
  doc.table.forEach(usesOf);
  return uses;
}

/**
 * How many copies of each print a document needs: see `copiesNeeded`. 0 for a print that only lies ready.
 *
 * @param tolerance - kept between two pieces of one copy, in Lengths.
 */
export const copiesUsed = (doc: SpreadDocument, tolerance: number): Map<PrintId, number> =>
  new Map([...printUses(doc)].map(([id, uses]) => [id, copiesNeeded(uses.map(({ asked }) => asked), tolerance)]));

/** Every print that a document names, those that only gave a colour included. */
export function namedPrints(doc: SpreadDocument): Set<PrintId> {
  const colors = doc.scheme ? Object.values(doc.scheme.colors) : [];
  return new Set([...printUses(doc).keys(), ...colors.flatMap((color) => color.printIds)]);
}
