import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { hexToOklab } from '#shared/colour/convert';
import { suggestPlaced } from '#shared/colour/suggest-placed';
import { visibleShares } from '#shared/colour/shares';
import { runCommand } from '#shared/commands/run-command';
import { applyPatch } from '#shared/model/patch';
import type { Print } from '#shared/model/print';
import type { SpreadDocument } from '#shared/model/spread';
import { TRIM_SETTINGS_INCH } from '#shared/model/trim-settings';
import { buildPrint, buildRaster, buildSpread, printIdOf, printsById } from '../../support/builders';
import { randomOf, randomSpread } from '../../support/random-spread';

const trim = TRIM_SETTINGS_INCH;
const bandsOf = (...hexes: string[]): Print['raster'] => buildRaster(48, 32, (x) => hexToOklab(hexes[Math.floor((x * hexes.length) / 48)]!));
const placed = (doc: SpreadDocument, prints: readonly Print[]) => suggestPlaced({ doc, prints: printsById(prints), trim });

/** A random spread whose prints all show one picture. */
function spreadShowing(raster: Print['raster'], mats: number): { doc: SpreadDocument; prints: Print[] } {
  const { doc, prints } = randomSpread(randomOf(mats), { mats, prints: 24, rasterSize: 8 });
  return { doc, prints: prints.map((print) => ({ ...print, raster })) };
}

describe('suggestPlaced', () => {
  it('says the shares that the spread has once the scheme is applied', () => {
    const { doc, prints } = randomSpread(randomOf(3), { mats: 12, prints: 10 });
    for (const { scheme, args, shares } of placed(doc, prints)) {
      const applied = applyPatch(doc, runCommand(doc, { id: 'scheme.apply', args }, { prints: printsById(prints), trim, newId: () => '' }));
      expect(shares).toEqual(visibleShares(applied, scheme, printsById(prints)));
    }
  });

  it.each([
    ['black and white photos', bandsOf('#101010', '#808080', '#f0f0f0'), 20],
    ['photos all alike', bandsOf('#446688'), 20],
    ['white photos', bandsOf('#ffffff'), 20],
    ['black photos', bandsOf('#000000'), 20],
    ['one mat', bandsOf('#446688', '#8fa3b5'), 1],
    ['160 mats', bandsOf('#1f4e5f', '#e04f26', '#e8e2d4'), 160],
  ])('places three schemes on every mat of %s', (_, raster, mats) => {
    const { doc, prints } = spreadShowing(raster, mats);
    const schemes = placed(doc, prints);
    expect(schemes.map(({ scheme }) => scheme.character)).toEqual(['echo', 'quiet', 'lift']);
    for (const { scheme, args, shares } of schemes) {
      expect(Object.keys(args.matColors)).toHaveLength(doc.mats.length);
      const known = Object.values(scheme.colors).map(({ hex }) => hex);
      for (const hex of Object.values(args.matColors)) expect(known).toContain(hex);
      const total = Object.values(shares).reduce((sum, share) => sum + share, 0);
      expect(total).toBeGreaterThan(0);
      expect(total).toBeLessThanOrEqual(1 + 1e-9);
    }
  }, 20_000);

  it('lands the accent on at least three mats of both pages of any spread of ten mats or more that lets it', () => {
    for (let seed = 1; seed <= 12; seed++) {
      // Pale photos: every card colour keeps its distance.
      const raster = buildRaster(48, 32, (x, y) => (x < 5 || x > 42 || y < 5 || y > 26 ? hexToOklab('#f7f5ef') : hexToOklab(x < 24 ? '#1f4e5f' : '#c2571f')));
      const { doc, prints } = spreadShowing(raster, 9 + seed);
      const { scheme, args } = placed(doc, prints)[0]!;
      const accented = doc.mats.filter((mat) => args.matColors[mat.id] === scheme.colors.accent.hex);
      expect(accented.length).toBeGreaterThanOrEqual(3);
      expect(new Set(accented.map(({ page }) => page)).size).toBe(2);
    }
  });

  it('never throws and never gives a share or a colour that is not one, whatever the spread', () => {
    fc.assert(
      fc.property(fc.nat(1_000_000), fc.integer({ min: 0, max: 26 }), fc.integer({ min: 1, max: 12 }), (seed, mats, count) => {
        const { doc, prints } = randomSpread(randomOf(seed), { mats, prints: count, rasterSize: 12 });
        const once = placed(doc, prints);
        for (const { scheme, args, shares } of once) {
          for (const hex of [args.pageColor, ...Object.values(args.matColors), ...Object.values(scheme.colors).map((color) => color.hex)]) expect(hex).toMatch(/^#[0-9a-f]{6}$/);
          for (const share of Object.values(shares)) expect(share >= 0 && share <= 1 + 1e-9).toBe(true);
        }
        expect(placed(doc, prints)).toEqual(once);
      }),
      { numRuns: 30 },
    );
  }, 30_000);

  it('has nothing to offer without prints', () => {
    expect(placed(buildSpread(), [buildPrint({ id: printIdOf(1) })])).toEqual([]);
  });
});
