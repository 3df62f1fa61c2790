import { shareCells, type Cells } from '../geometry/cells';
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

/** The mat made smaller by as few steps as take off what is too much, its top left corner kept; nothing for a die's mat, or where nothing would stay. */
export function shrinkMat(view: SpreadView, mat: Mat, excess: Size): Remedy[] {
  const { step } = view.doc.format;
  const w = mat.w - Math.ceil(excess.width / step);
  const h = mat.h - Math.ceil(excess.height / step);
  if (mat.trueSize || w < 1 || h < 1) return [];
  return [{ messageId: 'smaller-mat', data: {}, call: { id: 'mats.resize', args: { matId: mat.id, x: mat.x, y: mat.y, w, h } } }];
}

/** Free cells of that size which include the mat's own: the most even growth first, then leftward and upward. */
function roomFor(view: SpreadView, mat: Mat, w: number, h: number): { x: number; y: number } | null {
  const grid = gridOf(view.doc.format);
  if (w > grid.columns || h > grid.rows) return null;
  const spareX = w - mat.w;
  const spareY = h - mat.h;
  const reach = { x: mat.x - spareX, y: mat.y - spareY, w: w + spareX, h: h + spareY };
  const inTheWay = mat.laidOver ? [] : view.doc.mats.filter((other) => other.page === mat.page && other.id !== mat.id && !other.laidOver && shareCells(other, reach));
  let best: { x: number; y: number } | null = null;
  let least = Infinity;
  for (let x = Math.max(0, reach.x); x <= Math.min(mat.x, grid.columns - w); x += 1) {
    for (let y = Math.max(0, reach.y); y <= Math.min(mat.y, grid.rows - h); y += 1) {
      const uneven = Math.abs(spareX - 2 * (mat.x - x)) + Math.abs(spareY - 2 * (mat.y - y));
      if (uneven >= least || inTheWay.some((other) => shareCells(other, { x, y, w, h }))) continue;
      best = { x, y };
      least = uneven;
    }
  }
  return best;
}

/** True where a mat could take these cells of its page: no other lies there, or it is laid over them. */
export const isFree = ({ doc }: SpreadView, mat: Mat, cells: Cells): boolean =>
  mat.laidOver || !doc.mats.some((other) => other.page === mat.page && other.id !== mat.id && !other.laidOver && shareCells(other, cells));
