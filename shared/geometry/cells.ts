/** A rectangle in whole steps of a page's grid. */
export interface Cells {
  readonly x: number;
  readonly y: number;
  readonly w: number;
  readonly h: number;
}

/** True where the two share a cell; touching edges do not. */
export const shareCells = (a: Cells, b: Cells): boolean => a.x < b.x + b.w && b.x < a.x + a.w && a.y < b.y + b.h && b.y < a.y + a.h;

/** The smallest rectangle of cells round all of them. */
export function cellBox(cells: readonly Cells[]): Cells {
  const x = Math.min(...cells.map((c) => c.x));
  const y = Math.min(...cells.map((c) => c.y));
  return {
    x,
    y,
    w: Math.max(...cells.map((c) => c.x + c.w)) - x,
    h: Math.max(...cells.map((c) => c.y + c.h)) - y,
  };
}

/** The cells mirrored within a box, left to right (`horizontal`) or top to bottom. */
export function mirrored<T extends Cells>(cells: T, box: Cells, axis: 'horizontal' | 'vertical'): T {
  return axis === 'horizontal'
    ? { ...cells, x: 2 * box.x + box.w - cells.x - cells.w }
    : { ...cells, y: 2 * box.y + box.h - cells.y - cells.h };
}

/** As people read: by rows, then from left to right. */
export const inReadingOrder = (a: Pick<Cells, 'x' | 'y'>, b: Pick<Cells, 'x' | 'y'>): number => a.y - b.y || a.x - b.x;
