import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { ciede2000 } from '#shared/colour/ciede2000';
import { hexToLab, rgbToHex } from '#shared/colour/convert';
import { fitsSheet, indexStash, nearestSheet } from '#shared/colour/snap';
import { schemeOfSheets, snapScheme } from '#shared/colour/snap-scheme';
import { inches } from '#shared/model/length';
import type { Scheme } from '#shared/model/spread';
import { buildMat, buildSpread } from '../../support/builders';
import { buildSheet, buildSide } from '../../support/stash';

const hexArbitrary = fc.tuple(fc.integer({ min: 0, max: 255 }), fc.integer({ min: 0, max: 255 }), fc.integer({ min: 0, max: 255 })).map((rgb) => rgbToHex(...rgb));

describe('the sheet nearest to a colour', () => {
  it('is the one that a comparison with every sheet finds, or none within 6', () => {
    fc.assert(
      fc.property(hexArbitrary, fc.array(hexArbitrary, { maxLength: 40 }), (wanted, hexes) => {
        const sheets = hexes.map((hex) => buildSheet({ hex }));
        const least = Math.min(...hexes.map((hex) => ciede2000(hexToLab(hex), hexToLab(wanted))));
        const found = nearestSheet(indexStash(sheets), wanted);
        expect(found?.deltaE ?? null).toEqual(least < 6 ? least : null);
      }),
    );
  });

  it('says no more than how the sheet was read allows', () => {
    const word = (uncertainty: number) => nearestSheet(indexStash([buildSheet({ sides: [buildSide({ uncertainty })] })]), '#1d4f5c')?.word;
    expect([word(0.5), word(2), word(5)]).toEqual(['indistinguishable', 'close', 'near']);
  });

  it('leaves patterned sides out, and takes the plain back of a patterned sheet', () => {
    const striped = buildSheet({ sides: [buildSide({ pattern: 'stripe' }), buildSide({ hex: '#dc9f33' })] });
    const index = indexStash([striped]);
    expect(nearestSheet(index, '#1d4f5c')).toBeNull();
    expect(nearestSheet(index, '#dc9f33')?.sheet).toBe(striped);
  });

  it('is none in an empty stash and in a stash of greys', () => {
    expect(nearestSheet(indexStash([]), '#cf6a3c')).toBeNull();
    const greys = Array.from({ length: 256 }, (_, v) => buildSheet({ hex: rgbToHex(v, v, v) }));
    expect(nearestSheet(indexStash(greys), '#cf6a3c')).toBeNull();
  });
});

it('a piece fits a sheet in either direction', () => {
  const letter = { width: inches(8, 0.5), height: inches(11) };
  expect(fitsSheet({ width: inches(11), height: inches(8) }, letter)).toBe(true);
  expect(fitsSheet({ width: inches(9), height: inches(9) }, letter)).toBe(false);
});

const scheme: Scheme = {
  character: 'lift',
  colors: {
    base: { hex: '#efe6d2', printIds: [] },
    main: { hex: '#1d4f5c', printIds: [] },
    second: { hex: '#b9cfc4', printIds: [] },
    accent: { hex: '#cf6a3c', printIds: [] },
  },
};
/** Two pages, 2 × 2 in mats (four steps) of the main colour, one of the accent. */
const docWith = (mains: number) =>
  buildSpread({
    pages: { left: { color: '#efe6d2' }, right: { color: '#efe6d2' } },
    mats: [
      ...Array.from({ length: mains }, (_, i) => buildMat({ x: 4 * (i % 5), y: 4 * Math.floor(i / 5), color: '#1d4f5c' })),
      buildMat({ page: 'right', color: '#cf6a3c', inner: { color: '#efe6d2', reveal: 254 } }),
    ],
  });
const byRole = (...args: Parameters<typeof snapScheme>) => Object.fromEntries(snapScheme(...args).map((snapped) => [snapped.role, snapped]));

describe('a scheme held against the stash', () => {
  it('counts whole sheets by the area of the pieces, hidden card included', () => {
    const stash = indexStash([buildSheet({ hex: '#efe6d2' }), buildSheet({ hex: '#1d4f5c' })]);
    const { base, main, second } = byRole(docWith(20), scheme, stash);
    // Two pages and one inner mat: just over two sheets.
    expect(base).toMatchObject({ needed: 3, buy: 0, match: { word: 'close' } });
    // Twenty mats of 1 7/8 in squares: 70 of 144 square inches.
    expect(main).toMatchObject({ needed: 1, buy: 0 });
    expect(second).toMatchObject({ needed: 0, buy: 0 });
  });

  it('buys what is not free, and what nothing is near to', () => {
    const stash = indexStash([buildSheet({ hex: '#efe6d2', quantity: 4, reserved: 3 })]);
    const { base, accent } = byRole(docWith(1), scheme, stash);
    expect(base).toMatchObject({ needed: 3, buy: 2 });
    expect(accent).toMatchObject({ match: null, needed: 1, buy: 1 });
  });

  it('prefers a near sheet that is free to a nearer one that is used up', () => {
    const gone = buildSheet({ hex: '#1d4f5c', quantity: 1, reserved: 1 });
    const free = buildSheet({ hex: '#20525f' });
    expect(byRole(docWith(1), scheme, indexStash([gone, free])).main?.match?.sheet).toBe(free);
    expect(byRole(docWith(1), scheme, indexStash([gone])).main).toMatchObject({ match: { sheet: gone }, buy: 1 });
  });

  it('does not count the same last sheet for two colours', () => {
    const only = buildSheet({ hex: '#1d4f5c', quantity: 1 });
    const twins: Scheme = { ...scheme, colors: { ...scheme.colors, accent: { hex: '#1e505d', printIds: [] } } };
    const doc = buildSpread({ mats: [buildMat({ color: '#1d4f5c' }), buildMat({ x: 8, color: '#1e505d' })] });
    const { main, accent } = byRole(doc, twins, indexStash([only]));
    expect([main?.buy, accent?.buy]).toEqual([0, 1]);
  });

  it('leaves out sheets from which the largest piece cannot be cut', () => {
    const small = buildSheet({ hex: '#efe6d2', width: inches(8), height: inches(8) });
    expect(byRole(docWith(1), scheme, indexStash([small])).base).toMatchObject({ match: null, buy: 3 });
  });

  it('takes the colours of the sheets, and keeps what must be bought', () => {
    const snapped = snapScheme(docWith(1), scheme, indexStash([buildSheet({ hex: '#20525f' })]));
    const { colors } = schemeOfSheets(scheme, snapped);
    expect([colors.main.hex, colors.accent.hex]).toEqual(['#20525f', '#cf6a3c']);
  });
});
