import { describe, expect, it } from 'vitest';
import { nothingShared } from '#shared/checks/nothing-shared';
import type { Content } from '#shared/model/spread';
import { buildView } from '../../support/builders';
import { buildFilled, splitOver, viewFilled, type MatSketch } from '../../support/filled-spread';

const TEAL = { color: '#1f4e5f' };
const GOLD = { color: '#d9a441' };
const LEFT: readonly MatSketch[] = [[0, 0, 11, 14, TEAL], [11, 0, 11, 13, TEAL]];
const RIGHT: readonly MatSketch[] = [[0, 0, 10, 15, GOLD], [10, 0, 12, 15, GOLD]];

describe('nothing-shared', () => {
  it('notes pages without one thing in common', () => {
    expect(nothingShared.run(viewFilled(LEFT, RIGHT))).toMatchObject([{ messageId: 'nothing-shared', matIds: [] }]);
  });

  it('is content with one colour of card on both pages, even one that only looks the same', () => {
    const withColor = (color: string): readonly MatSketch[] => [...RIGHT, [0, 15, 5, 7, { color }]];
    expect(nothingShared.run(viewFilled(LEFT, withColor('#1f4e5f')))).toEqual([]);
    // CIEDE2000 about 1 from the teal; the next is about 6.
    expect(nothingShared.run(viewFilled(LEFT, withColor('#214f60')))).toEqual([]);
    expect(nothingShared.run(viewFilled(LEFT, withColor('#2f6075')))).toHaveLength(1);
  });

  it('does not count the page’s own colour, which shows no card', () => {
    const white = { color: '#ffffff' };
    expect(nothingShared.run(viewFilled([...LEFT, [0, 14, 5, 7, white]], [...RIGHT, [0, 15, 6, 7, white]]))).toHaveLength(1);
  });

  it('is content with a size of mat on both pages, turned or not', () => {
    expect(nothingShared.run(viewFilled(LEFT, [...RIGHT, [0, 15, 13, 7, GOLD]]))).toHaveLength(1);
    expect(nothingShared.run(viewFilled([...LEFT, [0, 14, 7, 8, TEAL]], [...RIGHT, [0, 15, 8, 7, GOLD]]))).toEqual([]);
  });

  it('is content with one patterned paper on both pages', () => {
    const stripe: Content = { kind: 'paper', pattern: 'stripe', color: '#aa3333', ground: '#ffffff' };
    const paper = (content: Content) => viewFilled([...LEFT, [0, 14, 5, 8, { ...TEAL, content }]], [...RIGHT, [0, 15, 6, 7, { ...GOLD, content: stripe }]]);
    expect(nothingShared.run(paper(stripe))).toEqual([]);
    expect(nothingShared.run(paper({ ...stripe, ground: '#eeeeee' }))).toHaveLength(1);
  });

  it('is content with a split print on both pages, and not with one alone', () => {
    const one = splitOver(buildFilled(LEFT, RIGHT), [1, 2], 1, 'a');
    expect(nothingShared.run(buildView(one))).toHaveLength(1);
    expect(nothingShared.run(buildView(splitOver(one, [3, 4], 3, 'b')))).toEqual([]);
  });

  it('has nothing to say about a single page', () => {
    expect(nothingShared.run(viewFilled(LEFT, [], { pages: { left: { color: '#ffffff' }, right: null } }))).toEqual([]);
  });
});
