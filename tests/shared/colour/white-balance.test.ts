import { describe, expect, it } from 'vitest';
import { ciede2000 } from '#shared/colour/ciede2000';
import { hexToLab, rgbToHex } from '#shared/colour/convert';
import { balance, LEAST_UNCERTAINTY, measurePatch, readSheetColor, type ReadColor, type Reference } from '#shared/colour/white-balance';

/** The 24-patch ColorChecker's published 8-bit sRGB values (X-Rite, as BabelColor lists them). */
const CHART: readonly (readonly [name: string, r: number, g: number, b: number])[] = [
  ['dark skin', 115, 82, 68],
  ['light skin', 194, 150, 130],
  ['blue sky', 98, 122, 157],
  ['foliage', 87, 108, 67],
  ['blue flower', 133, 128, 177],
  ['bluish green', 103, 189, 170],
  ['orange', 214, 126, 44],
  ['purplish blue', 80, 91, 166],
  ['moderate red', 193, 90, 99],
  ['purple', 94, 60, 108],
  ['yellow green', 157, 188, 64],
  ['orange yellow', 224, 163, 46],
  ['blue', 56, 61, 150],
  ['green', 70, 148, 73],
  ['red', 175, 54, 60],
  ['yellow', 231, 199, 31],
  ['magenta', 187, 86, 149],
  ['cyan', 8, 133, 161],
  ['white 9.5', 243, 243, 242],
  ['neutral 8', 200, 200, 200],
  ['neutral 6.5', 160, 160, 160],
  ['neutral 5', 122, 122, 121],
  ['neutral 3.5', 85, 85, 85],
  ['black 2', 52, 52, 52],
];
const WHITE = CHART[18]!;

type Gains = readonly [r: number, g: number, b: number];
/** What a camera does that is set for daylight: light of another colour scales its channels, and the exposure all of them. */
const CASTS: Readonly<Record<string, Gains>> = {
  'an even light': [0.9, 0.9, 0.9],
  'a warm lamp': [0.95, 0.72, 0.42],
  'open shade': [0.55, 0.68, 0.9],
  'a green tube': [0.62, 0.9, 0.6],
};

const decode = (value: number): number => (value / 255 <= 0.04045 ? value / 255 / 12.92 : ((value / 255 + 0.055) / 1.055) ** 2.4);
const encode = (v: number): number => Math.round(255 * Math.min(1, v <= 0.0031308 ? 12.92 * v : 1.055 * v ** (1 / 2.4) - 0.055));

/** A noise that is the same in every run: ±3 of 255 levels. */
const noiseAt = (i: number): number => ((i * 7919) % 7) - 3;

/** 400 pixels of a patch as photographed under a cast, with noise and in whole levels. */
function photograph([, r, g, b]: (typeof CHART)[number], gains: Gains): Uint8Array {
  const seen = [r, g, b].map((v, c) => encode(decode(v) * gains[c]!));
  return Uint8Array.from({ length: 1200 }, (_, i) => Math.min(255, Math.max(0, seen[i % 3]! + noiseAt(i))));
}

const read = (patch: (typeof CHART)[number], gains: Gains): ReadColor => {
  const answer = readSheetColor(measurePatch(photograph(patch, gains)), measurePatch(photograph(WHITE, gains)), 'white');
  if (typeof answer === 'string') throw new Error(answer);
  return answer;
};

describe('a colour target photographed under a cast', () => {
  it.each(Object.entries(CASTS))('is read back under %s', (_name, gains) => {
    const errors = CHART.map((patch) => {
      const { hex, uncertainty } = read(patch, gains);
      return { deltaE: ciede2000(hexToLab(hex), hexToLab(rgbToHex(patch[1], patch[2], patch[3]))), uncertainty };
    });
    const mean = errors.reduce((sum, { deltaE }) => sum + deltaE, 0) / errors.length;
    expect(mean).toBeLessThan(2);
    expect(Math.max(...errors.map(({ deltaE }) => deltaE))).toBeLessThan(5);
    // What is said of a reading covers what went wrong with it.
    expect(errors.filter(({ deltaE, uncertainty }) => deltaE > uncertainty).length).toBeLessThanOrEqual(1);
  });

  it('would be far off without the patch', () => {
    const [, gains] = Object.entries(CASTS)[1]!;
    const raw = measurePatch(photograph(CHART[20]!, gains)).mean;
    const hex = rgbToHex(...(raw.map(encode) as [number, number, number]));
    expect(ciede2000(hexToLab(hex), hexToLab('#a0a0a0'))).toBeGreaterThan(10);
  });
});

describe('white balance', () => {
  it.each(['white', 'grey'] as const)('sends the %s patch itself to a neutral', (reference: Reference) => {
    const [r, g, b] = balance([0.4, 0.3, 0.15], [0.4, 0.3, 0.15], reference);
    expect(Math.max(r, g, b) - Math.min(r, g, b)).toBeLessThan(1e-4);
  });

  it('says why a reading would be worth nothing', () => {
    const even = (r: number, g: number, b: number) => measurePatch(Uint8Array.from({ length: 300 }, (_, i) => [r, g, b][i % 3]!));
    const halves = measurePatch(Uint8Array.from({ length: 600 }, (_, i) => (i < 300 ? 220 : 60)));
    const sheet = even(120, 80, 60);
    expect(readSheetColor(sheet, even(255, 250, 240), 'white')).toBe('patch-clipped');
    expect(readSheetColor(sheet, even(20, 20, 20), 'white')).toBe('patch-dark');
    expect(readSheetColor(sheet, even(200, 40, 30), 'white')).toBe('patch-coloured');
    expect(readSheetColor(sheet, halves, 'white')).toBe('patch-uneven');
    expect(readSheetColor(halves, even(230, 225, 210), 'white')).toBe('sheet-uneven');
  });

  it('is less sure of an uneven sheet, and never surer than a camera is', () => {
    const white = measurePatch(photograph(WHITE, [0.9, 0.9, 0.9]));
    const smooth = readSheetColor(measurePatch(Uint8Array.from({ length: 300 }, () => 120)), white, 'white') as ReadColor;
    const grainy = readSheetColor(measurePatch(Uint8Array.from({ length: 300 }, (_, i) => (Math.floor(i / 3) % 2 ? 110 : 130))), white, 'white') as ReadColor;
    expect(smooth.uncertainty).toBeGreaterThanOrEqual(LEAST_UNCERTAINTY);
    expect(grainy.uncertainty).toBeGreaterThan(smooth.uncertainty);
  });
});
