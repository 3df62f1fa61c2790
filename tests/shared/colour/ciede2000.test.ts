import fc from 'fast-check';
import Color from 'colorjs.io';
import { describe, expect, it } from 'vitest';
import { ciede2000, ciede2000Each } from '#shared/colour/ciede2000';
import type { Lab } from '#shared/colour/convert';

// Table 1 of G. Sharma, W. Wu, E. N. Dalal (2005), "The CIEDE2000 color-difference formula: implementation
// notes, supplementary test data, and mathematical observations", Color Res. Appl. 30(1): 21–30.
// L1 a1 b1 L2 a2 b2 ΔE00. The even pairs are from memory; a wrong digit would not give the published difference.
const PAIRS: readonly (readonly [number, number, number, number, number, number, number])[] = [
  [50, 2.6772, -79.7751, 50, 0, -82.7485, 2.0425],
  [50, 3.1571, -77.2803, 50, 0, -82.7485, 2.8615],
  [50, 2.8361, -74.02, 50, 0, -82.7485, 3.4412],
  [50, -1.3802, -84.2814, 50, 0, -82.7485, 1],
  [50, -1.1848, -84.8006, 50, 0, -82.7485, 1],
  [50, -0.9009, -85.5211, 50, 0, -82.7485, 1],
  [50, 0, 0, 50, -1, 2, 2.3669],
  [50, -1, 2, 50, 0, 0, 2.3669],
  [50, 2.49, -0.001, 50, -2.49, 0.0009, 7.1792],
  [50, 2.49, -0.001, 50, -2.49, 0.001, 7.1792],
  [50, 2.49, -0.001, 50, -2.49, 0.0011, 7.2195],
  [50, 2.49, -0.001, 50, -2.49, 0.0012, 7.2195],
  [50, -0.001, 2.49, 50, 0.0009, -2.49, 4.8045],
  [50, -0.001, 2.49, 50, 0.001, -2.49, 4.8045],
  [50, -0.001, 2.49, 50, 0.0011, -2.49, 4.7461],
  [50, 2.5, 0, 50, 0, -2.5, 4.3065],
  [50, 2.5, 0, 73, 25, -18, 27.1492],
  [50, 2.5, 0, 61, -5, 29, 22.8977],
  [50, 2.5, 0, 56, -27, -3, 31.903],
  [50, 2.5, 0, 58, 24, 15, 19.4535],
  [50, 2.5, 0, 50, 3.1736, 0.5854, 1],
  [50, 2.5, 0, 50, 3.2972, 0, 1],
  [50, 2.5, 0, 50, 1.8634, 0.5757, 1],
  [50, 2.5, 0, 50, 3.2592, 0.335, 1],
  [60.2574, -34.0099, 36.2677, 60.4626, -34.1751, 39.4387, 1.2644],
  [63.0109, -31.0961, -5.8663, 62.8187, -29.7946, -4.0864, 1.263],
  [61.2901, 3.7196, -5.3901, 61.4292, 2.248, -4.962, 1.8731],
  [35.0831, -44.1164, 3.7933, 35.0232, -40.0716, 1.5901, 1.8645],
  [22.7233, 20.0904, -46.694, 23.0331, 14.973, -42.5619, 2.0373],
  [36.4612, 47.858, 18.3852, 36.2715, 50.5065, 21.2231, 1.4146],
  [90.8027, -2.0831, 1.441, 91.1528, -1.6435, 0.0447, 1.4441],
  [90.9257, -0.5406, -0.9208, 88.6381, -0.8985, -0.7239, 1.5381],
  [6.7747, -0.2908, -2.4247, 5.8714, -0.0985, -2.2286, 0.6377],
  [2.0776, 0.0795, -1.135, 0.9033, -0.0636, -0.5514, 0.9082],
];

const channel = fc.double({ min: -100, max: 100, noNaN: true });
const labs = fc.tuple(fc.double({ min: 0, max: 100, noNaN: true }), channel, channel);

describe('ciede2000', () => {
  it.each(PAIRS)('gives the published difference for %d %d %d and %d %d %d', (l1, a1, b1, l2, a2, b2, published) => {
    expect(ciede2000([l1, a1, b1], [l2, a2, b2])).toBeCloseTo(published, 4);
    expect(ciede2000([l2, a2, b2], [l1, a1, b1])).toBeCloseTo(published, 4);
  });

  it('agrees with colorjs on any two colours', () => {
    fc.assert(
      fc.property(labs, labs, (p, q) => {
        // colorjs measures in Lab D50; the formula itself does not know the white.
        const theirs = new Color('lab', [...p]).deltaE(new Color('lab', [...q]), '2000');
        // It also takes the faintest chroma for none (its LCH), by which near-greys differ in the seventh digit.
        expect(ciede2000(p, q)).toBeCloseTo(theirs, 5);
      }),
    );
  });

  it('is finite, never negative, symmetric, and nothing for equal colours', () => {
    fc.assert(
      fc.property(labs, labs, (p, q) => {
        const difference = ciede2000(p, q);
        expect(difference).toBeGreaterThanOrEqual(0);
        expect(Number.isFinite(difference)).toBe(true);
        expect(ciede2000(q, p)).toBeCloseTo(difference, 9);
        expect(ciede2000(p, p)).toBe(0);
      }),
    );
  });

  it('measures many colours at once as it does one by one', () => {
    const from: Lab = [40, 10, -20];
    const triples = Float64Array.from(PAIRS.flatMap(([l, a, b]) => [l, a, b]));
    const each = ciede2000Each(triples, from);
    PAIRS.forEach(([l, a, b], i) => expect(each[i]).toBe(ciede2000([l, a, b], from)));
  });
});
