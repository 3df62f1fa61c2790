import type { DetailId, MatId, PaneGroupId } from '../model/ids';
import type { Print } from '../model/print';
import type { Size } from '../model/rect';
import type { Mat, PaneGroup, Placement, SpreadDocument } from '../model/spread';
import type { CommandContext } from './command';
import { changeMats, groupOf, matOf, withGroup } from './edit-mats';
import { carryPrint, fitPrint, frameOfGroup, frameOfMat, type Frame } from './fit-print';

/**
 * What carries one picture: a mat, or all the panes of a split print together. Commands on prints and
 * windows speak of places, so that no pane is ever treated by itself.
 */
export type Place = { readonly mat: Mat; readonly group: null } | { readonly mat: null; readonly group: PaneGroup };

export function placeAt(doc: SpreadDocument, matId: MatId): Place | null {
  const mat = matOf(doc, matId);
  if (!mat) return null;
  const group = groupOf(doc, mat);
  return group ? { mat: null, group } : { mat, group: null };
}

export const placeId = (place: Place): MatId | PaneGroupId => place.mat?.id ?? place.group!.id;

/** The print that lies there and how, or null. */
export function pictureAt(place: Place): Placement | null {
  if (place.group) {
    if (!place.group.content) return null;
    const { run: _run, ...placement } = place.group.content;
    return placement;
  }
  if (place.mat.content.kind !== 'print') return null;
  const { kind: _kind, ...placement } = place.mat.content;
  return placement;
}

/** @throws RangeError for a pane group without any mat, which no document has. */
export function frameAt(doc: SpreadDocument, place: Place): Frame {
  if (place.mat) return frameOfMat(doc, place.mat);
  const frame = frameOfGroup(doc, place.group, runAt(place));
  if (!frame) throw new RangeError('a pane group has mats');
  return frame;
}

const runAt = (place: Place): 'behind' | 'apart' => place.group?.content?.run ?? 'behind';

/** The document with that picture there, or with nothing there. Panes are always trimmed, never whole. */
export function putPicture(doc: SpreadDocument, place: Place, placement: Placement | null): SpreadDocument {
  if (place.group) {
    const content = placement && { ...placement, mode: 'window' as const, run: runAt(place) };
    return withGroup(doc, { ...place.group, content });
  }
  return changeMats(doc, [place.mat.id], (mat) => ({
    ...mat,
    content: placement ? { kind: 'print', ...placement } : { kind: 'bare' },
  }));
}

/** Puts a print there as if it had just been dropped, or one of its details. */
export const dropPrint = (doc: SpreadDocument, place: Place, print: Print, context: CommandContext, detailId: DetailId | null = null): SpreadDocument =>
  putPicture(doc, place, fitPrint(print, frameAt(doc, place), context.trim, detailId));

/**
 * Puts there what lay in another frame. A print that the context does not know cannot be measured and is
 * carried over unchanged.
 *
 * @param photo - size of the photo that it came from.
 */
export function carryPicture(doc: SpreadDocument, place: Place, placement: Placement | null, photo: Size, context: CommandContext): SpreadDocument {
  const print = placement && context.prints.get(placement.printId);
  if (!placement || !print) return putPicture(doc, place, placement);
  return putPicture(doc, place, carryPrint(placement, print, photo, frameAt(doc, place), context.trim));
}

/** The prints that the spread shows anywhere. */
export function shownPrints(doc: SpreadDocument): Set<string> {
  return new Set([
    ...doc.mats.flatMap((mat) => (mat.content.kind === 'print' ? [mat.content.printId] : [])),
    ...doc.panes.flatMap((group) => (group.content ? [group.content.printId] : [])),
  ]);
}
