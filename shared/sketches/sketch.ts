import type { SketchMat } from '../commands/calls';
import { inReadingOrder } from '../geometry/cells';
import { gridOf } from '../geometry/grid';
import type { PageFormat } from '../model/page-format';
import { fingerprint } from './fingerprint';

/** An arrangement of mats on one page of a format's grid. */
export interface Sketch {
  /** Hash of the canonical form: the same for every turn and mirror image. MODEL.md 9. */
  readonly id: string;
  /** Two plain words, unique in a format's list. */
  readonly name: string;
  readonly formatId: string;
  /** In reading order. */
  readonly mats: readonly SketchMat[];
}

export interface GridSize {
  readonly columns: number;
  readonly rows: number;
}

/**
 * Mats out of their short notation: `x,y,w,h` in steps, one mat after the other, with `*` behind the focal
 * and a letter behind the panes of one split print: `0,0,14,10* 14,0,8,10 0,10,6,6a 6,10,6,6a`.
 *
 * @throws RangeError for a part that is not of this form.
 */
export function parseMats(notation: string): SketchMat[] {
  return notation
    .trim()
    .split(/\s+/)
    .map((part): SketchMat => {
      const found = /^(\d+),(\d+),(\d+),(\d+)(\*|[a-z])?$/.exec(part);
      if (!found) throw new RangeError(`not a mat of a sketch: ${part}`);
      const [x, y, w, h] = found.slice(1, 5).map(Number) as [number, number, number, number];
      const mark = found[5];
      if (mark === '*') return { x, y, w, h, focal: true };
      return mark ? { x, y, w, h, paneGroup: mark.charCodeAt(0) - 'a'.charCodeAt(0) } : { x, y, w, h };
    })
    .sort(inReadingOrder);
}

type Place = (mat: SketchMat, grid: GridSize) => Pick<SketchMat, 'x' | 'y' | 'w' | 'h'>;

/** The mirrors and the half-turn, which every grid has. */
const KEEPING: readonly Place[] = [
  ({ x, y, w, h }) => ({ x, y, w, h }),
  ({ x, y, w, h }, { columns }) => ({ x: columns - x - w, y, w, h }),
  ({ x, y, w, h }, { rows }) => ({ x, y: rows - y - h, w, h }),
  ({ x, y, w, h }, { columns, rows }) => ({ x: columns - x - w, y: rows - y - h, w, h }),
];
/** The four that exchange columns and rows: only a square grid comes out of them the same. */
const EXCHANGING: readonly Place[] = KEEPING.map((place) => (mat, grid) => {
  const { x, y, w, h } = place(mat, grid);
  return { x: y, y: x, w: h, h: w };
});

/** All turns and mirror images of an arrangement: eight on a square grid, else four. */
export function turnsOf(mats: readonly SketchMat[], grid: GridSize): SketchMat[][] {
  const places = grid.columns === grid.rows ? [...KEEPING, ...EXCHANGING] : KEEPING;
  return places.map((place) => mats.map((mat) => ({ ...mat, ...place(mat, grid) })).sort(inReadingOrder));
}

/**
 * One text for an arrangement and all its turns and mirror images: the least of theirs. It tells places,
 * sizes and which mats are panes of one print; which mat is the focal does not make another sketch.
 */
export function canonicalForm(mats: readonly SketchMat[], grid: GridSize): string {
  const least = turnsOf(mats, grid)
    .map(textOf)
    .reduce((a, b) => (b < a ? b : a));
  return `${grid.columns}x${grid.rows}:${least}`;
}

/** Pane groups are numbered as they first appear. */
function textOf(mats: readonly SketchMat[]): string {
  const groups = new Map<number, number>();
  return mats
    .map(({ x, y, w, h, paneGroup }) => {
      if (paneGroup === undefined) return `${x},${y},${w},${h}`;
      if (!groups.has(paneGroup)) groups.set(paneGroup, groups.size);
      return `${x},${y},${w},${h},${groups.get(paneGroup)}`;
    })
    .join(';');
}

/** The stable id of an arrangement on a format's grid. */
export const sketchId = (mats: readonly SketchMat[], format: PageFormat): string => fingerprint(canonicalForm(mats, gridOf(format)));
