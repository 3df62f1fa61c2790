import type { Threshold } from '../checks/check';
import { UNITS_PER_INCH, UNITS_PER_MM } from '../model/length';
import { formatLength, type Unit } from './measure';

/** How many of the stored units one shown unit is. */
function scaleOf(kind: Threshold['unit'], unit: Unit): number {
  if (kind === 'length') return unit === 'in' ? UNITS_PER_INCH : UNITS_PER_MM;
  return kind === 'share' ? 1 / 100 : 1;
}

/** What stands after a limit's number. */
export function limitUnit(kind: Threshold['unit'], unit: Unit): string {
  switch (kind) {
    case 'length':
      return unit;
    case 'share':
      return '%';
    case 'degrees':
      return '°';
    case 'steps':
      return 'steps';
    case 'points':
    case 'ratio':
    case 'count':
      return '';
  }
}

/** A limit as it is typed: a decimal in the reader's unit. */
export const limitText = (value: number, kind: Threshold['unit'], unit: Unit): string => String(Math.round((value / scaleOf(kind, unit)) * 10_000) / 10_000);

/** The stored value of what was typed, with a comma or a point; null where it is no number. Lengths and counts are whole. */
export function readLimit(text: string, kind: Threshold['unit'], unit: Unit): number | null {
  const number = text.trim() === '' ? Number.NaN : Number(text.trim().replace(',', '.'));
  if (!Number.isFinite(number)) return null;
  const value = number * scaleOf(kind, unit);
  return kind === 'length' || kind === 'count' ? Math.round(value) : value;
}

/** A limit as it is read: inches as fractions. */
export function limitWords(value: number, kind: Threshold['unit'], unit: Unit): string {
  const suffix = limitUnit(kind, unit);
  const number = kind === 'length' ? formatLength(value, unit) : limitText(value, kind, unit);
  return `${number}${suffix === '' || suffix === '°' ? suffix : ` ${suffix}`}`;
}
