import { describe, expect, it } from 'vitest';
import { noTitle } from '#shared/checks/no-title';
import { TITLE, viewFilled, WORDS } from '../../support/filled-spread';

describe('no-title', () => {
  it('notes a spread without lettering, and one whose lettering is blank', () => {
    expect(noTitle.run(viewFilled([[0, 0, 11, 11, { content: WORDS }]], []))).toMatchObject([{ messageId: 'no-title' }]);
    expect(noTitle.run(viewFilled([[0, 0, 11, 11, { content: { kind: 'lettering', text: '  ', color: '#000000', letterHeight: 4064 } }]], []))).toHaveLength(1);
  });

  it('is content with a title on either page', () => {
    expect(noTitle.run(viewFilled([], [[0, 0, 11, 11, { content: TITLE }]]))).toEqual([]);
  });
});
