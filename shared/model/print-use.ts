import type { PrintId } from './ids';
import type { SpreadDocument } from './spread';

/**
 * How many copies of each print a document uses: one for every mat that carries it and one for every split print,
 * however many panes. A print that only lies ready counts 0. Colours that came from a print do not use it.
 *
 * @returns prints in the order in which the document first names them.
 */
export function printUse(doc: SpreadDocument): Map<PrintId, number> {
  const use = new Map<PrintId, number>();
  const count = (id: PrintId, copies: number): void => void use.set(id, (use.get(id) ?? 0) + copies);
  for (const mat of doc.mats) if (mat.content.kind === 'print') count(mat.content.printId, 1);
  for (const group of doc.panes) if (group.content) count(group.content.printId, 1);
  for (const id of doc.table) count(id, 0);
  return use;
}

/** Every print that a document names, those that only gave a colour included. */
export function namedPrints(doc: SpreadDocument): Set<PrintId> {
  const colors = doc.scheme ? Object.values(doc.scheme.colors) : [];
  return new Set([...printUse(doc).keys(), ...colors.flatMap((color) => color.printIds)]);
}
