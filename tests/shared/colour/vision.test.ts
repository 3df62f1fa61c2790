import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { ciede2000 } from '#shared/colour/ciede2000';
import { hexToLab, hexToRgb, rgbToHex } from '#shared/colour/convert';
import { seenAs, VISION_MATRICES, visionFilterValues, VISIONS } from '#shared/colour/vision';

const deltaE = (a: string, b: string): number => ciede2000(hexToLab(a), hexToLab(b));

describe('seenAs', () => {
  // The published matrix's column for a primary, encoded by IEC 61966-2-1: for red without long-wave cones
  // 0.152286, 0.114503 and −0.003882 (clamped) are 109, 95 and 0.
  it.each([
    ['protanopia', '#ff0000', [109, 95, 0]],
    ['protanopia', '#0000ff', [0, 89, 255]],
    ['deuteranopia', '#ff0000', [163, 144, 0]],
    ['deuteranopia', '#00ff00', [239, 214, 58]],
    ['tritanopia', '#0000ff', [0, 107, 150]],
    ['tritanopia', '#ff0000', [255, 0, 15]],
  ] as const)('shows %s of %s as published', (vision, hex, rgb) => {
    expect(hexToRgb(seenAs(hex, vision))).toEqual(rgb);
  });

  it('leaves greys grey and as light as they are', () => {
    fc.assert(
      fc.property(fc.nat(255), fc.constantFrom(...VISIONS), (v, vision) => {
        for (const channel of hexToRgb(seenAs(rgbToHex(v, v, v), vision))) expect(Math.abs(channel - v)).toBeLessThanOrEqual(1);
      }),
    );
    for (const vision of VISIONS) {
      for (const row of [0, 3, 6]) expect(VISION_MATRICES[vision].slice(row, row + 3).reduce((sum, v) => sum + v, 0)).toBeCloseTo(1, 5);
    }
  });

  it('makes a red and a green of one lightness alike where red and green are not told apart, and only there', () => {
    const [red, green] = ['#b5483a', '#6f7a1f'];
    expect(deltaE(red, green)).toBeGreaterThan(35);
    expect(deltaE(seenAs(red, 'deuteranopia'), seenAs(green, 'deuteranopia'))).toBeLessThan(15);
    expect(deltaE(seenAs(red, 'tritanopia'), seenAs(green, 'tritanopia'))).toBeGreaterThan(25);
  });
});

describe('visionFilterValues', () => {
  it('is the matrix in four rows of five, opacity untouched', () => {
    expect(visionFilterValues('deuteranopia').split(' ').map(Number)).toEqual([
      0.367322, 0.860646, -0.227968, 0, 0, 0.280085, 0.672501, 0.047413, 0, 0, -0.01182, 0.04294, 0.968881, 0, 0, 0, 0, 0, 1, 0,
    ]);
  });
});
