import { centre } from '../../geometry/rects';
import type { Rect, Size } from '../../model/rect';
import { normalised, quadrantsOf, type PerQuadrant, type Quadrant } from './quadrants';

/*
 * The measures that compare the quarters of a frame, of D. C. L. Ngo, L. S. Teo, J. G. Byrne (2003), "Modelling
 * interface aesthetics", Information Sciences 152:25–46. The variants that the paper leaves open are named with each.
 */

const COMPARED: readonly (keyof Quadrant)[] = ['x', 'y', 'height', 'width', 'slope', 'reach'];
const TERMS = 12;

/**
 * Symmetry (SYM): how alike the quarters are left to right, top to bottom, and across the middle, in six sums each.
 * 0 … 1, 1 best. Variant: objects across an axis are split, sums are divided by the largest of the four.
 */
export function ngoSymmetry(frame: Size, rects: readonly Rect[]): number {
  const quadrants = quadrantsOf(frame, rects);
  const total = { vertical: 0, horizontal: 0, radial: 0 };
  for (const name of COMPARED) {
    const [ul, ur, ll, lr] = normalised(quadrants, name);
    total.vertical += Math.abs(ul - ur) + Math.abs(ll - lr);
    total.horizontal += Math.abs(ul - ll) + Math.abs(ur - lr);
    total.radial += Math.abs(ul - lr) + Math.abs(ur - ll);
  }
  return 1 - (total.vertical + total.horizontal + total.radial) / TERMS / 3;
}

const PAIRS = 6;

/** Rhythm (RHM): how alike all pairs of quarters are in place and area. 0 … 1, 1 best. Variant: as for symmetry. */
export function ngoRhythm(frame: Size, rects: readonly Rect[]): number {
  const quadrants = quadrantsOf(frame, rects);
  const differences = (['x', 'y', 'area'] as const).map((name) => {
    const [ul, ur, ll, lr] = normalised(quadrants, name);
    const pairs = [ul - ur, ul - ll, ul - lr, ur - ll, ur - lr, ll - lr];
    return pairs.reduce((sum, pair) => sum + Math.abs(pair), 0) / PAIRS;
  });
  return 1 - differences.reduce((sum, difference) => sum + difference, 0) / differences.length;
}

/** Ranks of the quarters in reading order. */
const READING: PerQuadrant<number> = [4, 3, 2, 1];
/** Largest sum of differences between two rankings of four. */
const FURTHEST = 8;

/**
 * Sequence (SQM): whether the quarters' areas fall off as people read, from the upper left to the lower right.
 * 0 … 1, 1 best. Variant: quarters of the same weight are ranked apart, in reading order; equal ranks could make it negative.
 */
export function ngoSequence(frame: Size, rects: readonly Rect[]): number {
  const weights = quadrantsOf(frame, rects).map((quadrant, i) => READING[i]! * quadrant.area);
  const order = weights.map((_, i) => i).sort((a, b) => weights[b]! - weights[a]! || a - b);
  const apart = order.reduce((sum, quadrant, place) => sum + Math.abs(READING[quadrant]! - (order.length - place)), 0);
  return 1 - apart / FURTHEST;
}

/**
 * Homogeneity (HM): in how many ways the objects could be dealt to the quarters as they are, over the most ways
 * that so many objects have. 0 … 1, 1 best. Variant: an object counts in the quarter of its middle (on an axis: left,
 * upper), and the most even deal in whole objects is the largest, so that the measure never passes 1.
 */
export function ngoHomogeneity(frame: Size, rects: readonly Rect[]): number {
  const counts = [0, 0, 0, 0];
  for (const rect of rects) {
    const { x, y } = centre(rect);
    const index = (y > frame.height / 2 ? 2 : 0) + (x > frame.width / 2 ? 1 : 0);
    counts[index]! += 1;
  }
  const even = counts.map((_, i) => Math.floor((rects.length + i) / counts.length));
  // Logarithms, because factorials of more than 170 are past the largest number.
  const logOfWays = (deal: readonly number[]): number => deal.reduce((sum, n) => sum + logFactorial(n), 0);
  return Math.exp(logOfWays(even) - logOfWays(counts));
}

function logFactorial(n: number): number {
  let sum = 0;
  for (let i = 2; i <= n; i += 1) sum += Math.log(i);
  return sum;
}
