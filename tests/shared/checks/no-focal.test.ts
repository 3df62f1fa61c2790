import { describe, expect, it } from 'vitest';
import { noFocal } from '#shared/checks/no-focal';
import { runChecks } from '#shared/checks/run-checks';
import { buildView, matIdOf } from '../../support/builders';
import { buildFilled, splitOver, viewFilled, type MatSketch } from '../../support/filled-spread';

const ALIKE: readonly MatSketch[] = [
  [0, 0, 11, 11],
  [11, 0, 11, 11],
  [0, 11, 11, 11],
];

describe('no-focal', () => {
  it('notes a spread on which every picture is alike, and offers to make the first the focal', () => {
    const view = viewFilled(ALIKE, ALIKE);
    expect(noFocal.run(view)).toMatchObject([{ messageId: 'no-focal', matIds: [matIdOf(1)] }]);
    expect(runChecks(view).find((note) => note.checkId === 'no-focal')?.remedy).toMatchObject({
      messageId: 'make-focal',
      call: { id: 'mats.setFocal', args: { matId: matIdOf(1), focal: true } },
    });
  });

  it('is content with a declared focal, on either page', () => {
    expect(noFocal.run(viewFilled(ALIKE, [[0, 0, 11, 11, { focal: true }]]))).toEqual([]);
  });

  it('is content with a picture one and a half times as large as the next, and not with less', () => {
    // True areas, one gap inset: 22 × 17 steps against 11 × 22 is 1.55, 22 × 16 is 1.46.
    expect(noFocal.run(viewFilled([[0, 0, 22, 17]], [[0, 0, 11, 22]]))).toEqual([]);
    expect(noFocal.run(viewFilled([[0, 0, 22, 16]], [[0, 0, 11, 22]]))).toHaveLength(1);
  });

  it('takes a split print for one picture', () => {
    const split = splitOver(buildFilled(ALIKE, [[0, 0, 11, 11]]), [1, 2, 3], 1, 'group');
    expect(noFocal.run(buildView(split))).toEqual([]);
  });

  it('has nothing to say without pictures', () => {
    expect(noFocal.run(viewFilled([], []))).toEqual([]);
  });
});
