import type { SketchMat } from '../commands/calls';
import { gridOf } from '../geometry/grid';
import type { PageFormat } from '../model/page-format';
import { SKETCH_NAMES } from './names';
import { A4 } from './pages/a4';
import { EDGE_TO_EDGE } from './pages/edge-to-edge';
import { EIGHT_INCH, LETTER, SIX_BY_EIGHT } from './pages/smaller-inch';
import { THIRTY_CENTIMETRE } from './pages/thirty-centimetre';
import { TWELVE_INCH } from './pages/twelve-inch';
import { canonicalForm, parseMats, sketchId, type GridSize, type Sketch } from './sketch';
import { fingerprint } from './fingerprint';

interface SketchPage extends GridSize {
  readonly sketches: readonly string[];
}

/** Sketches are drawn for a grid; formats with the same grid share them. */
const PAGES: readonly SketchPage[] = [
  { columns: 22, rows: 22, sketches: TWELVE_INCH },
  { columns: 24, rows: 24, sketches: EDGE_TO_EDGE },
  { columns: 29, rows: 29, sketches: THIRTY_CENTIMETRE },
  { columns: 14, rows: 14, sketches: EIGHT_INCH },
  { columns: 20, rows: 28, sketches: A4 },
  { columns: 15, rows: 20, sketches: LETTER },
  { columns: 10, rows: 14, sketches: SIX_BY_EIGHT },
];

/** An adapted sketch is left out where a mat would be narrower than this: no photo fits it. */
const LEAST_STEPS = 2;

const lists = new Map<string, readonly Sketch[]>();

/**
 * The sketches for a page format, calm ones first. A format whose grid has none of its own takes those of
 * the grid with the nearest proportions, their lines moved to the nearest step. No two are turns or mirror
 * images of each other.
 */
export function sketchesFor(format: PageFormat): readonly Sketch[] {
  const grid = gridOf(format);
  const key = `${format.id} ${grid.columns} ${grid.rows}`;
  const known = lists.get(key);
  if (known) return known;
  const list = pageFor(grid, format);
  lists.set(key, list);
  return list;
}

function pageFor(grid: GridSize, format: PageFormat): Sketch[] {
  const own = PAGES.find(({ columns, rows }) => columns === grid.columns && rows === grid.rows);
  if (own) {
    return own.sketches.map((notation): Sketch => {
      const mats = parseMats(notation);
      const id = sketchId(mats, format);
      return { id, name: nameOf(id), formatId: format.id, mats };
    });
  }
  const nearest = PAGES.reduce((a, b) => (farOff(b, grid) < farOff(a, grid) ? b : a));
  const taken = new Set<string>();
  return nearest.sketches.flatMap((notation): Sketch[] => {
    const drawn = parseMats(notation);
    const mats = adapt(drawn, nearest, grid);
    const id = sketchId(mats, format);
    if (taken.has(id) || mats.some(({ w, h }) => w < LEAST_STEPS || h < LEAST_STEPS)) return [];
    taken.add(id);
    return [{ id, name: nameOf(fingerprint(canonicalForm(drawn, nearest))), formatId: format.id, mats }];
  });
}

/** @throws RangeError for a sketch that the table of names does not know. */
function nameOf(id: string): string {
  const name = SKETCH_NAMES[id];
  if (name === undefined) throw new RangeError(`sketch ${id} has no name; give it one in the table of names`);
  return name;
}

/** How differently two grids are shaped, then how differently sized. */
const farOff = (a: GridSize, b: GridSize): number =>
  10 * Math.abs(Math.log((a.columns * b.rows) / (a.rows * b.columns))) + Math.abs(Math.log(a.columns / b.columns));

/** Every grid line moves to the nearest line of the other grid, so that what touched still touches and nothing overlaps. */
function adapt(mats: readonly SketchMat[], from: GridSize, to: GridSize): SketchMat[] {
  const x = (line: number): number => Math.round((line * to.columns) / from.columns);
  const y = (line: number): number => Math.round((line * to.rows) / from.rows);
  return mats.map((mat) => ({
    ...mat,
    x: x(mat.x),
    y: y(mat.y),
    w: x(mat.x + mat.w) - x(mat.x),
    h: y(mat.y + mat.h) - y(mat.y),
  }));
}
