import { inches, millimetres, UNITS_PER_INCH, UNITS_PER_MM, type Length } from '../model/length';

export type Unit = 'in' | 'mm';

/** Finest fraction that is written out: 1/32 in is a whole number of Lengths. */
const FRACTION = 32;

/**
 * A length as people read it, without its unit: inches as a whole number and a fraction in lowest terms
 * (`3 7/8`, to the nearest 1/32), or millimetres to one decimal (`98.4`).
 */
export function formatLength(length: Length, unit: Unit): string {
  if (unit === 'mm') return String(Math.round((length / UNITS_PER_MM) * 10) / 10).replace('-', '−');
  const parts = Math.round((Math.abs(length) * FRACTION) / UNITS_PER_INCH);
  const whole = Math.floor(parts / FRACTION);
  let numerator = parts % FRACTION;
  let denominator = FRACTION;
  while (numerator > 0 && numerator % 2 === 0) {
    numerator /= 2;
    denominator /= 2;
  }
  const fraction = numerator > 0 ? `${numerator}/${denominator}` : '';
  const sign = length < 0 && parts > 0 ? '−' : '';
  return `${sign}${[whole > 0 || fraction === '' ? String(whole) : '', fraction].filter(Boolean).join(' ')}`;
}

/** Width × height with the unit once, at the end: `3 7/8 × 2 7/8 in`. */
export function formatSize(size: { readonly width: Length; readonly height: Length }, unit: Unit): string {
  return `${formatLength(size.width, unit)} × ${formatLength(size.height, unit)} ${unit}`;
}

/** A unit in which people type. */
export type TypedUnit = Unit | 'cm';

/** `4`, `3.5`, `3,5`, or `3 1/2` and `1/2`. */
const NUMBER = /^(?:(\d+(?:[.,]\d+)?)|(?:(\d+)\s+)?(\d+)\/([1-9]\d*))$/;

/** A length as people type it, with or without a fraction, rounded to a whole unit of 1/160 mm; null for anything else. */
export function parseLength(text: string, unit: TypedUnit): Length | null {
  const match = NUMBER.exec(text.trim());
  if (!match) return null;
  const [, decimal, whole, numerator, denominator] = match;
  const value = decimal !== undefined ? Number(decimal.replace(',', '.')) : Number(whole ?? 0) + Number(numerator) / Number(denominator);
  return unit === 'in' ? inches(value) : millimetres(unit === 'cm' ? value * 10 : value);
}
