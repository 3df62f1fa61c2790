import { describe, expect, it } from 'vitest';
import { measureColours } from '#server/images/measure-colours';
import { ciede2000 } from '#shared/colour/ciede2000';
import { hexToLab, rgbToHex } from '#shared/colour/convert';
import { patches } from '../../support/pictures';

/**
 * The 24 patches of the ColorChecker Classic in the published 8-bit sRGB values (X-Rite; the same integers in
 * BabelColor's tables by D. Pascale), in the chart's four rows of six.
 */
const CHART: [number, number, number][][] = [
  [[115, 82, 68], [194, 150, 130], [98, 122, 157], [87, 108, 67], [133, 128, 177], [103, 189, 170]],
  [[214, 126, 44], [80, 91, 166], [193, 90, 99], [94, 60, 108], [157, 188, 64], [224, 163, 46]],
  [[56, 61, 150], [70, 148, 73], [175, 54, 60], [231, 199, 31], [187, 86, 149], [8, 133, 161]],
  [[243, 243, 242], [200, 200, 200], [160, 160, 160], [122, 122, 121], [85, 85, 85], [52, 52, 52]],
];

/** Wrong by no more than what a person can just see (CIEDE2000 of about 1), with as much again for rounding and resampling. */
const SAME = 2;
const SIDE = 48;

const distance = (hex: string, rgb: readonly [number, number, number]): number =>
  ciede2000(hexToLab(hex), hexToLab(rgbToHex(...rgb)));

describe('a palette of a published colour target', () => {
  it.each(CHART.map((row, i) => [i + 1, row] as const))('finds every patch of row %d with its true share', async (_number, row) => {
    const { palette } = await measureColours(patches([row], SIDE));
    for (const patch of row) {
      const found = palette.filter(({ hex }) => distance(hex, patch) <= SAME);
      expect(found, rgbToHex(...patch)).toHaveLength(1);
      expect(found[0]!.share).toBeCloseTo(1 / row.length, 2);
    }
  });

  it('of the whole chart invents no colour, and its shares are of whole patches', async () => {
    const all = CHART.flat();
    const { palette } = await measureColours(patches(CHART, SIDE));
    expect(palette.length).toBeGreaterThanOrEqual(12);
    for (const { hex, share } of palette) {
      expect(Math.min(...all.map((patch) => distance(hex, patch))), hex).toBeLessThanOrEqual(SAME);
      expect(Math.abs(share * 24 - Math.round(share * 24)), hex).toBeLessThan(0.02);
    }
    expect(palette.reduce((sum, { share }) => sum + share, 0)).toBeLessThanOrEqual(1);
  });

  it('has no colour that is not in a picture of one colour', async () => {
    const { palette } = await measureColours(patches([[[8, 133, 161]]], SIDE));
    expect(palette.map(({ share }) => Math.round(share * 100))).toEqual([100]);
    expect(distance(palette[0]!.hex, [8, 133, 161])).toBeLessThanOrEqual(SAME);
  });
});
