import { gridOf } from '../geometry/grid';
import type { Size } from '../model/rect';
import type { Mat } from '../model/spread';
import type { Remedy, SpreadView } from './check';

/**
 * The mat grown by as few steps as make up what is missing, evenly to both sides where the page has room;
 * nothing where it has none, or where the mat is a die's.
 *
 * @param missing - Lengths on the page, never negative.
 */
export function growMat(view: SpreadView, mat: Mat, missing: Size): Remedy[] {
  const { step } = view.doc.format;
  const w = mat.w + Math.ceil(missing.width / step);
  const h = mat.h + Math.ceil(missing.height / step);
  if (mat.trueSize || (w === mat.w && h === mat.h)) return [];
  const place = roomFor(view, mat, w, h);
  return place ? [{ messageId: 'larger-mat', data: {}, call: { id: 'mats.resize', args: { matId: mat.id, ...place, w, h } } }] : [];
}

/** Free cells of that size which include the mat's own: the most even growth first, then upward and leftward. */
function roomFor(view: SpreadView, mat: Mat, w: number, h: number): { x: number; y: number } | null {
  const grid = gridOf(view.doc.format);
  if (w > grid.columns || h > grid.rows) return null;
  const others = view.doc.mats.filter((other) => other.page === mat.page && other.id !== mat.id && !other.laidOver);
  const isFree = (x: number, y: number): boolean =>
    x >= 0 &&
    y >= 0 &&
    x + w <= grid.columns &&
    y + h <= grid.rows &&
    (mat.laidOver || others.every((other) => x >= other.x + other.w || other.x >= x + w || y >= other.y + other.h || other.y >= y + h));
  const corners: { x: number; y: number; uneven: number }[] = [];
  for (let dx = 0; dx <= w - mat.w; dx += 1) {
    for (let dy = 0; dy <= h - mat.h; dy += 1) {
      const uneven = Math.abs(w - mat.w - 2 * dx) + Math.abs(h - mat.h - 2 * dy);
      corners.push({ x: mat.x - dx, y: mat.y - dy, uneven });
    }
  }
  const found = corners.sort((a, b) => a.uneven - b.uneven).find(({ x, y }) => isFree(x, y));
  return found ? { x: found.x, y: found.y } : null;
}
