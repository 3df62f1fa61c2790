import { describe, expect, it } from 'vitest';
import { motifCopied } from '#shared/checks/motif-copied';
import { motifsOf } from '#shared/checks/motifs';
import { buildView, matIdOf } from '../../support/builders';
import { buildFilled, splitOver, viewFilled, type MatSketch } from '../../support/filled-spread';

const row = (y: number, x = 0): readonly MatSketch[] => [0, 1, 2].map((i) => [x + i * 4, y, 4, 5]);
const column = (x: number): readonly MatSketch[] => [0, 1, 2].map((i) => [x, i * 5, 4, 5]);
/** Four mats 8 × 3 about a middle of 5 × 5 steps, clockwise or its mirror. */
const PINWHEEL: readonly MatSketch[] = [[0, 0, 8, 3], [8, 0, 3, 8], [3, 8, 8, 3], [0, 3, 3, 8]];
const MIRRORED: readonly MatSketch[] = [[3, 0, 8, 3], [0, 0, 3, 8], [0, 8, 8, 3], [8, 3, 3, 8]];

describe('motif-copied', () => {
  it('notes the same strip at the same place of both pages', () => {
    expect(motifCopied.run(viewFilled(row(0), row(0)))).toMatchObject([
      { messageId: 'motif-copied', data: { motif: 'strip' }, matIds: [1, 2, 3, 4, 5, 6].map(matIdOf) },
    ]);
  });

  it('is content with the strip moved by one step, turned into a column, or on one page only', () => {
    expect(motifCopied.run(viewFilled(row(0), row(0, 1)))).toEqual([]);
    expect(motifCopied.run(viewFilled(row(0), column(0)))).toEqual([]);
    expect(motifCopied.run(viewFilled(row(0), [[0, 0, 12, 5]]))).toEqual([]);
  });

  it('tells a pinwheel from its mirror', () => {
    expect(motifCopied.run(viewFilled(PINWHEEL, PINWHEEL))).toMatchObject([{ data: { motif: 'pinwheel' } }]);
    expect(motifCopied.run(viewFilled(PINWHEEL, MIRRORED))).toEqual([]);
  });

  it('notes split prints over the same panes', () => {
    const both = splitOver(splitOver(buildFilled([[0, 0, 4, 8], [4, 0, 4, 8]], [[0, 0, 4, 8], [4, 0, 4, 8]]), [1, 2], 1, 'a'), [3, 4], 3, 'b');
    expect(motifCopied.run(buildView(both))).toMatchObject([{ data: { motif: 'split-print' } }]);
  });
});

describe('motifs', () => {
  const kinds = (mats: readonly MatSketch[]): string[] => motifsOf(viewFilled(mats, [])).map((motif) => motif.kind);

  it('finds a strip of three and not of two, and once', () => {
    expect(kinds(row(0))).toEqual(['strip']);
    expect(kinds(row(0).slice(0, 2))).toEqual([]);
    expect(kinds([...row(0), [12, 0, 4, 5]])).toEqual(['strip']);
  });

  it('finds pinwheels of both hands, and none where an arm is missing or of another size', () => {
    expect(kinds(PINWHEEL)).toEqual(['pinwheel']);
    expect(kinds(MIRRORED)).toEqual(['pinwheel']);
    expect(kinds(PINWHEEL.slice(1))).toEqual([]);
    expect(kinds([[0, 0, 8, 3], [8, 0, 3, 7], [3, 8, 8, 3], [0, 3, 3, 8]])).toEqual([]);
  });

  it('takes mats with a space between them for no strip', () => {
    expect(kinds([[0, 0, 4, 5], [5, 0, 4, 5], [10, 0, 4, 5]])).toEqual([]);
  });
});
