import { inReadingOrder } from '#shared/geometry/cells';
import { clamp } from '#shared/geometry/clamp';
import { gridOf } from '#shared/geometry/grid';
import type { MatId, Side } from '#shared/model/ids';
import { UNITS_PER_INCH } from '#shared/model/length';
import type { PageFormat } from '#shared/model/page-format';
import type { Rect } from '#shared/model/rect';
import type { Mat, SpreadDocument } from '#shared/model/spread';
import { pageRects } from '#shared/scene/page-rects';

type Pages = Pick<SpreadDocument, 'format' | 'binding' | 'pages'>;

/** Room beside and around the pages, in px: notes in the margins, rulers above, piles below. TOKENS.md "Page scale". */
export interface Surround {
  readonly sides: number;
  readonly vertical: number;
}

/**
 * How many px one inch of paper takes on the screen: as large as the viewport allows, an even number so
 * that the half-inch step is whole.
 */
export function pixelsPerInch(viewport: { width: number; height: number }, doc: Pages, surround: Surround): number {
  const pages = pageRects(doc);
  const widthIn = pages.width / UNITS_PER_INCH;
  const heightIn = pages.height / UNITS_PER_INCH;
  const fitting = Math.min((viewport.width - surround.sides) / widthIn, (viewport.height - surround.vertical) / heightIn);
  return Math.max(12, Math.floor(fitting / 2) * 2);
}

/** Left edge of a page in spread space, as the scene draws it: a single page stands at 0. */
export const pageLeft = (doc: Pages, side: Side): number => pageRects(doc)[side]?.x ?? 0;

/** The page at or nearest to a place across the spread, in spread space. */
export function pageAt(doc: Pages, x: number): Side {
  const { left, right } = pageRects(doc);
  if (!left || !right) return left ? 'left' : 'right';
  return x < (left.width + right.x) / 2 ? 'left' : 'right';
}

/** A page-space rectangle in px from the spread's top-left corner. */
export function toScreen(rect: Rect, pageX: number, perInch: number): Rect {
  const scale = perInch / UNITS_PER_INCH;
  return {
    x: (rect.x + pageX) * scale,
    y: rect.y * scale,
    width: rect.width * scale,
    height: rect.height * scale,
  };
}

/** Steps of the page's grid in px. */
export const stepPx = (format: PageFormat, perInch: number): number => (format.step * perInch) / UNITS_PER_INCH;

/** Mats as people read them: left page first, then rows from the top, then from the left; what is laid over comes later. */
export function asRead(mats: readonly Mat[]): Mat[] {
  return [...mats].sort((a, b) => Number(a.page === 'right') - Number(b.page === 'right') || inReadingOrder(a, b) || a.z - b.z);
}

/** The number that people and screen readers call a mat by, counted per page: L3, R1. */
export function matLabels(mats: readonly Mat[]): Map<MatId, string> {
  const counts = { left: 0, right: 0 };
  return new Map(
    asRead(mats).map((mat) => {
      counts[mat.page] += 1;
      return [mat.id, `${mat.page === 'left' ? 'L' : 'R'}${counts[mat.page]}`];
    }),
  );
}

/** The nearest cells under a point of a page, in whole steps, kept on the grid. */
export function cellsAt(format: PageFormat, xPx: number, yPx: number, perInch: number): { x: number; y: number } {
  const grid = gridOf(format);
  const scale = UNITS_PER_INCH / perInch;
  return {
    x: clamp(Math.floor((xPx * scale - grid.marginX) / format.step), 0, grid.columns - 1),
    y: clamp(Math.floor((yPx * scale - grid.marginY) / format.step), 0, grid.rows - 1),
  };
}
