import { describe, expect, it } from 'vitest';
import { noJournaling } from '#shared/checks/no-journaling';
import { TITLE, viewFilled, WORDS } from '../../support/filled-spread';

describe('no-journaling', () => {
  it('notes a spread on which nothing is written but a title', () => {
    expect(noJournaling.run(viewFilled([[0, 0, 11, 11, { content: TITLE }]], []))).toMatchObject([{ messageId: 'no-journaling' }]);
  });

  it('is content with words on either page', () => {
    expect(noJournaling.run(viewFilled([], [[0, 0, 11, 11, { content: WORDS }]]))).toEqual([]);
  });
});
