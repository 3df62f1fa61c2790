import { gridOf } from '../geometry/grid';
import { heightAt, horizonOnPage } from '../geometry/horizon';
import type { PlacedPhoto } from '../geometry/placed-photos';
import { right } from '../geometry/rects';
import { inches } from '../model/length';
import type { Mat } from '../model/spread';
import { defineCheck, type Finding, type Remedy, type SpreadView } from './check';
import { piecesOf, type Piece } from './pieces';

/**
 * Neighbours in a panorama row whose horizons do not meet: two photos of one height side by side, over the
 * gutter as well, each with a horizon marked on its print, whose lines stand further apart than `off` where the
 * photos meet. Sliding one window up or down lines them up; the trimmer's finest mark is as near as it gets.
 * The panes of one split print line up by themselves.
 */
export const horizonsApart = defineCheck({
  id: 'horizons-apart',
  severity: 'consider',
  basis: { kind: 'common-practice' },
  needsFilledPages: false,
  thresholds: { off: { default: inches(1 / 16), min: inches(1 / 32), max: inches(1), unit: 'length' } },
  find: (view, { off }) => {
    const marked = piecesOf(view).flatMap((piece) => {
      const mat = piece.groupId === null && piece.print.horizon ? view.matById.get(piece.matIds[0]!) : undefined;
      return mat ? [{ piece, mat, photo: piece.photos[0]! }] : [];
    });
    if (marked.length < 2) return [];
    const { columns } = gridOf(view.doc.format);
    return marked.flatMap((left): Finding[] => {
      const beside = marked.find((other) => areNeighbours(left.mat, other.mat, columns));
      const from = beside && horizonAt(left, 'right');
      const to = beside && horizonAt(beside, 'left');
      if (!beside || from === null || to === null || from === undefined || to === undefined) return [];
      const apart = to - from;
      if (Math.abs(apart) <= off) return [];
      return [
        {
          messageId: 'horizons-apart',
          data: { title: left.piece.print.title, other: beside.piece.print.title, apart: Math.round(Math.abs(apart)) },
          matIds: [beside.mat.id, left.mat.id],
          remedies: () => [...slideBy(view, beside.piece, apart), ...slideBy(view, left.piece, -apart)],
        },
      ];
    });
  },
});

function areNeighbours(a: Mat, b: Mat, columns: number): boolean {
  if (a.laidOver || b.laidOver || a.y !== b.y || a.h !== b.h) return false;
  if (a.page === b.page) return a.x + a.w === b.x;
  return a.page === 'left' && a.x + a.w === columns && b.x === 0;
}

/** Where the horizon leaves the photo on one side, in page space; null where it does so above or below. */
function horizonAt({ piece, photo }: { readonly piece: Piece; readonly photo: PlacedPhoto }, side: 'left' | 'right'): number | null {
  const line = horizonOnPage(piece.print, photo);
  const y = line && heightAt(line, side === 'left' ? photo.rect.x : right(photo.rect));
  return y !== null && y >= photo.rect.y && y <= photo.rect.y + photo.rect.height ? y : null;
}

/** The window slid so that its picture goes up by `up` on the page; only where the paper reaches that far, and never for a turned print. */
function slideBy({ trim }: SpreadView, { print, placement, window, matIds }: Piece, up: number): Remedy[] {
  if (placement.mode === 'whole' || placement.turn !== 0 || placement.scaledWidth !== null) return [];
  const y = Math.round((placement.y + up) / trim.finestMark) * trim.finestMark;
  if (y === placement.y || y < 0 || y + window.height > print.paperHeight) return [];
  return [{ messageId: 'line-up', data: {}, call: { id: 'window.slide', args: { matId: matIds[0]!, x: placement.x, y } } }];
}
