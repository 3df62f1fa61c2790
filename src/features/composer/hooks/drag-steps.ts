import type { CommandCall } from '#shared/commands/calls';
import { clamp } from '#shared/geometry/clamp';
import { gridOf } from '#shared/geometry/grid';
import { inverseTurn } from '#shared/geometry/paper';
import type { PlacedPhoto } from '#shared/geometry/placed-photos';
import { UNITS_PER_INCH } from '#shared/model/length';
import type { Mat, SpreadDocument } from '#shared/model/spread';
import { pageAt, pageLeft } from '@/features/composer/canvas/page-scale';
import type { Edge } from './drag-data';

interface Delta {
  readonly x: number;
  readonly y: number;
}

/** Whole steps that a mat was dragged by, and the page on which its centre lies now. */
export function moveCall(doc: SpreadDocument, mat: Mat, delta: Delta, perInch: number): CommandCall {
  const { format } = doc;
  const scale = UNITS_PER_INCH / perInch;
  const grid = gridOf(format);
  const left = pageLeft(doc, mat.page) + grid.marginX + mat.x * format.step + delta.x * scale;
  const page = pageAt(doc, left + (mat.w * format.step) / 2);
  const x = clamp(Math.round((left - pageLeft(doc, page) - grid.marginX) / format.step), 0, grid.columns - mat.w);
  const y = clamp(Math.round(mat.y + (delta.y * scale) / format.step), 0, grid.rows - mat.h);
  return { id: 'mats.move', args: { matIds: [mat.id], dx: x - mat.x, dy: y - mat.y, page } };
}

/** The mat's cells after one of its edges or corners was dragged; never under one step, never off the page. */
export function resizeCall(doc: SpreadDocument, mat: Mat, edge: Edge, delta: Delta, perInch: number): CommandCall {
  const scale = UNITS_PER_INCH / perInch / doc.format.step;
  const grid = gridOf(doc.format);
  const dx = Math.round(delta.x * scale);
  const dy = Math.round(delta.y * scale);
  const right = mat.x + mat.w;
  const foot = mat.y + mat.h;
  const x1 = edge.includes('w') ? clamp(mat.x + dx, 0, right - 1) : mat.x;
  const x2 = edge.includes('e') ? clamp(right + dx, mat.x + 1, grid.columns) : right;
  const y1 = edge.includes('n') ? clamp(mat.y + dy, 0, foot - 1) : mat.y;
  const y2 = edge.includes('s') ? clamp(foot + dy, mat.y + 1, grid.rows) : foot;
  return { id: 'mats.resize', args: { matId: mat.id, x: x1, y: y1, w: x2 - x1, h: y2 - y1 } };
}

/** Sliding the window: the picture follows the hand, so the window moves the other way, turned as the piece is. */
export function slideCall(photo: PlacedPhoto, delta: Delta, perInch: number): CommandCall {
  const scale = UNITS_PER_INCH / perInch;
  const [dx, dy] = turnVector(-delta.x * scale, -delta.y * scale, inverseTurn(photo.placement.turn));
  return {
    id: 'window.slide',
    args: { matId: photo.matId, x: Math.round(photo.placement.x + dx), y: Math.round(photo.placement.y + dy) },
  };
}

function turnVector(x: number, y: number, turns: 0 | 1 | 2 | 3): readonly [number, number] {
  switch (turns) {
    case 0:
      return [x, y];
    case 1:
      return [-y, x];
    case 2:
      return [-x, -y];
    case 3:
      return [y, -x];
  }
}
