import type { Rect } from '../model/rect';
import { bottom, right } from './rects';

/**
 * True where rectangles that do not overlap can be parted by cuts from edge to edge: some straight line
 * leaves all of them whole with some on either side, and so again on both sides. Three or fewer always can;
 * four that stand like a pinwheel cannot.
 */
export function canSeparate(rects: readonly Rect[]): boolean {
  if (rects.length <= 3) return true;
  return trySide(rects, (r) => r.x, right) || trySide(rects, (r) => r.y, bottom);
}

/** Where one straight line works, cutting there never hinders a later cut, so the first one found decides. */
function trySide(rects: readonly Rect[], start: (r: Rect) => number, end: (r: Rect) => number): boolean {
  const sorted = [...rects].sort((a, b) => start(a) - start(b));
  let reach = end(sorted[0]!);
  for (let i = 1; i < sorted.length; i += 1) {
    if (start(sorted[i]!) >= reach) return canSeparate(sorted.slice(0, i)) && canSeparate(sorted.slice(i));
    reach = Math.max(reach, end(sorted[i]!));
  }
  return false;
}
