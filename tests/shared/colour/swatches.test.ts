import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { ciede2000 } from '#shared/colour/ciede2000';
import { hexToLab, hexToRgb } from '#shared/colour/convert';
import { measureSwatches } from '#shared/colour/swatches';

/** Pixels of flat fields, `count` of each colour. */
function fields(...parts: readonly (readonly [hex: string, count: number])[]): Uint8Array {
  return Uint8Array.from(parts.flatMap(([hex, count]) => Array.from({ length: count }, () => hexToRgb(hex)).flat()));
}

// Published 8-bit sRGB values of the 24-patch colour target (X-Rite/BabelColor, via colour-science, BSD-3).
const TARGET = [
  '#735244', '#c29682', '#627a9d', '#576c43', '#8580b1', '#67bdaa', '#d67e2c', '#505ba6', '#c15a63', '#5e3c6c',
  '#9dbc40', '#e0a32e', '#383d96', '#469449', '#af363c', '#e7c71f', '#bb5695', '#0885a1', '#f3f3f2', '#c8c8c8',
  '#a0a0a0', '#7a7a79', '#555555', '#343434',
];

describe('measureSwatches', () => {
  it('finds the flat fields of a chart with their true shares', () => {
    const swatches = measureSwatches(fields(['#0885a1', 500], ['#e7c71f', 300], ['#af363c', 150], ['#343434', 50]), []);
    expect(swatches.map(({ hex, share }) => [hex, share])).toEqual([
      ['#0885a1', 0.5],
      ['#e7c71f', 0.3],
      ['#af363c', 0.15],
      ['#343434', 0.05],
    ]);
  });

  it('invents no colour on the published 24-patch target, and every patch is near a swatch it could be grouped with', () => {
    const swatches = measureSwatches(fields(...TARGET.map((hex) => [hex, 40] as const)), []);
    expect(swatches.length).toBeGreaterThanOrEqual(10);
    for (const { hex } of swatches) {
      const nearest = Math.min(...TARGET.map((patch) => ciede2000(hexToLab(patch), hexToLab(hex))));
      expect(nearest).toBeLessThan(1);
    }
  });

  it('drops a candidate that no pixel backs and keeps the role of one that pixels do', () => {
    const pixels = fields(['#0885a1', 900], ['#e7c71f', 100]);
    const swatches = measureSwatches(pixels, [
      { hex: '#bb5695', role: 'vibrant' },
      { hex: '#E7C71F', role: 'light-vibrant' },
    ]);
    expect(swatches.map(({ hex, role, share }) => [hex, role, share])).toEqual([
      ['#0885a1', 'area', 0.9],
      ['#e7c71f', 'light-vibrant', 0.1],
    ]);
  });

  it('merges near-equal candidates into the first', () => {
    const swatches = measureSwatches(fields(['#0885a1', 100]), [
      { hex: '#0885a1', role: 'vibrant' },
      { hex: '#0a86a2', role: 'muted' },
    ]);
    expect(swatches.map(({ hex, role, share }) => [hex, role, share])).toEqual([['#0885a1', 'vibrant', 1]]);
  });

  it('has nothing to say of no pixels', () => {
    expect(measureSwatches(new Uint8Array(0), [{ hex: '#0885a1', role: 'vibrant' }])).toEqual([]);
  });

  it('gives shares that are positive, finite and add up to at most 1, the same each time', () => {
    fc.assert(
      fc.property(fc.uint8Array({ minLength: 3, maxLength: 600 }), (rgb) => {
        const swatches = measureSwatches(rgb, [{ hex: '#336699', role: 'muted' }]);
        expect(swatches.length).toBeGreaterThan(0);
        for (const { share, oklch } of swatches) {
          expect(share).toBeGreaterThan(0);
          expect(oklch.every(Number.isFinite)).toBe(true);
        }
        expect(swatches.reduce((sum, { share }) => sum + share, 0)).toBeLessThanOrEqual(1 + 1e-9);
        expect(measureSwatches(rgb, [{ hex: '#336699', role: 'muted' }])).toEqual(swatches);
      }),
    );
  });
});
