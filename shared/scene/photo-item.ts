import { onPiece, paperOf } from '../geometry/keep-zone';
import { toPicture } from '../geometry/paper';
import type { PlacedPhoto } from '../geometry/placed-photos';
import { intersection, movedBy } from '../geometry/rects';
import type { Turns } from '../model/ids';
import type { Print } from '../model/print';
import type { PhotoItem } from './scene';

/**
 * One visible piece of a print. Where the window leaves the paper there is no photo, so the piece is
 * clipped to the paper; a whole print keeps its true size and lies over its mat's edges where it is
 * larger.
 *
 * @param placed - the piece, in page space.
 * @param at - the page's corner in the scene.
 * @returns null where the window shows nothing of the paper.
 */
export function photoItem(placed: PlacedPhoto, print: Print, at: { readonly x: number; readonly y: number }): PhotoItem | null {
  const { placement, window } = placed;
  const paper = paperOf(print, placement);
  const visible = intersection(window, paper);
  if (!visible) return null;
  const rect = movedBy(movedBy(onPiece(visible, window, placement.turn), placed.rect), at);
  const frame = { paperRect: print.paperRect, turns: print.turns, paperWidth: paper.width, paperHeight: paper.height };
  return {
    kind: 'photo',
    key: `${placed.matId}/photo`,
    matId: placed.matId,
    printId: placed.printId,
    rect,
    source: toPicture(frame, visible),
    turns: ((print.turns + placement.turn) % 4) as Turns,
    imageWidth: print.imageWidth,
    imageHeight: print.imageHeight,
  };
}
