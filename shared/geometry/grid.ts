import type { PageFormat } from '../model/page-format';
import type { Rect } from '../model/rect';
import type { Mat } from '../model/spread';
import type { Cells } from './cells';
import { inset } from './rects';

export interface Grid {
  readonly columns: number;
  readonly rows: number;
  /** Page edge to grid; where the rest is odd, the left and top margins are the smaller by 1/160 mm. */
  readonly marginX: number;
  readonly marginY: number;
}

/** The grid of a page: as many whole steps as fit between the least margins. PRODUCT.md section 3. */
export function gridOf(format: PageFormat): Grid {
  const columns = Math.floor((format.width - 2 * format.minMargin) / format.step);
  const rows = Math.floor((format.height - 2 * format.minMargin) / format.step);
  return {
    columns,
    rows,
    marginX: Math.floor((format.width - columns * format.step) / 2),
    marginY: Math.floor((format.height - rows * format.step) / 2),
  };
}

/** The grid rectangle before any inset, in page space. */
export function cellRect(format: PageFormat, cells: Cells): Rect {
  const grid = gridOf(format);
  return {
    x: grid.marginX + cells.x * format.step,
    y: grid.marginY + cells.y * format.step,
    width: cells.w * format.step,
    height: cells.h * format.step,
  };
}

/**
 * The true rectangle of a mat in page space (Length, from the page's left and top edges): the grid
 * rectangle inset by half a gap on each side, except on the rim of an edge-to-edge page; or the mat's
 * own true size, centred in its grid rectangle (rounded down to a whole unit).
 */
export function matRect(format: PageFormat, mat: Cells & Pick<Mat, 'trueSize'>): Rect {
  const cells = cellRect(format, mat);
  if (mat.trueSize) {
    return {
      x: cells.x + Math.floor((cells.width - mat.trueSize.width) / 2),
      y: cells.y + Math.floor((cells.height - mat.trueSize.height) / 2),
      width: mat.trueSize.width,
      height: mat.trueSize.height,
    };
  }
  const half = Math.floor(format.gap / 2);
  if (format.edge === 'margin') return inset(cells, half);
  const grid = gridOf(format);
  const left = mat.x === 0 ? 0 : half;
  const top = mat.y === 0 ? 0 : half;
  const rightInset = mat.x + mat.w === grid.columns ? 0 : half;
  const bottomInset = mat.y + mat.h === grid.rows ? 0 : half;
  return {
    x: cells.x + left,
    y: cells.y + top,
    width: cells.width - left - rightInset,
    height: cells.height - top - bottomInset,
  };
}

/** The border of mat left visible: its own reveal, or the spread's. */
export const revealOf = (mat: Pick<Mat, 'reveal'>, spreadReveal: number): number => mat.reveal ?? spreadReveal;

/** The inner mat's rectangle in page space, or null where the mat has none. */
export function innerMatRect(format: PageFormat, spreadReveal: number, mat: Mat): Rect | null {
  return mat.inner ? inset(matRect(format, mat), revealOf(mat, spreadReveal)) : null;
}

/**
 * Where a mat's content lies in page space: the mat less its reveal on each side, and less the inner
 * mat's reveal where there is one. Never narrower than nothing.
 */
export function contentRect(format: PageFormat, spreadReveal: number, mat: Mat): Rect {
  const total = revealOf(mat, spreadReveal) + (mat.inner?.reveal ?? 0);
  const rect = inset(matRect(format, mat), total);
  return { ...rect, width: Math.max(0, rect.width), height: Math.max(0, rect.height) };
}
