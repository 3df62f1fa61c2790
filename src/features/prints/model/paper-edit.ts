import { centreCrop, differsInShape, turnedSize } from '#shared/geometry/paper';
import { INCH_PRINT_SIZES, INSTANT_PRINT_SIZES, METRIC_PRINT_SIZES, type PrintSize } from '#shared/model/guess-print-size';
import type { Turns } from '#shared/model/ids';
import { inches, millimetres, type Length } from '#shared/model/length';
import type { Print, PxRect } from '#shared/model/print';
import type { Size } from '#shared/model/rect';
import type { Unit } from '#shared/words/measure';
import type { PrintChange } from '../api/print-mutations';

/** Proportions that differ by less are the same shape, so the paper rectangle may stay. */
const SAME_SHAPE = 0.005;

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

/** The change that gives a print another paper. A new shape starts again from the centre crop of the file. */
export function changeSize(print: Print, paper: Size): PrintChange {
  const ratio = (paper.width / paper.height) * (print.paperHeight / print.paperWidth);
  const isSameShape = Math.abs(Math.log(ratio)) < SAME_SHAPE;
  return {
    paperWidth: paper.width,
    paperHeight: paper.height,
    ...(!isSameShape && { paperRect: centreCrop({ width: print.imageWidth, height: print.imageHeight }, paper, print.turns) }),
  };
}

/** The change that turns a print's picture by a quarter clockwise: the paper turns along. */
export const turnPrint = (print: Pick<Print, 'turns' | 'paperWidth' | 'paperHeight'>): PrintChange => ({
  turns: ((print.turns + 1) % 4) as Turns,
  paperWidth: print.paperHeight,
  paperHeight: print.paperWidth,
});

/**
 * A typed length: `4`, `3.5`, `3,5`, `3 1/2` or `1/2` in inches; a number of centimetres for the metric reader.
 *
 * @returns null for anything else, and for what no print measures (under 1/2 in or over 40 in).
 */
export function readLength(text: string, unit: Unit): Length | null {
  const match = /^(?:(\d+(?:[.,]\d+)?)|(?:(\d+)\s+)?(\d+)\/([1-9]\d*))$/.exec(text.trim());
  if (match === null) return null;
  const [, decimal, whole, numerator, denominator] = match;
  const value = decimal !== undefined ? Number(decimal.replace(',', '.')) : Number(whole ?? 0) + Number(numerator) / Number(denominator);
  const length = unit === 'in' ? inches(value) : millimetres(value * 10);
  return length >= inches(1 / 2) && length <= inches(40) ? length : null;
}

/**
 * True where file and paper differ in shape and nobody has yet looked: the paper rectangle is still the centre
 * crop that it started from.
 */
export function needsALook(print: Print): boolean {
  const { x, y, width, height } = print.paperRect;
  const start = centreCrop({ width: print.imageWidth, height: print.imageHeight }, { width: print.paperWidth, height: print.paperHeight }, print.turns);
  const isUntouched = x === start.x && y === start.y && width === start.width && height === start.height;
  return isUntouched && differsInShape(print);
}

/** The paper rectangle moved by whole pixels, in the oriented original. It may leave the image: there the paper is white. */
export const movePaper = (rect: PxRect, dx: number, dy: number): PxRect => ({ ...rect, x: rect.x + Math.round(dx), y: rect.y + Math.round(dy) });

/** The paper rectangle grown about its middle by `factor`, in the paper's proportions. */
export function growPaper(print: Pick<Print, 'paperRect' | 'paperWidth' | 'paperHeight' | 'turns'>, factor: number): PxRect {
  const { paperRect } = print;
  const shape = turnedSize({ width: print.paperWidth, height: print.paperHeight }, print.turns);
  const width = Math.max(16, Math.round(paperRect.width * factor));
  const height = Math.max(16, Math.round((width * shape.height) / shape.width));
  return {
    x: Math.round(paperRect.x + (paperRect.width - width) / 2),
    y: Math.round(paperRect.y + (paperRect.height - height) / 2),
    width,
    height,
  };
}
