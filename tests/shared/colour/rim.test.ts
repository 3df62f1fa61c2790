import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { hexToOklab } from '#shared/colour/convert';
import { decodeRaster, encodeRaster, readPixel } from '#shared/colour/raster';
import { rimContrast, standsOut } from '#shared/colour/rim';
import { inches } from '#shared/model/length';
import type { OklabRaster } from '#shared/model/print';

/** A raster whose pixel at (x, y) has the colour that `hexAt` gives. */
function paint(width: number, height: number, hexAt: (x: number, y: number) => string): OklabRaster {
  const pixels = Array.from({ length: width * height }, (_, i) => hexToOklab(hexAt(i % width, Math.floor(i / width))));
  return encodeRaster(width, height, pixels.flat());
}

/** A 6 × 4 in print of 1200 × 800 px, shown whole. */
const printOf = (raster: OklabRaster) => ({
  raster,
  imageWidth: 1200,
  imageHeight: 800,
  paperRect: { x: 0, y: 0, width: 1200, height: 800 },
  paperWidth: inches(6),
  paperHeight: inches(4),
  turns: 0 as const,
});
const all = { x: 0, y: 0, width: inches(6), height: inches(4) };

describe('raster', () => {
  it('keeps every colour to within a hundred-and-twenty-seventh', () => {
    const raster = paint(2, 1, (x) => (x === 0 ? '#0885a1' : '#ffffff'));
    const { data } = decodeRaster(raster);
    const [l, a, b] = hexToOklab('#0885a1');
    expect(Math.abs((data[0]! + 127) / 254 - l)).toBeLessThan(1 / 254);
    expect(Math.abs(data[1]! / 254 - a)).toBeLessThan(1 / 254);
    expect(Math.abs(data[2]! / 254 - b)).toBeLessThan(1 / 254);
    expect(data[3]).toBe(127);
  });

  it('reads one pixel from the stored text as from the decoded raster', () => {
    const raster = paint(7, 3, (x, y) => `#${(x * 36).toString(16).padStart(2, '0')}${(y * 99).toString(16).padStart(2, '0')}c4`);
    const decoded = decodeRaster(raster);
    const pixel: [number, number, number] = [0, 0, 0];
    for (let i = 0; i < 21; i++) {
      readPixel(raster, i, pixel);
      expect(pixel).toEqual([(decoded.data[3 * i]! + 127) / 254, decoded.data[3 * i + 1]! / 254, decoded.data[3 * i + 2]! / 254]);
    }
  });

  it('refuses a raster of the wrong length', () => {
    expect(() => encodeRaster(2, 2, [0, 0, 0])).toThrow('needs 12 values, not 3');
    expect(() => decodeRaster({ width: 9, height: 9, data: 'AAAA' })).toThrow('does not have 3 bytes');
  });
});

describe('rimContrast', () => {
  it('finds a rim of the mat’s own colour too close all round', () => {
    const contrast = rimContrast(printOf(paint(64, 43, () => '#223a5e')), all, '#223a5e');
    expect(contrast.closeShare).toBe(1);
    expect(contrast.medianDeltaE).toBeLessThan(1);
    expect(contrast.toneDifference).toBeLessThan(1);
    expect(standsOut(contrast)).toBe(false);
  });

  it('looks at the rim, not at what is inside', () => {
    const framed = paint(64, 43, (x, y) => (x < 6 || y < 6 || x > 57 || y > 36 ? '#f2efe6' : '#223a5e'));
    const contrast = rimContrast(printOf(framed), all, '#223a5e');
    expect(contrast.closeShare).toBe(0);
    expect(standsOut(contrast)).toBe(true);
  });

  it('counts the share of the rim that sinks: one short side of four by six is a fifth', () => {
    const dusk = paint(64, 43, (x) => (x < 8 ? '#223a5e' : '#f2efe6'));
    const { closeShare } = rimContrast(printOf(dusk), all, '#223a5e');
    expect(closeShare).toBeGreaterThan(0.2);
    expect(closeShare).toBeLessThan(0.35);
  });

  it('lets a difference of tone part two colours of one hue', () => {
    const contrast = rimContrast(printOf(paint(64, 43, () => '#5f6f86')), all, '#223a5e');
    expect(contrast.toneDifference).toBeGreaterThan(15);
    expect(contrast.closeShare).toBe(0);
  });

  it('reads the window, also of a print that was turned upright', () => {
    // The file's left half is dark; turned clockwise by a quarter, the dark half is on top.
    const raster = paint(64, 43, (x) => (x < 32 ? '#111111' : '#eeeeee'));
    const turned = { ...printOf(raster), paperWidth: inches(4), paperHeight: inches(6), turns: 1 as const };
    const top = { x: 0, y: 0, width: inches(4), height: inches(2) };
    const foot = { ...top, y: inches(4) };
    expect(rimContrast(turned, top, '#111111').closeShare).toBe(1);
    expect(rimContrast(turned, foot, '#111111').closeShare).toBe(0);
  });

  it('takes what lies off the picture for white paper', () => {
    const print = { ...printOf(paint(64, 43, () => '#223a5e')), paperRect: { x: -100, y: -100, width: 1400, height: 1000 } };
    expect(rimContrast(print, all, '#ffffff').closeShare).toBe(1);
    expect(rimContrast(print, all, '#223a5e').closeShare).toBe(0);
  });

  it('gives finite numbers for every window, even an empty one or one off the paper', () => {
    const print = printOf(paint(64, 43, (x, y) => ((x + y) % 2 ? '#123456' : '#fedcba')));
    const length = fc.integer({ min: -60_000, max: 60_000 });
    fc.assert(
      fc.property(length, length, fc.nat(60_000), fc.nat(60_000), (x, y, width, height) => {
        const contrast = rimContrast(print, { x, y, width, height }, '#8b9986');
        expect(Object.values(contrast).every((value) => Number.isFinite(value) && value >= 0)).toBe(true);
        expect(contrast.closeShare).toBeLessThanOrEqual(1);
      }),
    );
  });
});
