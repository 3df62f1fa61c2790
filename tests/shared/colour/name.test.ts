import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { contrastRatio } from '#shared/colour/contrast';
import { rgbToHex } from '#shared/colour/convert';
import { colorName } from '#shared/colour/name';

describe('colorName', () => {
  it.each([
    ['#ffffff', 'plain white'],
    ['#000000', 'true black'],
    ['#e9e4da', 'warm cream'],
    ['#eef2f5', 'cool white'],
    ['#1f4e5f', 'deep teal'],
    ['#223a5e', 'deep navy'],
    ['#8b9986', 'dusty green'],
    ['#af363c', 'bright red'],
    ['#c29682', 'dusty clay'],
  ])('calls %s %s', (hex, name) => expect(colorName(hex)).toBe(name));

  it('has two plain words for every colour', () => {
    fc.assert(
      fc.property(fc.nat(255), fc.nat(255), fc.nat(255), (r, g, b) => {
        expect(colorName(rgbToHex(r, g, b))).toMatch(/^[a-z]+ [a-z-]+$/);
      }),
    );
  });

  it('tells some sixty colours of a coarse cube apart', () => {
    const levels = [0, 64, 128, 192, 255];
    const names = new Set(levels.flatMap((r) => levels.flatMap((g) => levels.map((b) => colorName(rgbToHex(r, g, b))))));
    expect(names.size).toBeGreaterThan(60);
  });
});

describe('contrastRatio', () => {
  // WCAG 2.2 ratios, recomputed; culori (MIT) gives the same.
  it.each([
    ['#000000', '#ffffff', 21],
    ['#767676', '#ffffff', 4.542225],
    ['#777777', '#ffffff', 4.478089],
    ['#595959', '#ffffff', 7.004729],
    ['#663399', '#ffffff', 8.40515],
    ['#ff0000', '#0000ff', 2.148936],
  ])('of %s on %s is %d', (fg, bg, ratio) => {
    // The published values use luminance factors of four digits.
    expect(Math.abs(contrastRatio(fg, bg) - ratio)).toBeLessThan(2e-3);
    expect(contrastRatio(bg, fg)).toBe(contrastRatio(fg, bg));
  });
});
