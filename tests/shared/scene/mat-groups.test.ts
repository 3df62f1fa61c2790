import { describe, expect, it } from 'vitest';
import { drawAlike, itemsByMat } from '#shared/scene/mat-groups';
import type { RectItem, TextItem } from '#shared/scene/scene';

const rect = (matId: string, x = 0): RectItem => ({ kind: 'rect', key: `${matId}/card`, matId, rect: { x, y: 0, width: 1, height: 1 }, fill: '#000000' });
const text: TextItem = { kind: 'text', key: 'a/text', matId: 'a', font: 'atkinson', size: 10, fill: '#000000', text: 'ab', xs: [0, 5], baseline: 9 };

describe('itemsByMat', () => {
  it('keeps the order of mats and of their items', () => {
    const items = [rect('b'), rect('b', 1), rect('a')];
    expect(itemsByMat(items)).toEqual([
      { matId: 'b', items: [items[0], items[1]] },
      { matId: 'a', items: [items[2]] },
    ]);
  });
});

describe('drawAlike', () => {
  it('holds for copies, and for an opacity that is left out', () => {
    expect(drawAlike([rect('a'), text], [{ ...rect('a'), opacity: undefined }, { ...text, xs: [0, 5] }])).toBe(true);
  });

  it.each([
    ['a place', [rect('a', 2), text]],
    ['a glyph', [rect('a'), { ...text, xs: [0, 6] }]],
    ['an item more', [rect('a'), text, text]],
    ['an opacity', [{ ...rect('a'), opacity: 0.5 }, text]],
  ])('notices %s', (_, other) => {
    expect(drawAlike([rect('a'), text], other)).toBe(false);
  });
});
