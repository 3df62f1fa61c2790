import { copiesNeeded, type CopyUse } from '../geometry/copies';
import { contentRect } from '../geometry/grid';
import { windowOnPaper } from '../geometry/window';
import type { MatId, PrintId } from './ids';
import type { Mat, SpreadDocument } from './spread';

/** One use of a print: by a mat, or by all the panes of a split print together (then `mat` is null). */
export interface PrintUse {
  readonly matIds: readonly MatId[];
  readonly mat: Mat | null;
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
  for (const mat of doc.mats) if (mat.content.kind === 'print') usesOf(mat.content.printId).push({ matIds: [mat.id], mat });
  for (const group of doc.panes) if (group.content) usesOf(group.content.printId).push({ matIds: group.matIds, mat: null });
  doc.table.forEach(usesOf);
  return uses;
}

/**
 * The fewest copies of one print from which all these uses of it can be cut: see `copiesNeeded`.
 *
 * @param tolerance - kept between two pieces of one copy, in Lengths.
 */
export const copiesFor = (doc: SpreadDocument, uses: readonly PrintUse[], tolerance: number): number =>
  uses.length <= 1 ? uses.length : copiesNeeded(uses.map(({ mat }) => askedOf(doc, mat)), tolerance);

function askedOf(doc: SpreadDocument, mat: Mat | null): CopyUse {
  if (mat?.content.kind !== 'print' || mat.content.mode === 'whole') return { kind: 'all' };
  return { kind: 'piece', window: windowOnPaper(mat.content, contentRect(doc.format, doc.reveal, mat)) };
}

/** How many copies of each print a document needs; 0 for a print that only lies ready. */
export const copiesUsed = (doc: SpreadDocument, tolerance: number): Map<PrintId, number> =>
  new Map([...printUses(doc)].map(([id, uses]) => [id, copiesFor(doc, uses, tolerance)]));

/** Every print that a document names, those that only gave a colour included. */
export function namedPrints(doc: SpreadDocument): Set<PrintId> {
  const colors = doc.scheme ? Object.values(doc.scheme.colors) : [];
  return new Set([...printUses(doc).keys(), ...colors.flatMap((color) => color.printIds)]);
}
