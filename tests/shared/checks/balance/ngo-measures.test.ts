import { describe, expect, it } from 'vitest';
import { ngoEquilibrium } from '#shared/checks/balance/ngo-equilibrium';
import { NGO_MEASURES, ngoMeasures, type NgoMeasure } from '#shared/checks/balance/ngo-measures';
import { ngoDensity } from '#shared/checks/balance/ngo-sizes';
import { ngoHomogeneity } from '#shared/checks/balance/ngo-quadrants';
import type { Rect } from '#shared/model/rect';

const rect = (x: number, y: number, width: number, height: number): Rect => ({ x, y, width, height });
const frame = (width: number, height: number) => ({ width, height });

/**
 * Values in closed form, worked out by hand from the formulas of Ngo, Teo and Byrne (2003), Information Sciences
 * 152:25–46, in the variants that the functions name. Slopes and roots are left to the full reference files.
 */
const CASES: readonly (readonly [string, { width: number; height: number }, readonly Rect[], Partial<Record<NgoMeasure, number>>])[] = [
  [
    'four equal squares, a quarter each',
    frame(12, 12),
    [rect(1, 1, 4, 4), rect(7, 1, 4, 4), rect(1, 7, 4, 4), rect(7, 7, 4, 4)],
    {
      balance: 1, equilibrium: 1, symmetry: 1, sequence: 1, cohesion: 1,
      // Layout 10 × 10, covered 64 of 144: space 1 − 36/80; one size.
      unity: (1 + 11 / 20) / 2,
      proportion: 1, simplicity: 3 / 8, density: 8 / 9, regularity: 3 / 4, economy: 1, homogeneity: 1, rhythm: 1,
    },
  ],
  [
    'one square in the lower right corner',
    frame(12, 12),
    [rect(8, 8, 4, 4)],
    {
      balance: 0, equilibrium: 1 / 3,
      // Only one quarter has anything: of every twelve differences half are 1.
      symmetry: 1 / 2, sequence: 1 / 4, rhythm: 1 / 2,
      cohesion: 1, unity: 1, proportion: 1, simplicity: 1, density: 2 / 9, regularity: 1, economy: 1, homogeneity: 1,
    },
  ],
  [
    'a column down the left',
    frame(12, 12),
    [rect(1, 1, 4, 3), rect(1, 5, 4, 3), rect(1, 9, 4, 2)],
    {
      balance: 5 / 11, equilibrium: 1 - (1 / 6 + 1 / 144) / 2, sequence: 3 / 4, cohesion: 1 / 3, unity: (2 / 3 + 13 / 14) / 2,
      simplicity: 3 / 7, density: 4 / 9, regularity: 2 / 3, economy: 1 / 2, homogeneity: 1 / 2,
    },
  ],
  [
    'a pinwheel of five that fills its frame',
    frame(10, 10),
    [rect(0, 0, 6, 4), rect(6, 0, 4, 6), rect(4, 6, 6, 4), rect(0, 4, 4, 6), rect(4, 4, 2, 2)],
    {
      balance: 1, equilibrium: 1, sequence: 1, cohesion: (1 + 11 / 15) / 2, unity: 4 / 5, simplicity: 3 / 11, density: 0,
      regularity: (2 / 5 + 7 / 8) / 2, economy: 1 / 3, homogeneity: 1, rhythm: 1 - 4 / 27,
    },
  ],
];

describe('the measures of Ngo, Teo and Byrne', () => {
  it.each(CASES)('%s', (_, size, rects, wanted) => {
    const found = ngoMeasures(size, rects);
    for (const [name, value] of Object.entries(wanted)) expect([name, found[name as NgoMeasure]]).toEqual([name, expect.closeTo(value, 12)]);
  });

  it('order is the mean of the thirteen others', () => {
    const { order, ...parts } = ngoMeasures(frame(12, 12), [rect(8, 8, 4, 4)]);
    expect(order).toBeCloseTo(Object.values(parts).reduce((a, b) => a + b, 0) / 13, 12);
  });

  it('are between 0 and 1 for nothing, for two on one spot, and for more objects than factorials reach', () => {
    const many = Array.from({ length: 200 }, (_, i) => rect(i % 20, Math.floor(i / 20), 1, 1));
    for (const rects of [[], [rect(0, 0, 5, 5), rect(0, 0, 5, 5)], many]) {
      const found = ngoMeasures(frame(20, 12), rects);
      for (const name of NGO_MEASURES) {
        expect([name, found[name] >= 0 && found[name] <= 1 + 1e-12]).toEqual([name, true]);
      }
    }
  });

  it('tells the two densities and the two equilibria apart', () => {
    const rects = [rect(0, 0, 3, 12)];
    expect(ngoDensity(frame(12, 12), rects)).toEqual({ density: 0.5, density2000: 0.75 });
    expect(ngoEquilibrium(frame(12, 12), [...rects, rect(3, 0, 3, 12)])).toEqual({ equilibrium: 0.875, withoutCount: 0.75 });
  });

  it('deals an uneven number as evenly as whole objects allow', () => {
    const five = [rect(0, 0, 1, 1), rect(1, 1, 1, 1), rect(9, 0, 1, 1), rect(0, 9, 1, 1), rect(9, 9, 1, 1)];
    expect(ngoHomogeneity(frame(10, 10), five)).toBeCloseTo(1, 12);
    expect(ngoHomogeneity(frame(10, 10), five.map(() => rect(0, 0, 1, 1)))).toBeCloseTo(1 / 60, 12);
  });
});
