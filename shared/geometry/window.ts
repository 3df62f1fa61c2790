import { inches, snapTo } from '../model/length';
import type { Print } from '../model/print';
import type { Rect, Size } from '../model/rect';
import type { Placement } from '../model/spread';
import { clamp } from './clamp';
import { turnedSize } from './paper';

/** The size of a placed print's whole paper: its own, or for a digital photo the one it is scaled to. */
export function placedPaper(print: Pick<Print, 'paperWidth' | 'paperHeight'>, placement: Pick<Placement, 'scaledWidth'>): Size {
  if (placement.scaledWidth === null) return { width: print.paperWidth, height: print.paperHeight };
  return {
    width: placement.scaledWidth,
    height: Math.round((placement.scaledWidth * print.paperHeight) / print.paperWidth),
  };
}

/**
 * The window on the upright paper that a placement shows through a photo of size `photo` on the page.
 * It never zooms: its size is the photo's, with width and height exchanged for an odd turn.
 */
export function windowOnPaper(placement: Pick<Placement, 'x' | 'y' | 'turn'>, photo: Size): Rect {
  const size = turnedSize(photo, placement.turn);
  return { x: placement.x, y: placement.y, width: size.width, height: size.height };
}

/**
 * The window's place nearest to (x, y) that sits on the trimmer's finest mark and stays on the paper.
 * Where the paper is smaller than the window in one direction, it is centred there on a mark, so that
 * what is missing shows on both sides.
 *
 * @param window - window size on the paper (already exchanged for an odd turn), in Lengths.
 */
export function slideWindow(x: number, y: number, window: Size, paper: Size, finestMark: number): { x: number; y: number } {
  return {
    x: slideAxis(x, window.width, paper.width, finestMark),
    y: slideAxis(y, window.height, paper.height, finestMark),
  };
}

function slideAxis(at: number, window: number, paper: number, mark: number): number {
  const room = paper - window;
  if (room < 0) return snapTo(room / 2, mark);
  const last = Math.floor(room / mark) * mark;
  return clamp(snapTo(at, mark), 0, last);
}

/** True where some place of a window of that size, on the mark and on the paper, holds all of `needed`, a part of the paper. */
export const canHold = (needed: Rect, window: Size, paper: Size, finestMark: number): boolean =>
  canHoldAxis(needed.x, needed.width, window.width, paper.width, finestMark) && canHoldAxis(needed.y, needed.height, window.height, paper.height, finestMark);

function canHoldAxis(start: number, length: number, window: number, paper: number, mark: number): boolean {
  // A window as large as the paper is centred over all of it.
  if (window >= paper) return true;
  const last = Math.floor((paper - window) / mark) * mark;
  const corner = Math.min(Math.floor(start / mark) * mark, last);
  return corner + window >= start + length;
}

/** The window centred on a rectangle of the paper (a keep zone), or on the paper itself. */
export function centreWindow(window: Size, paper: Size, finestMark: number, on?: Rect | null): { x: number; y: number } {
  const target = on ?? { x: 0, y: 0, width: paper.width, height: paper.height };
  return slideWindow(
    target.x + (target.width - window.width) / 2,
    target.y + (target.height - window.height) / 2,
    window,
    paper,
    finestMark,
  );
}

/** A strip thinner than this is a shaving: a trimmer cannot hold it. Common practice. */
export const SHAVING = inches(1 / 4);

/**
 * The window's place, slid to an edge of the paper where it would leave a mere shaving there, if it still
 * holds `kept` then. The cut is spared, and so is a strip that no trimmer can hold.
 *
 * @param kept - what the window must hold, on the paper; null for nothing.
 */
export function spareShavings(at: { x: number; y: number }, window: Size, paper: Size, kept: Rect | null, finestMark: number): { x: number; y: number } {
  return {
    x: spareAxis(at.x, window.width, paper.width, kept && [kept.x, kept.x + kept.width], finestMark),
    y: spareAxis(at.y, window.height, paper.height, kept && [kept.y, kept.y + kept.height], finestMark),
  };
}

function spareAxis(at: number, window: number, paper: number, kept: readonly [number, number] | null, mark: number): number {
  const room = paper - window;
  if (room < SHAVING || room % mark !== 0) return at;
  const flush = at > 0 && at < SHAVING ? 0 : at < room && room - at < SHAVING ? room : at;
  return !kept || (kept[0] >= flush && kept[1] <= flush + window) ? flush : at;
}
