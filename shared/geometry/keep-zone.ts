import type { Print } from '../model/print';
import type { Rect, Size } from '../model/rect';
import type { Placement } from '../model/spread';
import { toPaper, turnInBox } from './paper';
import { contains, inset, intersection } from './rects';
import { placedPaper } from './window';

type Scale = Pick<Placement, 'scaledWidth'>;
/** What decides which zone of a print counts, and how large it is. */
export type ZonePlacement = Scale & Pick<Placement, 'detailId'>;

/** The whole paper of a placed print, from its own corner; a digital photo's at the size it is scaled to. */
export const paperOf = (print: Pick<Print, 'paperWidth' | 'paperHeight'>, placement: Scale): Rect => ({ x: 0, y: 0, ...placedPaper(print, placement) });

const known = new WeakMap<Print, Map<string, Rect | null>>();

/**
 * What a placed print must not lose, on its upright paper as it is placed, in Lengths rounded outward: the detail
 * that the piece is for, or the keep zone. Only the part that is on the paper; null where there is none.
 */
export function zoneOf(print: Print, placement: ZonePlacement): Rect | null {
  const { detailId, scaledWidth } = placement;
  if (scaledWidth !== null) return measure(print, placement);
  let zones = known.get(print);
  if (!zones) known.set(print, (zones = new Map<string, Rect | null>()));
  const key = detailId ?? '';
  let zone = zones.get(key);
  if (zone === undefined) zones.set(key, (zone = measure(print, placement)));
  return zone;
}

function measure(print: Print, placement: ZonePlacement): Rect | null {
  const detail = placement.detailId === null ? undefined : print.details.find(({ id }) => id === placement.detailId);
  const zone = detail?.rect ?? print.keepZone;
  if (!zone) return null;
  const paper = placedPaper(print, placement);
  return intersection(toPaper({ ...print, paperWidth: paper.width, paperHeight: paper.height }, zone), { x: 0, y: 0, ...paper });
}

/**
 * What a cut must leave whole: the zone with the tolerance to spare on every side, but no more than the
 * paper, since the paper's own edge is not cut.
 */
export const withSpare = (zone: Rect, paper: Rect, tolerance: number): Rect => intersection(inset(zone, -tolerance), paper) ?? zone;

/** The zone of a placed print with the tolerance to spare, or null where it has none. */
export function neededOf(print: Print, placement: ZonePlacement, tolerance: number): Rect | null {
  const zone = zoneOf(print, placement);
  return zone && withSpare(zone, paperOf(print, placement), tolerance);
}

/** True where a window keeps what its print is for, tolerance included. A print without a zone has nothing to lose. */
export function holdsZone(window: Rect, print: Print, placement: ZonePlacement, tolerance: number): boolean {
  const needed = neededOf(print, placement, tolerance);
  return !needed || contains(window, needed);
}

/** A rectangle of the paper as it lies on the page, from the corner of the piece that `window` cuts out. */
export const onPiece = (rect: Rect, window: Rect, turn: Placement['turn']): Rect =>
  turnInBox({ ...rect, x: rect.x - window.x, y: rect.y - window.y }, window, turn);

/** True where a window cuts nothing off the paper. */
export const isUncut = (window: Rect, paper: Size): boolean => contains(window, { x: 0, y: 0, ...paper });
