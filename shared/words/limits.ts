import type { Threshold } from '../checks/check';
import { formatLength, parseLength, type Unit } from './measure';

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

const PERCENT = 100;
const DECIMALS = 10_000;

/** A limit as it is typed and read, without its unit: lengths as everywhere, shares in percent, the rest as a decimal. */
export function limitText(value: number, kind: Threshold['unit'], unit: Unit): string {
  if (kind === 'length') return formatLength(value, unit);
  return String(Math.round(value * (kind === 'share' ? PERCENT : 1) * DECIMALS) / DECIMALS);
}

/** The stored value of what was typed, with a comma or a point; null where it is no number. Counts are whole. */
export function readLimit(text: string, kind: Threshold['unit'], unit: Unit): number | null {
  if (kind === 'length') return parseLength(text, unit);
  const number = text.trim() === '' ? Number.NaN : Number(text.trim().replace(',', '.'));
  if (!Number.isFinite(number)) return null;
  if (kind === 'share') return number / PERCENT;
  return kind === 'count' ? Math.round(number) : number;
}

/** A limit with its unit. */
export function limitWords(value: number, kind: Threshold['unit'], unit: Unit): string {
  const suffix = limitUnit(kind, unit);
  return `${limitText(value, kind, unit)}${suffix === '' || suffix === '°' ? suffix : ` ${suffix}`}`;
}
