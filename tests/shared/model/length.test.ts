import { describe, expect, it } from 'vitest';
import { inches, millimetres, toInches, toMillimetres } from '#shared/model/length';
import { formatLength, formatSize } from '#shared/words/measure';

describe('lengths', () => {
  // An inch is exactly 25.4 mm: the international yard and pound agreement of 1959.
  it('hold 1/32 in and 1 mm as whole numbers', () => {
    expect(inches(1 / 32)).toBe(127);
    expect(millimetres(1)).toBe(160);
    expect(inches(1)).toBe(millimetres(25.4));
    expect(toMillimetres(inches(1))).toBe(25.4);
    expect(toInches(inches(3, 7 / 8))).toBe(3.875);
  });

  it.each([
    [inches(3, 7 / 8), 'in', '3 7/8'],
    [inches(1 / 2), 'in', '1/2'],
    [inches(4), 'in', '4'],
    [inches(0), 'in', '0'],
    [inches(2, 31 / 32), 'in', '2 31/32'],
    [inches(4) - 1, 'in', '4'],
    [-inches(1 / 16), 'in', '−1/16'],
    [millimetres(98), 'mm', '98'],
    [millimetres(98.44), 'mm', '98.4'],
    [-millimetres(3), 'mm', '−3'],
  ] as const)('%d in %s reads %s', (length, unit, words) => {
    expect(formatLength(length, unit)).toBe(words);
  });

  it('say the unit once, at the end', () => {
    expect(formatSize({ width: inches(3, 7 / 8), height: inches(2, 7 / 8) }, 'in')).toBe('3 7/8 × 2 7/8 in');
  });
});
