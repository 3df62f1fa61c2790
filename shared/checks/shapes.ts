import { gridOf } from '../geometry/grid';
import type { Size } from '../model/rect';
import type { Mat } from '../model/spread';
import type { Remedy, SpreadView } from './check';
import { isFree } from './resize-mat';

export type Shape = 'flat' | 'upright' | 'square';

/** Sides that differ by less are taken for a square. Common practice. */
const SQUARE_UP_TO = 1.15;

export function shapeOf({ width, height }: Size): Shape {
  if (Math.max(width, height) < SQUARE_UP_TO * Math.min(width, height)) return 'square';
  return width > height ? 'flat' : 'upright';
}

/** The mat with width and height exchanged, as `mats.turn` does it, where its page has room for that. */
export function turnMat(view: SpreadView, mat: Mat): Remedy[] {
  const { columns, rows } = gridOf(view.doc.format);
  if (mat.content.kind === 'pane' || mat.h > columns || mat.w > rows) return [];
  const turned = { x: Math.min(mat.x, columns - mat.h), y: Math.min(mat.y, rows - mat.w), w: mat.h, h: mat.w };
  if (!isFree(view, mat, turned)) return [];
  return [{ messageId: 'turn-mat', data: {}, call: { id: 'mats.turn', args: { matId: mat.id } } }];
}

/** The two mats' prints in each other's places. */
export const swap = (from: Mat, to: Mat): Remedy => ({
  messageId: 'swap-places',
  data: {},
  call: { id: 'prints.move', args: { fromMatId: from.id, toMatId: to.id } },
});
