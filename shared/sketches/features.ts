import type { SketchMat } from '../commands/calls';
import { gridOf } from '../geometry/grid';
import type { PageFormat } from '../model/page-format';
import type { Sketch } from './sketch';

export const NINE_THIRDS = [
  'top-left', 'top-centre', 'top-right',
  'middle-left', 'middle-centre', 'middle-right',
  'bottom-left', 'bottom-centre', 'bottom-right',
] as const;
/** In which ninth of the page the middle of a mat lies. */
export type NineThird = (typeof NINE_THIRDS)[number];

/** Of the biggest mat: under a sixth of the grid, up to three tenths, more. */
export const BIGGEST_SIZES = ['small', 'medium', 'large'] as const;
export type BiggestSize = (typeof BIGGEST_SIZES)[number];
const MEDIUM_FROM = 1 / 6;
const LARGE_FROM = 3 / 10;

/** `flat` or `upright` where three quarters or more of the mats that are not square lie so; `square` where none is either. */
export const ORIENTATION_MIXES = ['flat', 'upright', 'mixed', 'square'] as const;
export type OrientationMix = (typeof ORIENTATION_MIXES)[number];
const MOSTLY = 3 / 4;

export interface SketchFeatures {
  /** Every mat, each pane too. */
  readonly matCount: number;
  /** The mat with the largest area that is no pane; of equals the focal, then the first in reading order. */
  readonly biggest: SketchMat;
  readonly biggestPlace: NineThird;
  readonly biggestSize: BiggestSize;
  readonly orientation: OrientationMix;
  /** Number of panes of the largest split print; 0 without one. */
  readonly paneCount: number;
  /** Share of the grid that mats cover, 0–1. */
  readonly coverage: number;
}

export interface SketchFilter {
  readonly leastMats?: number;
  readonly mostMats?: number;
  readonly biggestPlace?: NineThird;
  readonly biggestSize?: BiggestSize;
  readonly orientation?: OrientationMix;
  /** With a split print, or without. */
  readonly panes?: boolean;
}

/** What a sketch can be found by. @throws RangeError for a sketch without mats. */
export function sketchFeatures(sketch: Sketch, format: PageFormat): SketchFeatures {
  const grid = gridOf(format);
  const { mats } = sketch;
  const biggest = biggestOf(mats);
  const share = cells(biggest) / (grid.columns * grid.rows);
  return {
    matCount: mats.length,
    biggest,
    biggestPlace: thirdOf(biggest, grid.columns, grid.rows),
    biggestSize: share < MEDIUM_FROM ? 'small' : share <= LARGE_FROM ? 'medium' : 'large',
    orientation: orientationOf(mats),
    paneCount: largestPaneGroup(mats),
    coverage: mats.reduce((sum, mat) => sum + cells(mat), 0) / (grid.columns * grid.rows),
  };
}

/** The sketches that fit all that the filter says, in their order. */
export function filterSketches(sketches: readonly Sketch[], format: PageFormat, filter: SketchFilter): Sketch[] {
  const fits = (wanted: string | boolean | undefined, found: string | boolean): boolean => wanted === undefined || wanted === found;
  return sketches.filter((sketch) => {
    const found = sketchFeatures(sketch, format);
    return (
      found.matCount >= (filter.leastMats ?? 0) &&
      found.matCount <= (filter.mostMats ?? Infinity) &&
      fits(filter.biggestPlace, found.biggestPlace) &&
      fits(filter.biggestSize, found.biggestSize) &&
      fits(filter.orientation, found.orientation) &&
      fits(filter.panes, found.paneCount > 0)
    );
  });
}

const cells = ({ w, h }: SketchMat): number => w * h;

function biggestOf(mats: readonly SketchMat[]): SketchMat {
  const single = mats.filter((mat) => mat.paneGroup === undefined);
  const among = single.length > 0 ? single : mats;
  const first = among[0];
  if (!first) throw new RangeError('a sketch has at least one mat');
  return among.reduce((a, b) => (cells(b) > cells(a) || (cells(b) === cells(a) && b.focal && !a.focal) ? b : a), first);
}

function thirdOf({ x, y, w, h }: SketchMat, columns: number, rows: number): NineThird {
  const third = (middle: number, size: number): 0 | 1 | 2 => (middle * 3 < size ? 0 : middle * 3 <= 2 * size ? 1 : 2);
  return NINE_THIRDS[third(y + h / 2, rows) * 3 + third(x + w / 2, columns)]!;
}

function orientationOf(mats: readonly SketchMat[]): OrientationMix {
  const flat = mats.filter(({ w, h }) => w > h).length;
  const upright = mats.filter(({ w, h }) => h > w).length;
  if (flat + upright === 0) return 'square';
  if (flat >= MOSTLY * (flat + upright)) return 'flat';
  return upright >= MOSTLY * (flat + upright) ? 'upright' : 'mixed';
}

function largestPaneGroup(mats: readonly SketchMat[]): number {
  const counts = new Map<number, number>();
  for (const { paneGroup } of mats) {
    if (paneGroup !== undefined) counts.set(paneGroup, (counts.get(paneGroup) ?? 0) + 1);
  }
  return Math.max(0, ...counts.values());
}
