import { describe, expect, it } from 'vitest';
import { weighSpread } from '#shared/checks/weight';
import { inches } from '#shared/model/length';
import { DEFAULT_BINDING } from '#shared/model/page-format';
import type { Print } from '#shared/model/print';
import type { Mat } from '#shared/model/spread';
import { buildMat, buildPrint, buildRaster, buildSpread, buildView, matIdOf, printContent } from '../../support/builders';
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

  /** A 6 × 4 in print whose window shows all of its width and its upper left. */
  const weighPicture = (parts: Partial<Print>, place = {}, pageColor = '#777777') => {
    const print = buildPrint(parts);
    const mat = buildMat({ id: matIdOf(1), w: 6, h: 6, content: printContent(print, place) });
    return weighSpread(buildView({ doc: buildSpread({ pages: { left: { color: pageColor }, right: null }, mats: [mat] }), prints: [print] }));
  };
  const weightOfPicture = (...args: Parameters<typeof weighPicture>): number => weighPicture(...args).mats.get(matIdOf(1))!;

  it('weighs a picture point by point, so that black and white do not cancel to grey', () => {
    const halves = buildRaster(12, 8, (x) => (x % 6 < 3 ? [0, 0, 0] : [1, 0, 0]));
    expect(weightOfPicture({ raster: halves })).toBeGreaterThan(weightOfPicture({ raster: buildRaster(12, 8, [0.56, 0, 0]) }));
  });

  it('weighs what the window shows and not what is trimmed off', () => {
    const darkRight = buildRaster(12, 8, (x) => (x < 6 ? [1, 0, 0] : [0, 0, 0]));
    const [onLight, onDark] = [0, inches(3)].map((x) => weightOfPicture({ raster: darkRight }, { x }, '#ffffff'));
    expect(onDark).toBeGreaterThan(2 * onLight!);
  });

  it('grows with detail, and with a face, but only with one that is in the window', () => {
    const busy = buildRaster(60, 40, (x, y) => ((x + y) % 2 === 0 ? [0.5, 0, 0] : [0.62, 0, 0]));
    expect(weightOfPicture({ raster: busy })).toBeGreaterThan(weightOfPicture({ raster: buildRaster(60, 40, [0.56, 0, 0]) }));
    const face = (x: number) => [{ rect: { x, y: 50, width: 100, height: 120 } }];
    expect(weightOfPicture({ faces: face(50) })).toBeGreaterThan(weightOfPicture({ faces: [] }));
    expect(weightOfPicture({ faces: face(450) })).toBe(weightOfPicture({ faces: [] }));
  });

  it('balances where the picture does, turned with it', () => {
    const darkLeft = buildRaster(12, 8, (x) => (x < 3 ? [0, 0, 0] : [1, 0, 0]));
    const upright = weighPicture({ raster: darkLeft }, {}, '#ffffff').masses.get(matIdOf(1))!;
    expect(upright.x).toBeLessThan(inches(2));
    expect(upright.y).toBeCloseTo(inches(2), 3);
    // A quarter-turn clockwise brings the left of the picture to the top.
    const turned = weighPicture({ raster: darkLeft, marks: { ...buildPrint().marks, noUp: true } }, { turn: 1 }, '#ffffff').masses.get(matIdOf(1))!;
    expect(turned.y).toBeLessThan(inches(2));
    expect(turned.x).toBeCloseTo(inches(2), 3);
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

describe('mats laid over others', () => {
  const under = buildMat({ id: matIdOf(1), w: 8, h: 8, color: '#000000' });
  const over = (parts: Partial<Mat>) => buildMat({ id: matIdOf(2), w: 4, h: 8, z: 1, laidOver: true, color: '#eeeeee', ...parts });
  const weigh = (mats: readonly Mat[]) => weighSpread(buildView({ doc: buildSpread({ mats }) }));

  it('leave what is under them only what can be seen of it', () => {
    const alone = weigh([under]);
    const covered = weigh([under, over({})]);
    const card = inches(4 - 1 / 8);
    // The upper mat ends half a gap before the middle of eight steps.
    const strip = inches(2 - 1 / 8);
    expect(covered.mats.get(matIdOf(1))! / alone.mats.get(matIdOf(1))!).toBeCloseTo(1 - strip / card, 3);
    expect(covered.masses.get(matIdOf(1))!.x).toBeGreaterThan(alone.masses.get(matIdOf(1))!.x);
  });

  it('leave nothing of a mat that they hide, and take nothing where they lie beside it', () => {
    expect(weigh([under, over({ w: 8 })]).mats.get(matIdOf(1))).toBe(0);
    expect(weigh([under, over({ x: 8 })]).mats.get(matIdOf(1))).toBe(weigh([under]).mats.get(matIdOf(1)));
  });
});

describe('weighSpread', () => {
  it('shares 100 between the pages and finds the middle between equal mats', () => {
    const weights = weighSpread(viewFilled([[0, 0, 4, 4, BARE]], [[18, 18, 4, 4, BARE]]));
    expect(weights).toMatchObject({ left: 50, right: 50 });
    expect(weights.centre?.x).toBeCloseTo(inches(12), 6);
    expect(weights.centre?.y).toBeCloseTo(inches(6), 6);
  });

  it('finds the middle of each page by itself', () => {
    const { pageCentres } = weighSpread(viewFilled([[0, 0, 4, 4, BARE]], [[18, 18, 4, 4, BARE]]));
    expect(pageCentres.left!.x).toBeCloseTo(inches(1.5), 6);
    expect(pageCentres.right!.x).toBeCloseTo(inches(22.5), 6);
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
