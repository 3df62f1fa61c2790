import { inches, millimetres, type Length } from './length';
import type { Size } from './rect';

/** A size in which photographs are printed, upright (width ≤ height). */
export interface PrintSize {
  readonly name: string;
  readonly width: Length;
  readonly height: Length;
  readonly instantFilm: boolean;
}

const inchSize = (name: string, width: number, height: number): PrintSize => ({
  name,
  width: inches(width),
  height: inches(height),
  instantFilm: false,
});

const metricSize = (name: string, widthMm: number, heightMm: number): PrintSize => ({
  name,
  width: millimetres(widthMm),
  height: millimetres(heightMm),
  instantFilm: false,
});

const instantSize = (name: string, widthMm: number, heightMm: number): PrintSize => ({
  ...metricSize(name, widthMm, heightMm),
  instantFilm: true,
});

/**
 * Sizes sold in inches, commonest first; exact inches. Names and sizes: Wikipedia, "Photo print sizes", which names
 * ISO 1008.
 */
export const INCH_PRINT_SIZES: readonly PrintSize[] = [
  inchSize('4 × 6 in', 4, 6),
  inchSize('5 × 7 in', 5, 7),
  inchSize('3 1/2 × 5 in', 3.5, 5),
  inchSize('8 × 10 in', 8, 10),
  inchSize('4 × 4 in', 4, 4),
];

/**
 * The sizes that are sold by rounded centimetres, commonest first. The paper comes from the same inch-wide rolls, so the
 * lengths are the nominal millimetres of the same source, not the rounded names (10 × 15 cm is 102 × 152 mm).
 */
export const METRIC_PRINT_SIZES: readonly PrintSize[] = [
  metricSize('10 × 15 cm', 102, 152),
  metricSize('13 × 18 cm', 127, 178),
  metricSize('9 × 13 cm', 89, 127),
  metricSize('20 × 25 cm', 203, 254),
  metricSize('10 × 10 cm', 102, 102),
];

/** Instant film with its white frame, outer size. Consumer reference pages; 88 × 107 also from its makers' 3.5 × 4.2 in. */
export const INSTANT_PRINT_SIZES: readonly PrintSize[] = [
  instantSize('instant, mini', 54, 86),
  instantSize('instant, small square', 72, 86),
  instantSize('instant, square', 88, 107),
  instantSize('instant, wide', 86, 108),
];

/** A guess claims a size only where the proportions agree this well (natural logarithm of their ratio). */
const AGREES_WITHIN = 0.02;

/** Instant film is never cut, so a wrong guess would raise false alarms: its proportions must agree more exactly. */
const INSTANT_AGREES_WITHIN = 0.008;

/** From here on a picture is a panorama, which no lab crops to the common size; 16 : 9 is still under it. */
const PANORAMA_FROM = 2;

export interface GuessedPrint {
  /** The upright paper. */
  readonly width: Length;
  readonly height: Length;
  readonly instantFilm: boolean;
}

/**
 * The size that a print of this picture most likely has, from its proportions alone: the size of the person's unit that
 * agrees best, ties to the commoner; an upright picture may also be a scanned instant print with its frame. Other shapes
 * (phones' 4 : 3) are taken for the commonest size, which labs crop to. A panorama keeps its own shape at the common
 * short side. Common practice where no source is named.
 *
 * @param image - size of the oriented original in pixels, both positive.
 */
export function guessPrintSize(image: Size, unit: 'in' | 'mm'): GuessedPrint {
  const isUpright = image.height >= image.width;
  const long = Math.max(image.width, image.height);
  const short = Math.min(image.width, image.height);
  const sizes = unit === 'in' ? INCH_PRINT_SIZES : METRIC_PRINT_SIZES;
  const common = sizes[0]!;
  const differenceTo = (size: PrintSize): number => Math.abs(Math.log((long * size.width) / (short * size.height)));

  if (long / short >= PANORAMA_FROM) {
    const mark = unit === 'in' ? inches(1 / 8) : millimetres(1);
    const length = Math.max(mark, Math.round((common.width * long) / short / mark) * mark);
    return laid({ ...common, height: length }, isUpright);
  }
  const fitting = sizes.filter((size) => differenceTo(size) <= AGREES_WITHIN);
  const best = fitting.reduce<PrintSize | null>(
    (found, size) => (found === null || differenceTo(size) < differenceTo(found) - 1e-9 ? size : found),
    null,
  );
  if (best) return laid(best, isUpright);
  const instant = INSTANT_PRINT_SIZES.find((size) => differenceTo(size) <= INSTANT_AGREES_WITHIN);
  return laid(isUpright && instant ? instant : common, isUpright);
}

const laid = (size: PrintSize, isUpright: boolean): GuessedPrint => ({
  width: isUpright ? size.width : size.height,
  height: isUpright ? size.height : size.width,
  instantFilm: size.instantFilm,
});
