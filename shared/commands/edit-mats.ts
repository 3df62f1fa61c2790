import { inReadingOrder } from '../geometry/cells';
import type { MatId } from '../model/ids';
import { inDrawingOrder, inIdOrder } from '../model/patch';
import type { Mat, PaneGroup, SpreadDocument } from '../model/spread';

export const matOf = (doc: SpreadDocument, id: MatId): Mat | undefined => doc.mats.find((mat) => mat.id === id);

export const groupOf = (doc: SpreadDocument, mat: Mat): PaneGroup | undefined => {
  const { content } = mat;
  return content.kind === 'pane' ? doc.panes.find((group) => group.id === content.groupId) : undefined;
};

/** The mats with these ids, in the document's order, or null where one of them does not exist or none is named. */
export function matsOf(doc: SpreadDocument, ids: readonly MatId[]): Mat[] | null {
  const wanted = new Set(ids);
  const found = doc.mats.filter((mat) => wanted.has(mat.id));
  return found.length === wanted.size && found.length > 0 ? found : null;
}

/** The document with each of the named mats replaced by what `change` makes of it. */
export function changeMats(doc: SpreadDocument, ids: readonly MatId[], change: (mat: Mat) => Mat): SpreadDocument {
  const wanted = new Set(ids);
  return { ...doc, mats: doc.mats.map((mat) => (wanted.has(mat.id) ? change(mat) : mat)) };
}

export const withMats = (doc: SpreadDocument, mats: readonly Mat[]): SpreadDocument => ({
  ...doc,
  mats: [...mats].sort(inDrawingOrder),
});

export const withGroup = (doc: SpreadDocument, group: PaneGroup): SpreadDocument => ({
  ...doc,
  panes: [...doc.panes.filter((other) => other.id !== group.id), group].sort(inIdOrder),
});

/** In reading order; of two at one place, as where one is laid over the other, by id. */
export const matsInReadingOrder = (a: Mat, b: Mat): number => inReadingOrder(a, b) || inIdOrder(a, b);

/**
 * Drawing order for a new mat. One that is laid over goes on top of everything; any other goes under all
 * that are laid over, and since those others never overlap, one z does for all of them.
 */
export function newZ(doc: SpreadDocument, laidOver: boolean): number {
  if (laidOver) return Math.max(0, ...doc.mats.map((mat) => mat.z)) + 1;
  return Math.min(0, ...doc.mats.filter((mat) => mat.laidOver).map((mat) => mat.z - 1));
}
