import { describe, expect, it } from 'vitest';
import { horizonLines } from '#shared/checks/horizon-lines';
import { inches } from '#shared/model/length';
import { photoRect } from '#shared/scene/photo-point';
import type { Placement } from '#shared/model/spread';
import { buildMat, buildPrint, buildSpread, buildView, matIdOf, printContent } from '../../support/builders';

/** A 6 × 4 in print at 100 px to the inch on a mat of 8 × 6 steps: its photo starts at 11/16 in and is 3 5/8 × 2 5/8 in. */
function linesOf(horizon: { x1: number; y1: number; x2: number; y2: number } | null, place: Partial<Placement> = {}, page: 'left' | 'right' = 'left') {
  const print = buildPrint({ horizon, marks: { noUp: true } });
  const mat = buildMat({ id: matIdOf(1), page, w: 8, h: 6, content: printContent(print, place) });
  return horizonLines(buildView({ doc: buildSpread({ mats: [mat] }), prints: [print] }));
}

const START = 11 / 16;
const level = { x1: 200, y1: 150, x2: 300, y2: 150 };

describe('horizons on the spread', () => {
  it('run through the whole photo at their height', () => {
    const [line] = linesOf(level, { y: inches(1) });
    expect([line!.from.x, line!.to.x].map((x) => x / inches(1))).toEqual([expect.closeTo(START, 3), expect.closeTo(START + 3.625, 3)]);
    for (const { y } of [line!.from, line!.to]) expect(y / inches(1)).toBeCloseTo(START + 0.5, 3);
  });

  it('stand upright on a turned print, and lie in the scene of the right page', () => {
    const [turned] = linesOf(level, { turn: 1 });
    expect(turned!.from.x).toBeCloseTo(turned!.to.x, 3);
    expect(linesOf(level, { y: inches(1) }, 'right')[0]!.from.x / inches(1)).toBeCloseTo(12 + START, 3);
  });

  it('are cut off where a slant leaves the photo, and left out where the window does not show them', () => {
    const [slant] = linesOf({ x1: 0, y1: 0, x2: 100, y2: 100 });
    expect(slant!.to.y / inches(1)).toBeCloseTo(START + 2.625, 3);
    expect(linesOf(level, { y: inches(2) })).toEqual([]);
    expect(linesOf(null)).toEqual([]);
    expect(linesOf({ x1: 5, y1: 5, x2: 5, y2: 5 })).toEqual([]);
  });
});

describe('a keep zone on the scene', () => {
  const photo = { kind: 'photo', key: 'a', matId: 'a', printId: 'p', rect: { x: 10, y: 20, width: 40, height: 60 }, imageWidth: 200, imageHeight: 200 } as const;

  it('turns with its photo', () => {
    const zone = { x: 10, y: 0, width: 10, height: 30 };
    expect(photoRect({ ...photo, source: { x: 0, y: 0, width: 40, height: 60 }, turns: 0 }, zone)).toEqual({ x: 20, y: 20, width: 10, height: 30 });
    // Turned clockwise the original's top lies at the right.
    const turned = photoRect({ ...photo, source: { x: 0, y: 0, width: 60, height: 40 }, turns: 1 }, zone);
    expect(turned).toEqual({ x: expect.closeTo(20, 9), y: expect.closeTo(30, 9), width: expect.closeTo(30, 9), height: expect.closeTo(10, 9) });
  });
});
