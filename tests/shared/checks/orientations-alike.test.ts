import { describe, expect, it } from 'vitest';
import { orientationsAlike } from '#shared/checks/orientations-alike';
import { inches } from '#shared/model/length';
import { buildMat, buildPrint, buildSpread, buildView, matIdOf, printContent } from '../../support/builders';

/** Flat mats in a column, so many with a flat print and one with an upright one. */
const viewOf = (flatPrints: number, { uprightMat = false, hasUpright = true } = {}) => {
  const flat = buildPrint({ copies: 20 });
  const upright = buildPrint({ paperWidth: inches(4), paperHeight: inches(6), imageWidth: 400, imageHeight: 600 });
  const mats = Array.from({ length: flatPrints }, (_, i) => buildMat({ id: matIdOf(i + 2), y: 4 * i, w: 6, h: 4, content: printContent(flat) }));
  const other = buildMat({ id: matIdOf(1), page: 'right', w: uprightMat ? 4 : 6, h: uprightMat ? 6 : 4, content: printContent(hasUpright ? upright : flat) });
  return buildView({ doc: buildSpread({ mats: [other, ...mats] }), prints: [flat, upright] });
};

describe('orientations-alike', () => {
  it('notes photos that all lie flat though a print stands upright, and names its mat', () => {
    expect(orientationsAlike.run(viewOf(3))).toMatchObject([{ data: { areUpright: false, others: 1 }, matIds: [matIdOf(1)] }]);
  });

  it('is content with one that stands, and with prints that all lie flat', () => {
    expect(orientationsAlike.run(viewOf(3, { uprightMat: true }))).toEqual([]);
    expect(orientationsAlike.run(viewOf(3, { hasUpright: false }))).toEqual([]);
  });

  it('needs four photos to call them all', () => {
    expect(orientationsAlike.run(viewOf(2))).toEqual([]);
    expect(orientationsAlike.run(viewOf(2), { photos: 3 })).toHaveLength(1);
  });
});
