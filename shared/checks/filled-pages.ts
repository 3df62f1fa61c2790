import { gridOf } from '../geometry/grid';
import { SIDES } from '../model/ids';
import type { SpreadView } from './check';

/** Common practice: half a page of card is where its design can be read; the rest may be page. */
const COVERED = 1 / 2;
/** A quarter of the card may still be bare, so that the last bare mats are noted and not the first. */
const CARRYING = 3 / 4;

const filled = new WeakMap<SpreadView, boolean>();

/**
 * True where the design of the spread can be judged: on every page that it has, mats cover at least half of
 * the grid's cells, and three quarters of that area or more carries something. Mats laid over others do not count.
 */
export function areFilled(view: SpreadView): boolean {
  let known = filled.get(view);
  if (known === undefined) filled.set(view, (known = judge(view)));
  return known;
}

function judge({ doc }: SpreadView): boolean {
  const grid = gridOf(doc.format);
  const covered = { left: 0, right: 0 };
  const carrying = { left: 0, right: 0 };
  const emptyGroups = new Set(doc.panes.filter((group) => group.content === null).map((group) => group.id));
  for (const mat of doc.mats) {
    if (mat.laidOver) continue;
    const cells = mat.w * mat.h;
    covered[mat.page] += cells;
    const { content } = mat;
    const isBare = content.kind === 'bare' || (content.kind === 'pane' && emptyGroups.has(content.groupId));
    if (!isBare) carrying[mat.page] += cells;
  }
  return SIDES.every(
    (side) =>
      doc.pages[side] === null ||
      (covered[side] >= COVERED * grid.columns * grid.rows && carrying[side] >= CARRYING * covered[side]),
  );
}
