import { area, boundingBox } from '../../geometry/rects';
import type { Rect, Size } from '../../model/rect';

/*
 * The measures that compare objects' sizes, of D. C. L. Ngo, L. S. Teo, J. G. Byrne (2003), "Modelling interface aesthetics",
 * Information Sciences 152:25–46. All are 0 … 1, 1 best, and 1 where there are no objects. The layout is the
 * bounding box of all objects. Objects are taken not to overlap.
 */

/** A ratio or its inverse, whichever is at most 1. */
const atMostOne = (ratio: number): number => (ratio <= 1 ? ratio : 1 / ratio);
const slimness = ({ width, height }: Size): number => atMostOne(height / width);
const mean = (values: readonly number[]): number => values.reduce((sum, value) => sum + value, 0) / values.length;
const unit = (value: number): number => Math.min(1, Math.max(0, value));

/** How many different pairs of width and height there are. */
export const countSizes = (rects: readonly Rect[]): number => new Set(rects.map(({ width, height }) => `${width} ${height}`)).size;

/** Cohesion (CM): whether layout and frame, and objects and layout, have like proportions. Variant: two terms, without object against frame. */
export function ngoCohesion(frame: Size, rects: readonly Rect[]): number {
  if (rects.length === 0) return 1;
  const layout = boundingBox(rects);
  const shape = layout.height / layout.width;
  const ofFrame = atMostOne(shape / (frame.height / frame.width));
  return (ofFrame + mean(rects.map(({ width, height }) => atMostOne(height / width / shape)))) / 2;
}

/** Unity (UM): few different sizes, and little empty space within the layout beside that within the frame. A full frame has all its unity of space. */
export function ngoUnity(frame: Size, rects: readonly Rect[]): number {
  if (rects.length === 0) return 1;
  const form = 1 - (countSizes(rects) - 1) / rects.length;
  const covered = rects.reduce((sum, rect) => sum + area(rect), 0);
  const empty = frame.width * frame.height - covered;
  const space = empty > 0 ? unit(1 - (area(boundingBox(rects)) - covered) / empty) : 1;
  return (form + space) / 2;
}

/** Sides of the shapes that the paper takes for pleasing: square, root two, golden, root three, double square. */
const PLEASING: readonly number[] = [1, 1 / 1.414, 1 / 1.618, 1 / 1.732, 1 / 2];
/** The furthest that a side can lie from the nearest of them. */
const FURTHEST = 0.5;
const pleasing = (size: Size): number => 1 - Math.min(...PLEASING.map((side) => Math.abs(side - slimness(size)))) / FURTHEST;

/** Proportion (PM): how near objects and layout come to pleasing shapes. */
export function ngoProportion(rects: readonly Rect[]): number {
  if (rects.length === 0) return 1;
  return (mean(rects.map(pleasing)) + pleasing(boundingBox(rects))) / 2;
}

/** Economy (ECM): one over the number of different sizes. */
export const ngoEconomy = (rects: readonly Rect[]): number => (rects.length === 0 ? 1 : 1 / countSizes(rects));

export interface NgoDensity {
  /** The 2003 paper's, from memory: best where half the frame is covered. */
  readonly density: number;
  /** The web paper's of 2000 (Visual Mathematics 2(4)): best where the frame is empty. Another measure altogether. */
  readonly density2000: number;
}

/** Density (DM), in both its published forms. */
export function ngoDensity(frame: Size, rects: readonly Rect[]): NgoDensity {
  const covered = unit(rects.reduce((sum, rect) => sum + area(rect), 0) / (frame.width * frame.height));
  return { density: 1 - 2 * Math.abs(0.5 - covered), density2000: 1 - covered };
}
