import { describe, expect, it } from 'vitest';
import { filterSketches, sketchFeatures } from '#shared/sketches/features';
import { sketchWords } from '#shared/words/en/sketches';
import { sketchesFor } from '#shared/sketches/catalogue';
import { parseMats, type Sketch } from '#shared/sketches/sketch';
import { formatOf } from '../../support/builders';

const twelve = formatOf('12x12in');
const sketchOf = (notation: string): Sketch => ({ id: 'x', name: 'Milk Churn', formatId: '12x12in', mats: parseMats(notation) });
const featuresOf = (notation: string) => sketchFeatures(sketchOf(notation), twelve);

describe('sketchFeatures', () => {
  it.each([
    ['0,4,10,14* 12,0,8,6 12,8,8,6', 3, 'middle-left', 'medium', 'mixed', 0],
    ['4,4,14,14* 0,0,3,3 19,19,3,3', 3, 'middle-centre', 'large', 'square', 0],
    ['14,14,8,6* 0,0,6,4 0,8,6,4', 3, 'bottom-right', 'small', 'flat', 0],
    ['0,0,4,8a 4,0,4,8a 8,0,4,8a 2,14,6,8*', 4, 'bottom-left', 'small', 'upright', 3],
  ] as const)('of %s', (notation, matCount, biggestPlace, biggestSize, orientation, paneCount) => {
    expect(featuresOf(notation)).toMatchObject({ matCount, biggestPlace, biggestSize, orientation, paneCount });
  });

  it('takes the focal for the biggest among equals, and a pane only where there is nothing else', () => {
    expect(featuresOf('0,0,8,12 14,0,8,12*').biggest.x).toBe(14);
    expect(featuresOf('0,0,10,10a 10,0,10,10a 0,14,5,5').biggest.w).toBe(5);
    expect(featuresOf('0,0,6,6a 6,0,6,8a').biggest.h).toBe(8);
  });

  it('measures how much of the page is covered', () => {
    expect(featuresOf('0,0,22,11').coverage).toBe(0.5);
  });
});

describe('filterSketches', () => {
  const all = sketchesFor(twelve);

  it('keeps what fits every wish, in order', () => {
    const found = filterSketches(all, twelve, { leastMats: 5, mostMats: 9, panes: false, biggestSize: 'large' });
    expect(found.length).toBeGreaterThan(0);
    expect(found.length).toBeLessThan(all.length);
    for (const sketch of found) {
      const { matCount, paneCount, biggestSize } = sketchFeatures(sketch, twelve);
      expect(matCount).toBeGreaterThanOrEqual(5);
      expect(matCount).toBeLessThanOrEqual(9);
      expect(paneCount).toBe(0);
      expect(biggestSize).toBe('large');
    }
    expect(found).toEqual(all.filter((sketch) => found.includes(sketch)));
  });

  it('keeps everything without a wish', () => {
    expect(filterSketches(all, twelve, {})).toEqual(all);
  });
});

describe('the words for a sketch', () => {
  it.each([
    ['0,4,10,14* 12,0,8,6 12,8,8,6', '3 mats, big one left'],
    ['4,4,14,14*', '1 mat, big one in the middle'],
    ['0,0,4,8a 4,0,4,8a 8,0,4,8a 2,14,6,8*', '4 mats, big one bottom left, one split in 3'],
  ])('says of %s: %s', (notation, words) => expect(sketchWords(sketchFeatures(sketchOf(notation), twelve))).toBe(words));
});
