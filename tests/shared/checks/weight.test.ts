import { describe, expect, it } from 'vitest';
import { weighSpread } from '#shared/checks/weight';
import { inches } from '#shared/model/length';
import { DEFAULT_BINDING } from '#shared/model/page-format';
import type { Swatch } from '#shared/model/print';
import type { Mat } from '#shared/model/spread';
import { buildMat, buildPrint, buildSpread, buildView, matIdOf, printContent } from '../../support/builders';
import { TITLE, viewFilled } from '../../support/filled-spread';

const BARE = { content: { kind: 'bare' } } as const;
const weightOf = (parts: Partial<Mat>, pageColor = '#ffffff'): number => {
  const doc = buildSpread({ pages: { left: { color: pageColor }, right: { color: '#ffffff' } }, mats: [buildMat({ id: matIdOf(1), ...parts })] });
  return weighSpread(buildView({ doc })).mats.get(matIdOf(1))!;
};

describe('weight of a mat', () => {
  it('is the formula of its docstring: black card of a quarter of the page on white weighs 1/4 × 1.25', () => {
    const black = { color: '#000000', w: 22, h: 22, trueSize: { width: inches(6), height: inches(6) } };
    // OKLab lightness: black 0, white 1.
    expect(weightOf(black)).toBeCloseTo(0.25 * 1.25, 6);
    expect(weightOf(black, '#000000')).toBeCloseTo(0.25 * 0.25, 6);
  });

  it('grows with area, with the tone’s distance from the page, and with vividness', () => {
    expect(weightOf({ w: 8 })).toBeGreaterThan(weightOf({ w: 4 }));
    expect(weightOf({ color: '#333333' })).toBeGreaterThan(weightOf({ color: '#cccccc' }));
    expect(weightOf({ color: '#333333' }, '#000000')).toBeLessThan(weightOf({ color: '#cccccc' }, '#000000'));
    // A vivid red of about the grey's lightness.
    expect(weightOf({ color: '#e0002d' })).toBeGreaterThan(weightOf({ color: '#808080' }));
  });

  it('weighs a picture by its palette, so that black and white do not cancel to grey', () => {
    const swatch = (l: number, share: number): Swatch => ({ hex: '#808080', oklch: [l, 0, 0], share, role: 'area' });
    const weigh = (palette: readonly Swatch[]): number => {
      const print = buildPrint({ palette });
      const doc = buildSpread({ pages: { left: { color: '#777777' }, right: null }, mats: [buildMat({ id: matIdOf(1), content: printContent(print) })] });
      return weighSpread(buildView({ doc, prints: [print] })).mats.get(matIdOf(1))!;
    };
    expect(weigh([swatch(0, 0.5), swatch(1, 0.5)])).toBeGreaterThan(weigh([swatch(0.56, 1)]));
    expect(weigh([])).toBeGreaterThan(0);
  });

  it('gives ink and inner mats their part', () => {
    expect(weightOf({ color: '#ffffff', content: TITLE })).toBeGreaterThan(weightOf({ color: '#ffffff' }));
    expect(weightOf({ color: '#ffffff', inner: { color: '#000000', reveal: 254 } })).toBeGreaterThan(weightOf({ color: '#ffffff' }));
  });

  it('is weighed anew when only the page’s colour changes', () => {
    const mat = buildMat({ id: matIdOf(1) });
    const weigh = (color: string): number =>
      weighSpread(buildView({ doc: buildSpread({ pages: { left: { color }, right: null }, mats: [mat] }) })).mats.get(matIdOf(1))!;
    const [onWhite, onItself] = [weigh('#ffffff'), weigh(mat.color)];
    expect(onItself).toBeLessThan(onWhite);
    expect(weigh('#ffffff')).toBe(onWhite);
  });
});

describe('weighSpread', () => {
  it('shares 100 between the pages and finds the middle between equal mats', () => {
    const weights = weighSpread(viewFilled([[0, 0, 4, 4, BARE]], [[18, 18, 4, 4, BARE]]));
    expect(weights).toMatchObject({ left: 50, right: 50 });
    expect(weights.centre?.x).toBeCloseTo(inches(12), 6);
    expect(weights.centre?.y).toBeCloseTo(inches(6), 6);
  });

  it('places the centre in the scene, the gap between the pages included', () => {
    const binding = { ...DEFAULT_BINDING, gap: inches(1) };
    const { centre } = weighSpread(viewFilled([], [[0, 0, 22, 22, BARE]], { binding }));
    expect(centre?.x).toBeCloseTo(inches(19), 6);
  });

  it('has no shares and no centre without mats', () => {
    expect(weighSpread(viewFilled([], []))).toMatchObject({ left: 0, right: 0, centre: null });
  });
});
