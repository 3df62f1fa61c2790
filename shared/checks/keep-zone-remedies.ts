import { innerMatRect, matRect, revealOf } from '../geometry/grid';
import { neededOf, paperOf } from '../geometry/keep-zone';
import { turnedSize } from '../geometry/paper';
import type { Length } from '../model/length';
import type { Rect, Size } from '../model/rect';
import type { Mat } from '../model/spread';
import { MIN_REVEAL } from '../model/trim-settings';
import type { Remedy, SpreadView } from './check';
import { growMat } from './resize-mat';
import { motifsOf } from './motifs';
import type { Piece } from './pieces';

/**
 * Ways out of a cut that takes the keep zone, in PRODUCT.md's order: slide the window, mount whole, larger
 * mat, no reveal, thinner reveal on the whole group but never under 1/16 in. Each is a command that may
 * turn out not to help; `safeRemedy` tries them.
 */
export function keepZoneRemedies(view: SpreadView, piece: Piece): readonly Remedy[] {
  const needed = neededOf(piece.print, piece.placement, view.trim.tolerance);
  if (!needed) return [];
  return [...slide(piece, needed, view.trim.finestMark), ...mountWhole(view, piece), ...largerMat(view, piece, needed), ...lessReveal(view, piece, needed)];
}

/** The nearest place of the window, on the trimmer's mark, that holds what is needed. */
export function slide(piece: Piece, needed: Rect, mark: Length): Remedy[] {
  const { window, placement } = piece;
  const dx = slideBy(window.x, window.width, needed.x, needed.width, placement.x, mark);
  const dy = slideBy(window.y, window.height, needed.y, needed.height, placement.y, mark);
  if (dx === null || dy === null || (dx === 0 && dy === 0)) return [];
  const args = { matId: piece.matIds[0]!, x: placement.x + dx, y: placement.y + dy };
  return [{ messageId: 'slide-window', data: {}, call: { id: 'window.slide', args } }];
}

/** The least move along one axis after which `origin` is on the mark and the window holds the interval; null where none does. */
export function slideBy(at: number, length: number, needed: number, neededLength: number, origin: number, mark: Length): number | null {
  const least = needed + neededLength - length - at;
  const most = needed - at;
  const first = Math.ceil((origin + least) / mark) * mark - origin;
  const last = Math.floor((origin + most) / mark) * mark - origin;
  if (first > last) return null;
  return least <= 0 && most >= 0 ? 0 : least > 0 ? first : last;
}

/** Offered only where the whole paper fits its card, since an overhanging print cannot be mounted. */
export function mountWhole(view: SpreadView, piece: Piece): Remedy[] {
  const mat = piece.groupId === null ? view.matById.get(piece.matIds[0]!) : undefined;
  if (!mat || piece.placement.mode === 'whole') return [];
  const card = cardOf(view, mat);
  const size = turnedSize(paperOf(piece.print, piece.placement), piece.placement.turn);
  if (size.width > card.width || size.height > card.height) return [];
  return [{ messageId: 'mount-whole', data: {}, call: { id: 'placement.setWhole', args: { matId: mat.id, whole: true } } }];
}

/** The card that a whole print lies on: the inner mat, or the mat. */
export const cardOf = ({ doc }: SpreadView, mat: Mat): Rect => innerMatRect(doc.format, doc.reveal, mat) ?? matRect(doc.format, mat);

function largerMat(view: SpreadView, piece: Piece, needed: Rect): Remedy[] {
  const mat = piece.groupId === null ? view.matById.get(piece.matIds[0]!) : undefined;
  return mat ? missingOnPage(piece, needed, view.trim.finestMark).flatMap((missing) => growMat(view, mat, missing)) : [];
}

/**
 * By how much the photo is too small on the page, never negative; two answers, since a window whose photo
 * grows is centred anew where it was centred on the keep zone, and keeps its centre where somebody slid it.
 */
function missingOnPage({ window, placement }: Piece, needed: Rect, mark: Length): readonly Size[] {
  const onMark = (at: number, length: number, start: number, needs: number, origin: number): number => {
    if (slideBy(at, length, start, needs, origin, mark) !== null) return 0;
    const shift = at - origin;
    const corner = Math.floor((start - shift) / mark) * mark + shift;
    return Math.max(0, start + needs - corner - length);
  };
  // The centre is kept only to the nearest mark.
  const aroundCentre = (at: number, length: number, start: number, needs: number): number =>
    Math.max(0, 2 * (Math.max(at - start, start + needs - at - length) + mark / 2));
  return [onMark, aroundCentre].map((missing) =>
    turnedSize(
      {
        width: missing(window.x, window.width, needed.x, needed.width, placement.x),
        height: missing(window.y, window.height, needed.y, needed.height, placement.y),
      },
      placement.turn,
    ),
  );
}

function lessReveal(view: SpreadView, piece: Piece, needed: Rect): Remedy[] {
  const mat = view.matById.get(piece.matIds[0]!);
  if (!mat) return [];
  const reveal = revealOf(mat, view.doc.reveal);
  const mark = view.trim.finestMark;
  // A reveal gives way on both sides of the photo; it is measured on the mark as well.
  const enough = missingOnPage(piece, needed, mark).map(({ width, height }) => Math.floor((reveal - Math.max(width, height) / 2) / mark) * mark);
  const thinner = [...new Set(enough.filter((least) => least >= MIN_REVEAL && least < reveal))];
  const matIds = groupOf(view, piece, mat);
  const none: Remedy = { messageId: 'no-reveal', data: {}, call: { id: 'mats.setReveal', args: { matIds: piece.matIds, reveal: 0 } } };
  return [
    ...(reveal > 0 && Math.max(...enough) >= 0 ? [none] : []),
    ...thinner.map((least): Remedy => ({ messageId: 'thinner-reveal', data: { reveal: least }, call: { id: 'mats.setReveal', args: { matIds, reveal: least } } })),
  ];
}

/** Mats that should keep one reveal: the panes of a split print, the strip or pinwheel that a mat belongs to, or itself. */
function groupOf(view: SpreadView, piece: Piece, mat: Mat): readonly string[] {
  if (piece.groupId !== null) return piece.matIds;
  return motifsOf(view).find((motif) => motif.mats.includes(mat))?.mats.map((member) => member.id) ?? [mat.id];
}
