import { bottom, right } from '../geometry/rects';
import type { Rect } from '../model/rect';
import type { Axis } from './messages';

/** By how much a window leaves the paper, on the worse axis; 0 where it does not. Both sides of an axis add up. */
export function offPaper(window: Rect, paper: Rect): { readonly missing: number; readonly axis: Axis } {
  const outside = (start: number, end: number, from: number, to: number): number => Math.max(0, from - start) + Math.max(0, end - to);
  const across = outside(window.x, right(window), paper.x, right(paper));
  const along = outside(window.y, bottom(window), paper.y, bottom(paper));
  return across >= along ? { missing: across, axis: 'wide' } : { missing: along, axis: 'high' };
}
