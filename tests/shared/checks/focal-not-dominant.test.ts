import { describe, expect, it } from 'vitest';
import { focalNotDominant } from '#shared/checks/focal-not-dominant';
import { buildView, matIdOf } from '../../support/builders';
import { buildFilled, splitOver, viewFilled } from '../../support/filled-spread';

const focal = { focal: true };

describe('focal-not-dominant', () => {
  it('notes a focal that is smaller than another picture of its page', () => {
    expect(focalNotDominant.run(viewFilled([[0, 0, 8, 8, focal], [8, 0, 10, 10]], []))).toMatchObject([
      { messageId: 'focal-not-dominant', matIds: [matIdOf(1), matIdOf(2)] },
    ]);
  });

  it('is content with one of equal size, and does not look at the other page', () => {
    expect(focalNotDominant.run(viewFilled([[0, 0, 8, 8, focal], [8, 0, 8, 8]], [[0, 0, 20, 20]]))).toEqual([]);
  });

  it('weighs a split print as a whole and not against its own panes', () => {
    const split = splitOver(buildFilled([[0, 0, 6, 8, focal], [6, 0, 6, 8], [0, 8, 10, 8]], []), [1, 2], 1, 'group');
    expect(focalNotDominant.run(buildView(split))).toEqual([]);
  });
});
