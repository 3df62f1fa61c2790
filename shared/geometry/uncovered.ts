import type { Rect } from '../model/rect';
import { bottom, intersection, right } from './rects';

/** The parts of a rectangle that none of the others cover: rectangles that do not overlap, from the top, then from the left. */
export function uncovered(rect: Rect, covers: readonly Rect[]): Rect[] {
  let parts: Rect[] = rect.width > 0 && rect.height > 0 ? [rect] : [];
  for (const cover of covers) parts = parts.flatMap((part) => without(part, cover));
  return parts;
}

function without(part: Rect, cover: Rect): Rect[] {
  const common = intersection(part, cover);
  if (!common) return [part];
  return [
    { ...part, height: common.y - part.y },
    { x: part.x, y: common.y, width: common.x - part.x, height: common.height },
    { x: right(common), y: common.y, width: right(part) - right(common), height: common.height },
    { ...part, y: bottom(common), height: bottom(part) - bottom(common) },
  ].filter(({ width, height }) => width > 0 && height > 0);
}
