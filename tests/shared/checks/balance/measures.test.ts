import { describe, expect, it } from 'vitest';
import { centreOfMass, deviationOfCentre } from '#shared/checks/balance/centre-of-mass';
import { ngoBalance } from '#shared/checks/balance/ngo-balance';
import type { Rect } from '#shared/model/rect';

const rect = (x: number, y: number, width: number, height: number): Rect => ({ x, y, width, height });
const frame = (width: number, height: number) => ({ width, height });
const centreOf = (rects: readonly Rect[]) =>
  centreOfMass(rects.map((r) => ({ x: r.x + r.width / 2, y: r.y + r.height / 2, mass: r.width * r.height })));

/**
 * Values in closed form from the formula of Ngo, Teo and Byrne (2003), Information Sciences 152:25–46: an object
 * across an axis is split there. Each can be checked by hand: area × distance of every part from the axis.
 */
describe('balance after Ngo, Teo and Byrne', () => {
  it.each([
    ['four equal quarters', frame(12, 12), [rect(1, 1, 4, 4), rect(7, 1, 4, 4), rect(1, 7, 4, 4), rect(7, 7, 4, 4)], 1],
    ['one in the middle, split by both axes', frame(12, 12), [rect(4, 4, 4, 4)], 1],
    ['one in the lower right corner', frame(12, 12), [rect(8, 8, 4, 4)], 0],
    // Left 16 × 4, right 8 × 4: vertical 1 − 32/64; top and bottom: each part's area × distance is alike.
    ['twice as much on the left', frame(12, 12), [rect(0, 4, 4, 4), rect(8, 5, 4, 2)], 0.75],
    ['nothing at all', frame(12, 12), [], 1],
  ])('%s', (_, size, rects, balance) => {
    expect(ngoBalance(size, rects).balance).toBeCloseTo(balance, 12);
  });

  it('says which side is heavier', () => {
    expect(ngoBalance(frame(10, 10), [rect(0, 0, 2, 2)])).toEqual({ vertical: 1, horizontal: 1, balance: 0 });
    expect(ngoBalance(frame(10, 10), [rect(8, 8, 2, 2)])).toEqual({ vertical: -1, horizontal: -1, balance: 0 });
  });
});

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
