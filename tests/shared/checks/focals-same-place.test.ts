import { describe, expect, it } from 'vitest';
import { focalsSamePlace } from '#shared/checks/focals-same-place';
import { matIdOf } from '../../support/builders';
import { viewFilled } from '../../support/filled-spread';

const focal = { focal: true };
const run = (x: number, y = 0, set?: Record<string, number>) =>
  focalsSamePlace.run(viewFilled([[0, 0, 10, 12, focal]], [[x, y, 10, 12, focal]]), set);

describe('focals-same-place', () => {
  it('notes two focals at the same place of facing pages', () => {
    expect(run(0)).toMatchObject([{ messageId: 'focals-same-place', matIds: [matIdOf(1), matIdOf(2)] }]);
  });

  it('draws the line at two steps, in both directions', () => {
    expect(run(2, 2)).toHaveLength(1);
    expect(run(3, 0)).toEqual([]);
    expect(run(0, 3)).toEqual([]);
  });

  it('lets a threshold move that line, within its range', () => {
    expect(run(3, 0, { distance: 3 })).toHaveLength(1);
    // 8 is the most that can be set.
    expect(run(9, 0, { distance: 100 })).toEqual([]);
    expect(run(2, 2, { distance: Number.NaN })).toHaveLength(1);
  });

  it('is content with focals at opposite corners and with one focal', () => {
    expect(run(12, 10)).toEqual([]);
    expect(focalsSamePlace.run(viewFilled([[0, 0, 10, 12, focal]], [[0, 0, 10, 12]]))).toEqual([]);
  });
});
