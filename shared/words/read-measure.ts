import { UNITS_PER_INCH, UNITS_PER_MM, type Length } from '../model/length';

const UNITS = { in: UNITS_PER_INCH, mm: UNITS_PER_MM, cm: UNITS_PER_MM * 10 } as const;

/** A length as people write it, `12`, `8.5`, `8,5`, `8 1/2` or `1/2`, in the given unit; null for anything else. */
export function readLength(text: string, unit: keyof typeof UNITS): Length | null {
  const parts = /^(?:(\d{1,6}(?:[.,]\d{1,6})?)(?:\s+(\d{1,3})\/(\d{1,3}))?|(\d{1,3})\/(\d{1,3}))$/.exec(text.trim());
  if (!parts) return null;
  const [, number = '0', top = parts[4] ?? '0', bottom = parts[5] ?? '1'] = parts;
  const value = Number(number.replace(',', '.')) + Number(top) / Number(bottom);
  return Number.isFinite(value) ? Math.round(value * UNITS[unit]) : null;
}
