import { facesOf } from '../geometry/faces';
import { centre } from '../geometry/rects';
import type { Side } from '../model/ids';
import { defineCheck, type Finding, type Remedy, type SpreadView } from './check';
import { piecesOf, type Piece } from './pieces';
import { swap } from './shapes';

/**
 * A subject near the outer edge of a page that looks off it: the photo's middle lies in the outer `share` of the
 * page, and every face in it that looks to a side looks outward. Swapped with a photo of the same size it looks
 * into the spread; a picture is never mirrored. Looking up or down does not count, nor do panes.
 */
export const looksOffPage = defineCheck({
  id: 'looks-off-page',
  severity: 'consider',
  basis: { kind: 'common-practice' },
  needsFilledPages: true,
  thresholds: { share: { default: 0.5, min: 0.1, max: 1, unit: 'share' } },
  find: (view, { share }) =>
    piecesOf(view).flatMap((piece): Finding[] => {
      const way = lookOf(piece);
      const photo = piece.photos[0]!;
      if (!way || piece.groupId !== null || way !== outward(view, photo.page)) return [];
      const { width } = view.doc.format;
      const x = centre(photo.rect).x;
      const fromEdge = photo.page === 'left' ? x : width - x;
      if (fromEdge > share * width) return [];
      return [{ messageId: 'looks-off-page', data: { title: piece.print.title }, matIds: piece.matIds, remedies: () => swaps(view, piece, way, share) }];
    }),
});

/** A single page has no side that is inward. */
const outward = ({ doc }: SpreadView, page: Side): Side | null => (doc.pages.left && doc.pages.right ? page : null);

/** The side to which all faces look that the photo shows and that look to a side, as it lies on the page. */
function lookOf({ print, placement, window }: Piece): Side | null {
  if (print.faces.length === 0 || placement.turn % 2 === 1) return null;
  const sides = new Set(
    facesOf(print, placement).flatMap(({ rect, facing }): Side[] => {
      const { x, y } = centre(rect);
      const isSeen = x >= window.x && y >= window.y && x <= window.x + window.width && y <= window.y + window.height;
      if (!isSeen || !facing || facing === 'ahead') return [];
      return [placement.turn === 2 ? (facing === 'left' ? 'right' : 'left') : facing];
    }),
  );
  return sides.size === 1 ? [...sides][0]! : null;
}

/** Photos on mats of the same size: those of the other page first, then those nearer to the gutter; none that would look off in its turn. */
function swaps(view: SpreadView, piece: Piece, way: Side, share: number): Remedy[] {
  const mat = view.matById.get(piece.matIds[0]!)!;
  const { width } = view.doc.format;
  const others = piecesOf(view).flatMap((other) => {
    const place = view.matById.get(other.matIds[0]!);
    if (!place || other.groupId !== null || place.id === mat.id || place.w !== mat.w || place.h !== mat.h || lookOf(other) === way) return [];
    const x = centre(other.photos[0]!.rect).x;
    const fromEdge = place.page === 'left' ? x : width - x;
    if (place.page === mat.page && fromEdge <= share * width) return [];
    return [{ place, isFar: place.page === mat.page }];
  });
  return others.sort((a, b) => Number(a.isFar) - Number(b.isFar)).map(({ place }) => swap(mat, place));
}
