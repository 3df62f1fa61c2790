import { describe, expect, it } from 'vitest';
import { accentAlone } from '#shared/checks/accent-alone';
import { oklchToHex } from '#shared/colour/css-color';
import { runChecks } from '#shared/checks/run-checks';
import { matIdOf } from '../../support/builders';
import { schemeOf, viewColored } from '../../support/colored-spread';

const SEA = oklchToHex([0.42, 0.06, 220]);
const RED = oklchToHex([0.4, 0.15, 30]);
const scheme = schemeOf('echo', ['#ffffff', SEA, SEA, RED]);
const cards = (...accents: number[]): string[] => Array.from({ length: 8 }, (_, i) => (accents.includes(i + 1) ? RED : SEA));

describe('accent-alone', () => {
  it('notes an accent that stands once', () => {
    expect(accentAlone.run(viewColored(cards(2), [SEA, RED], { scheme }))).toMatchObject([{ messageId: 'accent-few', data: { places: 1, color: RED }, matIds: [matIdOf(2)] }]);
  });

  it('notes one that stays on a page, however often it stands there', () => {
    expect(accentAlone.run(viewColored(cards(1, 2, 3), [SEA], { scheme }))).toMatchObject([{ messageId: 'accent-one-page', data: { places: 3 } }]);
  });

  it('is content with two on both pages, and wants three where the studio says so', () => {
    const view = viewColored(cards(2, 7), [SEA], { scheme });
    expect(accentAlone.run(view)).toEqual([]);
    expect(accentAlone.run(view, { places: 3 })).toHaveLength(1);
  });

  it('takes the most vivid card of which there is little for the accent where no scheme names one', () => {
    expect(accentAlone.run(viewColored(cards(2), [SEA]))).toHaveLength(1);
    expect(accentAlone.run(viewColored(cards(1, 2, 3, 4), [SEA]))).toEqual([]);
  });

  it('says nothing where the accent is a neutral or not used at all', () => {
    expect(accentAlone.run(viewColored(cards(), [SEA], { scheme }))).toEqual([]);
    expect(accentAlone.run(viewColored(['#777777', SEA], [SEA], { scheme: schemeOf('quiet', ['#ffffff', SEA, SEA, '#777777']) }))).toEqual([]);
  });

  it('offers to repeat it on the other page', () => {
    const note = runChecks(viewColored(cards(2), [SEA, RED], { scheme })).find(({ checkId }) => checkId === 'accent-alone');
    expect(note?.remedy).toMatchObject({ messageId: 'repeat-accent', call: { args: { matIds: [matIdOf(5)], color: RED } } });
  });
});
