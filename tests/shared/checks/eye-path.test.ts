import { describe, expect, it } from 'vitest';
import { eyePath } from '#shared/checks/eye-path';
import { buildView, matIdOf } from '../../support/builders';
import { buildFilled, splitOver, viewFilled } from '../../support/filled-spread';

const path = (view: Parameters<typeof eyePath>[0]): string[] => eyePath(view).flatMap(({ matIds }) => matIds);

describe('the eye’s likely path', () => {
  it('starts at the heaviest mat, or at the declared focal however light it is', () => {
    const mats = [[0, 0, 6, 6], [6, 0, 14, 14], [0, 14, 7, 7]] as const;
    expect(path(viewFilled(mats, []))[0]).toBe(matIdOf(2));
    const declared = [[0, 0, 6, 6, { focal: true }], ...mats.slice(1)] as const;
    expect(path(viewFilled(declared, []))[0]).toBe(matIdOf(1));
  });

  it('goes to the nearer of two equals, and comes to every mat once', () => {
    const far = path(viewFilled([[0, 0, 10, 10], [0, 16, 4, 4]], [[18, 0, 4, 4]]));
    expect(far).toEqual([1, 2, 3].map(matIdOf));
  });

  it('takes a heavy mat before a nearer light one', () => {
    expect(path(viewFilled([[0, 0, 10, 10], [0, 11, 4, 4], [13, 13, 9, 9]], []))[1]).toBe(matIdOf(3));
  });

  it('passes over what weighs next to nothing, and stops after seven', () => {
    expect(path(viewFilled([[0, 0, 20, 20], [20, 20, 2, 2]], []))).toEqual([matIdOf(1)]);
    const nine = Array.from({ length: 9 }, (_, i) => [(i % 3) * 6, Math.floor(i / 3) * 6, 5, 5] as const);
    expect(eyePath(viewFilled(nine, []))).toHaveLength(7);
  });

  it('takes a split print for one stop, and an empty spread for none', () => {
    const split = splitOver(buildFilled([[0, 0, 6, 8], [6, 0, 6, 8], [0, 10, 4, 4]], []), [1, 2], 1, 'group');
    expect(eyePath(buildView(split)).map(({ matIds }) => matIds)).toEqual([[matIdOf(1), matIdOf(2)], [matIdOf(3)]]);
    expect(eyePath(viewFilled([], []))).toEqual([]);
  });
});
