import { toPaper, turnInBox } from '../geometry/paper';
import type { PlacedPhoto } from '../geometry/placed-photos';
import { contains, inset, intersection } from '../geometry/rects';
import { placedPaper } from '../geometry/window';
import type { Print } from '../model/print';
import type { Rect, Size } from '../model/rect';
import type { Placement } from '../model/spread';

interface PaperZones {
  readonly keep: Rect | null;
  readonly details: readonly Rect[];
}

const known = new WeakMap<Print, PaperZones>();

/** A print's keep zone and details on its upright paper, in Lengths. */
function zonesOf(print: Print): PaperZones {
  let zones = known.get(print);
  if (!zones) {
    zones = {
      keep: print.keepZone && toPaper(print, print.keepZone),
      details: print.details.map((detail) => toPaper(print, detail.rect)),
    };
    known.set(print, zones);
  }
  return zones;
}

/** The whole paper of a placed print, from its own corner; a digital photo's at the size it is scaled to. */
export function paperOf(print: Print, placement: Pick<Placement, 'scaledWidth'>): Rect {
  return { x: 0, y: 0, ...placedPaper(print, placement) };
}

/** A zone measured at the print's own size, at the size it is placed. Only a digital photo differs. */
function scaled(zone: Rect, print: Print, placement: Pick<Placement, 'scaledWidth'>): Rect {
  if (placement.scaledWidth === null) return zone;
  const factor = placement.scaledWidth / print.paperWidth;
  const x = Math.floor(zone.x * factor);
  const y = Math.floor(zone.y * factor);
  return { x, y, width: Math.ceil((zone.x + zone.width) * factor) - x, height: Math.ceil((zone.y + zone.height) * factor) - y };
}

/** The part of the keep zone that is on the paper, or null where there is none to keep. */
export function keepZoneOf(print: Print, placement: Pick<Placement, 'scaledWidth'>): Rect | null {
  const { keep } = zonesOf(print);
  return keep && intersection(scaled(keep, print, placement), paperOf(print, placement));
}

/**
 * What a cut must leave whole: the zone with the tolerance to spare on every side, but no more than the
 * paper, since the paper's own edge is not cut.
 */
export function withSpare(zone: Rect, paper: Rect, tolerance: number): Rect {
  return intersection(inset(zone, -tolerance), paper) ?? zone;
}

/**
 * True where a window keeps what the print is for: its keep zone with the tolerance to spare or, used as a
 * small piece, one of its details with the same. A print without a keep zone has nothing to lose.
 */
export function holdsSubject(window: Rect, print: Print, placement: Pick<Placement, 'scaledWidth'>, tolerance: number): boolean {
  const keep = keepZoneOf(print, placement);
  if (!keep) return true;
  const paper = paperOf(print, placement);
  return [keep, ...zonesOf(print).details.map((zone) => scaled(zone, print, placement))].some((zone) =>
    contains(window, withSpare(zone, paper, tolerance)),
  );
}

/** A rectangle of the paper as it lies on the page, from the corner of the piece that `window` cuts out. */
export function onPiece(rect: Rect, window: Rect, turn: Placement['turn']): Rect {
  return turnInBox({ ...rect, x: rect.x - window.x, y: rect.y - window.y }, window, turn);
}

/** True where a photo's window cuts nothing off the print. */
export function isUncut(photo: Pick<PlacedPhoto, 'window'>, paper: Size): boolean {
  return contains(photo.window, { x: 0, y: 0, ...paper });
}
