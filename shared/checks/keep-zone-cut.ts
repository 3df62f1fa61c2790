import { holdsZone, isUncut, onPiece, paperOf, withSpare, zoneOf } from '../geometry/keep-zone';
import { turnedSize } from '../geometry/paper';
import { bottom, right } from '../geometry/rects';
import type { Rect, Size } from '../model/rect';
import { defineCheck, type Finding, type Message, type SpreadView } from './check';
import { keepZoneRemedies } from './keep-zone-remedies';
import type { Edge } from './messages';
import { piecesOf, type Piece } from './pieces';

/**
 * A trimmed print whose window does not hold its keep zone with the cutting tolerance to spare; for a small piece
 * that was placed for one of the print's details, that detail. The paper's own edge is not cut and needs nothing to
 * spare. For a split print the window is the one over all panes; what the seams take
 * belongs to `seam-through-keep-zone`.
 */
export const keepZoneCut = defineCheck({
  id: 'keep-zone-cut',
  severity: 'stop',
  basis: { kind: 'common-practice' },
  needsFilledPages: false,
  yieldsTo: ['never-cut', 'window-off-paper'],
  thresholds: {},
  find: (view) =>
    piecesOf(view).flatMap((piece): Finding[] => {
      const paper = paperOf(piece.print, piece.placement);
      if (isUncut(piece.window, paper) || holdsZone(piece.window, piece.print, piece.placement, view.trim.tolerance)) return [];
      return [{ ...explain(view, piece, paper), matIds: piece.matIds, remedies: () => keepZoneRemedies(view, piece) }];
    }),
});

/** What to say: that the zone does not fit at all, how much of it is lost, or how little is left to spare. */
function explain(view: SpreadView, piece: Piece, paper: Rect): Message {
  const { title } = piece.print;
  const keep = zoneOf(piece.print, piece.placement)!;
  const photo = turnedSize(piece.window, piece.placement.turn);
  const zone = onPiece(keep, piece.window, piece.placement.turn);
  const wider = zone.width - photo.width;
  const higher = zone.height - photo.height;
  if (wider > 0 && wider >= higher) {
    return { messageId: 'keep-zone-larger', data: { title, zone: zone.width, window: photo.width, axis: 'wide' } };
  }
  if (higher > 0) return { messageId: 'keep-zone-larger', data: { title, zone: zone.height, window: photo.height, axis: 'high' } };

  const needed = onPiece(withSpare(keep, paper, view.trim.tolerance), piece.window, piece.placement.turn);
  const spares = sparesOf(zone, photo);
  const missing = EDGES.filter((edge) => sparesOf(needed, photo)[edge] < 0);
  const edge = missing.reduce((worst, next) => (spares[next] < spares[worst] ? next : worst), missing[0] ?? 'left');
  const spare = spares[edge];
  return spare < 0
    ? { messageId: 'keep-zone-missed', data: { title, lost: -spare, edge } }
    : { messageId: 'keep-zone-tight', data: { title, spare, tolerance: view.trim.tolerance, edge } };
}

const EDGES: readonly Edge[] = ['left', 'right', 'top', 'bottom'];

/** How far inside the piece each edge of a rectangle stands; negative where it is cut. */
const sparesOf = (rect: Rect, piece: Size): Readonly<Record<Edge, number>> => ({
  left: rect.x,
  right: piece.width - right(rect),
  top: rect.y,
  bottom: piece.height - bottom(rect),
});
