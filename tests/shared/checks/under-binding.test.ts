import { describe, expect, it } from 'vitest';
import { underBinding } from '#shared/checks/under-binding';
import { inches } from '#shared/model/length';
import { DEFAULT_BINDING } from '#shared/model/page-format';
import { viewFilled } from '../../support/filled-spread';

/** On a 12 × 12 in page the outermost mat stands 9/16 in from the page's edge. */
const run = (left: number, right: number) =>
  underBinding.run(viewFilled([[16, 0, 6, 6]], [[0, 0, 6, 6]], { binding: { ...DEFAULT_BINDING, hiddenEdge: { left, right } } }));

describe('under-binding', () => {
  it('notes mats that reach under the binding, by how much, on either side of the gutter', () => {
    expect(run(inches(3 / 4), inches(5 / 8))).toMatchObject([
      { messageId: 'under-binding', data: { hidden: inches(3 / 16) } },
      { data: { hidden: inches(1 / 16) } },
    ]);
  });

  it('is content with a binding that ends at the mats', () => {
    expect(run(inches(9 / 16), inches(9 / 16))).toEqual([]);
    expect(run(0, 0)).toEqual([]);
  });
});
