import { describe, expect, it } from 'vitest';
import { matLikePage } from '#shared/checks/mat-like-page';
import { matIdOf } from '../../support/builders';
import { TITLE, viewFilled } from '../../support/filled-spread';

const run = (color: string, parts = {}) => matLikePage.run(viewFilled([[0, 0, 11, 11, { color, ...parts }]], [[0, 0, 11, 11, { color: '#1f4e5f' }]]));

describe('mat-like-page', () => {
  it('notes card in the page’s own colour, or one that only looks the same', () => {
    expect(run('#ffffff')).toMatchObject([{ messageId: 'mat-like-page', matIds: [matIdOf(1)] }]);
    expect(run('#fbfbfb')).toHaveLength(1);
  });

  it('is content with card that is seen', () => {
    expect(run('#e0e0e0')).toEqual([]);
  });

  it('lets words seem to be written on the page, and a photo cover its card', () => {
    expect(run('#ffffff', { content: TITLE })).toEqual([]);
    expect(run('#ffffff', { reveal: 0 })).toEqual([]);
  });
});
