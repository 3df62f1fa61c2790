import { gridOf } from '#shared/geometry/grid';
import type { MatId, Side } from '#shared/model/ids';
import { UNITS_PER_INCH } from '#shared/model/length';
import type { PageFormat } from '#shared/model/page-format';
import type { Rect } from '#shared/model/rect';
import type { Mat, SpreadDocument } from '#shared/model/spread';

/** Room beside and around the pages, in px: notes in the margins, rulers above, piles below. TOKENS.md "Page scale". */
export interface Surround {
  readonly sides: number;
  readonly vertical: number;
}

/**
 * How many px one inch of paper takes on the screen: as large as the viewport allows, an even number so
 * that the half-inch step is whole.
 */
export function pixelsPerInch(viewport: { width: number; height: number }, doc: Pick<SpreadDocument, 'format' | 'binding'>, surround: Surround): number {
  const widthIn = (2 * doc.format.width + doc.binding.gap) / UNITS_PER_INCH;
  const heightIn = doc.format.height / UNITS_PER_INCH;
  const fitting = Math.min((viewport.width - surround.sides) / widthIn, (viewport.height - surround.vertical) / heightIn);
  return Math.max(12, Math.floor(fitting / 2) * 2);
}

/** Left edge of a page in spread space. */
export const pageLeft = (doc: Pick<SpreadDocument, 'format' | 'binding'>, side: Side): number =>
  side === 'left' ? 0 : doc.format.width + doc.binding.gap;

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

/** Mats as people read them: left page first, then rows from the top, then from the left. */
export function inReadingOrder(mats: readonly Mat[]): Mat[] {
  return [...mats].sort((a, b) => (a.page === b.page ? a.y - b.y || a.x - b.x || a.z - b.z : a.page === 'left' ? -1 : 1));
}

/** The number that people and screen readers call a mat by, counted per page: L3, R1. */
export function matLabels(mats: readonly Mat[]): Map<MatId, string> {
  const counts = { left: 0, right: 0 };
  return new Map(
    inReadingOrder(mats).map((mat) => {
      counts[mat.page] += 1;
      return [mat.id, `${mat.page === 'left' ? 'L' : 'R'}${counts[mat.page]}`];
    }),
  );
}

/** The nearest cells under a point of a page, in whole steps, kept on the grid. */
export function cellsAt(format: PageFormat, xPx: number, yPx: number, perInch: number): { x: number; y: number } {
  const grid = gridOf(format);
  const scale = UNITS_PER_INCH / perInch;
  const clamp = (value: number, max: number): number => Math.min(Math.max(value, 0), max);
  return {
    x: clamp(Math.floor((xPx * scale - grid.marginX) / format.step), grid.columns - 1),
    y: clamp(Math.floor((yPx * scale - grid.marginY) / format.step), grid.rows - 1),
  };
}
