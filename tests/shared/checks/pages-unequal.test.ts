import { describe, expect, it } from 'vitest';
import { BALANCE_LIMIT, pagesUnequal } from '#shared/checks/pages-unequal';
import { weighSpread } from '#shared/checks/weight';
import { matIdOf } from '../../support/builders';
import { viewFilled, type MatSketch } from '../../support/filled-spread';

const BARE = { content: { kind: 'bare' } } as const;
/** A bare mat of one tone whose weight is in proportion to its true area. */
const mat = (width: number, height: number): MatSketch => [0, 0, 22, 22, { ...BARE, trueSize: { width, height } }];

describe('pages-unequal', () => {
  it('draws the line at 59 against 41', () => {
    const view = (left: number) => viewFilled([mat(left * 100, 10_000)], [mat((100 - left) * 100, 10_000)]);
    expect(weighSpread(view(59))).toMatchObject({ left: 59, right: 41 });
    expect(BALANCE_LIMIT).toBe(18);
    expect(pagesUnequal.run(view(59))).toEqual([]);
    expect(pagesUnequal.run(view(60))).toMatchObject([{ messageId: 'pages-unequal', data: { left: 60, right: 40, heavy: 'left' }, matIds: [matIdOf(1)], page: 'left' }]);
    expect(pagesUnequal.run(view(40))).toMatchObject([{ data: { heavy: 'right' }, matIds: [matIdOf(2)] }]);
  });

  it('lets a threshold move the line', () => {
    const view = viewFilled([mat(5500, 10_000)], [mat(4500, 10_000)]);
    expect(pagesUnequal.run(view, { difference: 10 })).toEqual([]);
    expect(pagesUnequal.run(view, { difference: 9 })).toHaveLength(1);
  });

  it('has nothing to balance on a single page', () => {
    expect(pagesUnequal.run(viewFilled([mat(5000, 5000)], [], { pages: { left: { color: '#ffffff' }, right: null } }))).toEqual([]);
  });
});
