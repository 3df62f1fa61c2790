/**
 * A physical length: an integer in 1/160 mm, the largest unit of which 1/32 in (127) and
 * 1 mm (160) are both whole multiples. The brand is optional so that integer literals and
 * sums stay usable; a `Px` cannot be passed for a `Length`, nor the other way round.
 */
export type Length = number & { readonly __unit?: 'length' };

/** Integer pixels of the EXIF-oriented original. */
export type Px = number & { readonly __unit?: 'px' };

export const UNITS_PER_MM = 160;
export const UNITS_PER_INCH = 4064;

/** Inches to Length: `inches(3, 7/8)` is 3 7/8 in. Rounded to the nearest unit. */
export function inches(whole: number, fraction = 0): Length {
  return Math.round((whole + fraction) * UNITS_PER_INCH);
}

/** Millimetres to Length, rounded to the nearest unit. */
export function millimetres(mm: number): Length {
  return Math.round(mm * UNITS_PER_MM);
}

export function toInches(length: Length): number {
  return length / UNITS_PER_INCH;
}

/** `value` moved to the nearest multiple of `mark`; halves go up. Never −0, which JSON cannot carry. */
export function snapTo(value: Length, mark: Length): Length {
  return Math.round(value / mark) * mark + 0;
}
