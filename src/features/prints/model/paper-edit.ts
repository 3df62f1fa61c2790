import { differsInShape, hasAutomaticPaperRect, turnedSize } from '#shared/geometry/paper';
import { INCH_PRINT_SIZES, INSTANT_PRINT_SIZES, METRIC_PRINT_SIZES, type PrintSize } from '#shared/model/guess-print-size';
import { inches, type Length } from '#shared/model/length';
import type { Print, PxRect } from '#shared/model/print';
import type { Size } from '#shared/model/rect';
import { parseLength, type TypedUnit, type Unit } from '#shared/words/measure';

/** The sizes to choose from, those of the reader's unit first. */
export const sizesFor = (unit: Unit): readonly PrintSize[] =>
  unit === 'in'
    ? [...INCH_PRINT_SIZES, ...METRIC_PRINT_SIZES, ...INSTANT_PRINT_SIZES]
    : [...METRIC_PRINT_SIZES, ...INCH_PRINT_SIZES, ...INSTANT_PRINT_SIZES];

/** A size laid the way the print lies: flat or upright. */
export function laidLike(size: Size, print: Pick<Print, 'paperWidth' | 'paperHeight'>): Size {
  const isFlat = print.paperWidth > print.paperHeight;
  const long = Math.max(size.width, size.height);
  const short = Math.min(size.width, size.height);
  return isFlat ? { width: long, height: short } : { width: short, height: long };
}

export const hasSize = (print: Pick<Print, 'paperWidth' | 'paperHeight'>, size: Size): boolean => {
  const laid = laidLike(size, print);
  return print.paperWidth === laid.width && print.paperHeight === laid.height;
};

/** A typed paper size; null for what is no length, and for what no print measures (under 1/2 in or over 40 in). */
export function readPaperLength(text: string, unit: TypedUnit): Length | null {
  const length = parseLength(text, unit);
  return length !== null && length >= inches(1 / 2) && length <= inches(40) ? length : null;
}

/** True where file and paper differ in shape and nobody has yet looked: the paper rectangle is still where it started. */
export const needsALook = (print: Print): boolean => hasAutomaticPaperRect(print) && differsInShape(print);

/** The paper rectangle moved by whole pixels, in the oriented original. It may leave the image: there the paper is white. */
export const movePaper = (rect: PxRect, dx: number, dy: number): PxRect => ({ ...rect, x: rect.x + Math.round(dx), y: rect.y + Math.round(dy) });

/** No paper shows less of a file; of so few pixels a whole one still keeps the proportions near enough. */
const LEAST_PX = 100;

/** The paper rectangle grown about its middle by `factor`, in the paper's proportions. */
export function growPaper(print: Pick<Print, 'paperRect' | 'paperWidth' | 'paperHeight' | 'turns'>, factor: number): PxRect {
  const { paperRect } = print;
  const shape = turnedSize({ width: print.paperWidth, height: print.paperHeight }, print.turns);
  const width = Math.max(LEAST_PX, Math.round(paperRect.width * factor));
  const height = Math.round((width * shape.height) / shape.width);
  return {
    x: Math.round(paperRect.x + (paperRect.width - width) / 2),
    y: Math.round(paperRect.y + (paperRect.height - height) / 2),
    width,
    height,
  };
}
