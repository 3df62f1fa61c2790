import fc from 'fast-check';
import Color from 'colorjs.io';
import { describe, expect, it } from 'vitest';
import {
  hexToLab,
  hexToOklab,
  hexToOklch,
  hexToRgb,
  rgbToHex,
  rgbToXyz,
  writeLab,
  xyzToOklab,
} from '#shared/colour/convert';
import { oklchToHex, parseColor } from '#shared/colour/css-color';

const hexes = fc.tuple(fc.nat(255), fc.nat(255), fc.nat(255)).map(([r, g, b]) => rgbToHex(r, g, b));
const near = (actual: readonly number[], expected: readonly number[], tolerance: number): void =>
  actual.forEach((value, i) => expect(Math.abs(value - expected[i]!)).toBeLessThanOrEqual(tolerance));

describe('conversions', () => {
  // B. Ottosson (2020), "A perceptual color space for image processing", table of example XYZ and OKLab pairs.
  // The table is rounded and CSS Color 4's matrices differ from it in the fourth digit.
  it.each([
    [[0.95, 1, 1.089], [1, 0, 0]],
    [[1, 0, 0], [0.45, 1.236, -0.019]],
    [[0, 1, 0], [0.922, -0.671, 0.263]],
    [[0, 0, 1], [0.153, -1.415, -0.449]],
  ] as const)('takes XYZ %j to OKLab %j (Ottosson)', ([x, y, z], oklab) => {
    near(xyzToOklab(x, y, z), oklab, 1e-3);
  });

  // Ottosson's C++ code on the sRGB primaries, as color.js (MIT) tests it.
  it.each([
    ['#ffffff', [1, 0, 0]],
    ['#00ff00', [0.86644, -0.233888, 0.179498]],
    ['#00ffff', [0.905399, -0.149444, -0.039398]],
    ['#ffff00', [0.967983, -0.071369, 0.19857]],
  ] as const)('takes %s to OKLab %j', (hex, oklab) => near(hexToOklab(hex), oklab, 1e-5));

  // CSS Color 4 conversions (W3C sample code), recomputed: hex, XYZ D65, Lab D65, OKLab.
  it.each([
    ['#ff0000', [0.412391, 0.212639, 0.019331], [53.2371, 80.0901, 67.2033], [0.627955, 0.224863, 0.125846]],
    ['#0000ff', [0.180481, 0.072192, 0.950532], [32.3009, 79.1953, -107.8555], [0.452014, -0.032457, -0.311528]],
    ['#000000', [0, 0, 0], [0, 0, 0], [0, 0, 0]],
    ['#00ffff', [0.538065, 0.787361, 1.069727], [91.1148, -48.0789, -14.129], [0.905399, -0.149444, -0.039398]],
    ['#ffff00', [0.769975, 0.927808, 0.138526], [97.1386, -21.56, 94.4838], [0.967983, -0.071369, 0.19857]],
    ['#ffefd5', [0.841132, 0.877978, 0.754687], [95.0757, 1.2689, 14.5254], [0.95808, 0.006622, 0.037681]],
    ['#ff6347', [0.468379, 0.306421, 0.094096], [62.2043, 57.8471, 46.4178], [0.696219, 0.16523, 0.104541]],
    ['#808000', [0.166207, 0.200277, 0.029902], [51.8685, -12.9332, 56.6781], [0.580665, -0.042812, 0.119116]],
    ['#ff7f50', [0.502759, 0.370211, 0.120879], [67.2929, 45.3495, 47.4921], [0.735113, 0.128225, 0.108538]],
    ['#f0e68c', [0.689631, 0.770131, 0.360441], [90.3276, -9.0138, 44.9804], [0.913489, -0.024852, 0.109128]],
    ['#767676', [0.172189, 0.181164, 0.197298], [49.637, 0, 0], [0.565836, 0, 0]],
    ['#123456', [0.031569, 0.032563, 0.092666], [21.0425, 1.0581, -24.1005], [0.319168, -0.023387, -0.068576]],
    ['#0d1b2a', [0.009758, 0.010366, 0.023392], [9.2924, -0.3494, -11.9876], [0.217686, -0.011407, -0.033689]],
    ['#8b9986', [0.263406, 0.299925, 0.269565], [61.6477, -8.7009, 8.3012], [0.666205, -0.023452, 0.02155]],
  ] as const)('takes %s through XYZ, Lab and OKLab', (hex, xyz, lab, oklab) => {
    near(rgbToXyz(...hexToRgb(hex)), xyz, 1e-6);
    near(hexToLab(hex), lab, 1e-4);
    near(hexToOklab(hex), oklab, 1e-6);
  });

  it('agrees with colorjs on every colour', () => {
    fc.assert(
      fc.property(hexes, (hex) => {
        const theirs = new Color(hex);
        near(hexToOklab(hex), theirs.to('oklab').coords as number[], 1e-9);
        near(hexToLab(hex), theirs.to('lab-d65').coords as number[], 1e-8);
        const [l, a, b] = hexToOklab(hex);
        // There and back: the published inverse matrices are rounded.
        const lab = new Float64Array(3);
        writeLab(l, a, b, lab, 0);
        near([...lab], hexToLab(hex), 1e-4);
      }),
    );
  });

  it('comes back to the very same hex from OKLCH', () => {
    fc.assert(
      fc.property(hexes, (hex) => {
        // A hue of a near-grey is dropped, which may move a channel by one.
        if (hexToOklch(hex)[1] > 0.01) expect(oklchToHex(hexToOklch(hex))).toBe(hex);
      }),
    );
  });

  it('keeps lightness and hue of a colour outside sRGB and gives up chroma', () => {
    const [l, c, h] = hexToOklch(oklchToHex([0.7, 0.4, 150]));
    // CSS Color 4 clips where the eye sees no difference (deltaE OK 0.02), so neither is kept to the last digit.
    expect(Math.abs(l - 0.7)).toBeLessThan(0.02);
    expect(Math.abs(h - 150)).toBeLessThan(6);
    expect(c).toBeLessThan(0.4);
    expect(oklchToHex([1.4, 0.2, 30])).toBe('#ffffff');
    expect(oklchToHex([-0.2, 0.2, 30])).toBe('#000000');
  });

  it.each([
    ['#1D4F5C', '#1d4f5c'],
    [' #fff ', '#ffffff'],
    // CSS Color 4: named colours.
    ['teal', '#008080'],
    ['rgb(29 79 92)', '#1d4f5c'],
    ['hsl(200 50% 50%)', '#4095bf'],
    ['rgb(0 0 0 / 0.5)', '#000000'],
    ['sea', null],
    ['', null],
    ['#12345', null],
  ])('reads %j as %j', (text, hex) => {
    expect(parseColor(text)).toBe(hex);
  });

  it('gives greys no hue', () => {
    expect(hexToOklch('#808080')[2]).toBe(0);
  });

  it.each(['', '#fff', 'teal', '#12345g', '#1234567'])('refuses %j', (text) => {
    expect(() => hexToLab(text)).toThrow('not a colour of the form #rrggbb');
  });
});
