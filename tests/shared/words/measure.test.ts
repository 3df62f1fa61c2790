import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { inches, millimetres } from '#shared/model/length';
import { formatLength, formatSize, parseLength } from '#shared/words/measure';

describe('a length as people read it', () => {
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
  ] as const)('%d in %s: %s', (length, unit, words) => {
    expect(formatLength(length, unit)).toBe(words);
  });

  it('says the unit once, at the end', () => {
    expect(formatSize({ width: inches(3, 7 / 8), height: inches(2, 7 / 8) }, 'in')).toBe('3 7/8 × 2 7/8 in');
  });
});

describe('a length as people type it', () => {
  it.each([
    ['3 7/8', 'in', inches(3, 7 / 8)],
    ['1/2', 'in', inches(1 / 2)],
    [' 3,5 ', 'in', inches(3.5)],
    ['8.9', 'cm', millimetres(89)],
    ['98.4', 'mm', millimetres(98.4)],
  ] as const)('reads "%s" %s', (text, unit, length) => {
    expect(parseLength(text, unit)).toBe(length);
  });

  it.each(['', 'wide', '3 1/0', '1/2/3', '-2', '3 1', '1e3', '.5'])('reads "%s" as no length', (text) => {
    expect(parseLength(text, 'in')).toBeNull();
  });

  it('reads back every length that it writes, to the nearest 1/32 in', () => {
    fc.assert(
      fc.property(fc.integer({ min: 0, max: 2000 }), (parts) => {
        const length = inches(parts / 32);
        expect(parseLength(formatLength(length, 'in'), 'in')).toBe(length);
      }),
    );
  });
});
