import { describe, expect, it } from 'vitest';
import { centreOfMass, deviationOfCentre } from '#shared/checks/balance/centre-of-mass';
import type { Rect } from '#shared/model/rect';

const rect = (x: number, y: number, width: number, height: number): Rect => ({ x, y, width, height });
const frame = (width: number, height: number) => ({ width, height });
const centreOf = (rects: readonly Rect[]) =>
  centreOfMass(rects.map((r) => ({ x: r.x + r.width / 2, y: r.y + r.height / 2, mass: r.width * r.height })));

/**
 * Deviation of the centre of mass, Hübner and Fillinger (2016), Frontiers in Psychology 7:335, in the continuous form.
 * Cases in closed form: a block's centre is its middle.
 */
describe('deviation of the centre of mass', () => {
  it.each([
    ['a square in the middle', frame(16, 16), [rect(4, 4, 8, 8)], 0],
    ['a band in the left half', frame(16, 16), [rect(2, 2, 4, 12)], 50],
    ['two on the diagonal', frame(16, 16), [rect(1, 1, 4, 4), rect(11, 11, 4, 4)], 0],
    // Areas 48, 20, 50 with centres (6, 5), (14.5, 5), (9, 14.5): the mean is (1028/118, 1065/118).
    ['three blocks', frame(20, 20), [rect(2, 2, 8, 6), rect(12, 3, 5, 4), rect(4, 12, 10, 5)], (100 * Math.hypot(1028 / 118 / 20 - 0.5, 1065 / 118 / 20 - 0.5)) / 0.5],
  ])('%s', (_, size, rects, percent) => {
    expect(deviationOfCentre(centreOf(rects)!, size)).toBeCloseTo(percent, 9);
  });

  it('has no centre where nothing weighs', () => {
    expect(centreOfMass([])).toBeNull();
    expect(centreOfMass([{ x: 1, y: 1, mass: 0 }])).toBeNull();
  });
});
