import type { Rect } from '../model/rect';

export const right = (r: Rect): number => r.x + r.width;
export const bottom = (r: Rect): number => r.y + r.height;
export const area = (r: Rect): number => Math.max(0, r.width) * Math.max(0, r.height);
export const centre = (r: Rect): { x: number; y: number } => ({ x: r.x + r.width / 2, y: r.y + r.height / 2 });

/** `r` made smaller by `by` on every side (larger for a negative value); may become empty. */
export function inset(r: Rect, by: number): Rect {
  return { x: r.x + by, y: r.y + by, width: r.width - 2 * by, height: r.height - 2 * by };
}

/** The common part, or null where the rectangles share no area. */
export function intersection(a: Rect, b: Rect): Rect | null {
  const x = Math.max(a.x, b.x);
  const y = Math.max(a.y, b.y);
  const width = Math.min(right(a), right(b)) - x;
  const height = Math.min(bottom(a), bottom(b)) - y;
  return width > 0 && height > 0 ? { x, y, width, height } : null;
}

/** True where the two share area; touching edges do not overlap. */
export const overlaps = (a: Rect, b: Rect): boolean =>
  a.x < right(b) && b.x < right(a) && a.y < bottom(b) && b.y < bottom(a);

export const contains = (outer: Rect, r: Rect): boolean =>
  r.x >= outer.x && r.y >= outer.y && right(r) <= right(outer) && bottom(r) <= bottom(outer);

/** The smallest rectangle round all of `rects`. @throws RangeError for an empty list. */
export function boundingBox(rects: readonly Rect[]): Rect {
  if (rects.length === 0) throw new RangeError('boundingBox needs at least one rectangle');
  const x = Math.min(...rects.map((r) => r.x));
  const y = Math.min(...rects.map((r) => r.y));
  return {
    x,
    y,
    width: Math.max(...rects.map(right)) - x,
    height: Math.max(...rects.map(bottom)) - y,
  };
}

/** `r` moved as its origin is: from the space that begins at `by` to the one that holds `by`. */
export const movedBy = (r: Rect, by: { readonly x: number; readonly y: number }): Rect => ({ ...r, x: r.x + by.x, y: r.y + by.y });
