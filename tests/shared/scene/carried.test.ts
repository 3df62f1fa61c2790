import { describe, expect, it } from 'vitest';
import { contains } from '#shared/geometry/rects';
import { inches } from '#shared/model/length';
import type { Content, Pattern } from '#shared/model/spread';
import { buildScene } from '#shared/scene/build-scene';
import { layoutJournaling } from '#shared/scene/journaling';
import { layoutLettering } from '#shared/scene/lettering';
import type { SceneItem, TextItem } from '#shared/scene/scene';
import { widthOf } from '#shared/scene/text';
import { buildMat, buildSpread } from '../../support/builders';

/** An 8 × 8 step mat's content is 3 5/8 in square, 11/16 in from the page's corner. */
const PLACE = { x: inches(11 / 16), y: inches(11 / 16), width: inches(3, 5 / 8), height: inches(3, 5 / 8) };

function carriedItems(content: Content): SceneItem[] {
  const mat = buildMat({ w: 8, h: 8, content });
  return buildScene(buildSpread({ mats: [mat] }), new Map()).items.slice(2);
}

const textsOf = (items: readonly SceneItem[]): TextItem[] => items.filter((item) => item.kind === 'text');

describe('lettering', () => {
  const lettering = { kind: 'lettering', text: 'Out to\nthe light', color: '#1f4f5f', letterHeight: inches(1 / 2) } as const;

  it('stands centred, its capitals as tall as asked', () => {
    const [first, second] = textsOf(carriedItems(lettering));
    expect([first!.text, second!.text, first!.font]).toEqual(['Out to', 'the light', 'young-serif']);
    expect(first!.size * 0.75).toBeCloseTo(inches(1 / 2));
    const width = widthOf('young-serif', first!.size, 'Out to');
    expect(first!.xs[0]! + width / 2).toBeCloseTo(PLACE.x + PLACE.width / 2);
    const top = first!.baseline - inches(1 / 2);
    expect((top + second!.baseline) / 2).toBeCloseTo(PLACE.y + PLACE.height / 2);
  });

  it('wraps by measured width, and keeps its size where a word is too wide', () => {
    expect(layoutLettering({ ...lettering, text: 'Out to the light' }, PLACE)).toMatchObject({ lines: [{}, {}], overflows: false });
    const long = layoutLettering({ ...lettering, text: 'Lighthouses', letterHeight: inches(3 / 4) }, PLACE);
    expect(long.overflows).toBe(true);
    expect(long.size * 0.75).toBeCloseTo(inches(3 / 4));
  });

  it('overflows where there are more lines than room', () => {
    expect(layoutLettering({ ...lettering, text: 'a\nb\nc\nd\ne\nf\ng' }, PLACE).overflows).toBe(true);
  });

  it('of a script that the fonts lack shows boxes', () => {
    const items = carriedItems({ ...lettering, text: 'שלום' });
    expect(items.map((item) => item.kind)).toEqual(['frame', 'frame', 'frame', 'frame']);
  });
});

describe('journaling', () => {
  const journaling = { kind: 'journaling', text: 'Nora counted every step to the top.', color: '#1b1d22', lineHeight: inches(3 / 8) } as const;

  it('rules the whole place and writes on the rules from the left', () => {
    const items = carriedItems(journaling);
    const rules = items.filter((item) => item.kind === 'rect');
    expect(rules).toHaveLength(9);
    expect(rules[1]!.rect.y - rules[0]!.rect.y).toBe(inches(3 / 8));
    const [first] = textsOf(items);
    expect([first!.font, first!.xs[0]]).toEqual(['atkinson-italic', PLACE.x]);
    expect(first!.baseline).toBeLessThan(rules[0]!.rect.y);
    expect(first!.baseline).toBeGreaterThan(rules[0]!.rect.y - inches(3 / 16));
  });

  it('reports the lines that find no rule, and does not write them', () => {
    const low = { ...PLACE, height: inches(3 / 4) };
    const layout = layoutJournaling({ ...journaling, text: 'one\ntwo\nthree\nfour\n\n' }, low);
    expect(layout.lines.map(({ line }) => line.text)).toEqual(['one', 'two']);
    expect(layout.overflow).toEqual(['three', 'four']);
  });

  it('breaks a word that is wider than the mat', () => {
    const layout = layoutJournaling({ ...journaling, text: 'W'.repeat(60) }, PLACE);
    expect(layout.lines.length).toBeGreaterThan(1);
    for (const { line } of layout.lines) expect(line.width).toBeLessThanOrEqual(PLACE.width);
  });

  it('of nothing leaves ruled lines', () => {
    expect(layoutJournaling({ ...journaling, text: '' }, PLACE)).toMatchObject({ lines: [], overflow: [] });
  });
});

describe('patterned paper', () => {
  const paper = (pattern: Pattern): SceneItem[] => carriedItems({ kind: 'paper', pattern, color: '#1f4f5f', ground: '#efe6d2' });

  it.each(['stripe', 'dot', 'check', 'plain'] as const)('%s stays within its place', (pattern) => {
    for (const item of paper(pattern)) {
      if (item.kind === 'rect') expect(contains(PLACE, item.rect)).toBe(true);
      if (item.kind === 'circle') {
        expect(contains(PLACE, { x: item.cx - item.r, y: item.cy - item.r, width: 2 * item.r, height: 2 * item.r })).toBe(true);
      }
    }
  });

  it('shows its ground under its pattern', () => {
    expect(paper('plain')).toMatchObject([{ kind: 'rect', rect: PLACE, fill: '#efe6d2' }]);
    expect(paper('stripe')[1]).toMatchObject({ kind: 'rect', fill: '#1f4f5f' });
    expect(paper('dot')[1]).toMatchObject({ kind: 'circle', fill: '#1f4f5f' });
    expect(paper('check')[1]).toMatchObject({ kind: 'rect', opacity: 0.55 });
  });

  it('repeats at its true size', () => {
    const bars = paper('check').slice(1).map((item) => (item.kind === 'rect' ? item.rect.x : null));
    expect(bars[1]! - bars[0]!).toBe(inches(1 / 2));
  });
});

describe('embellishments and keepsakes', () => {
  it('are drawn with their names', () => {
    const star = carriedItems({ kind: 'embellishment', name: 'Brass star', color: '#1b1d22' });
    expect(star[0]).toMatchObject({ kind: 'circle', r: PLACE.width / 2 });
    expect(textsOf(star)).toMatchObject([{ text: 'Brass star', fill: '#fdfcf8' }]);
  });

  it('keep a keepsake at its true size', () => {
    const ticket = carriedItems({ kind: 'keepsake', name: 'Day return', width: inches(2), height: inches(1), thickness: 32, fragile: false, acidic: true });
    expect(ticket[0]).toMatchObject({ kind: 'rect', rect: { x: PLACE.x + inches(13 / 16), width: inches(2), height: inches(1) } });
    expect(textsOf(ticket).map((item) => item.text)).toEqual(['Day return']);
  });

  it('leave out a name that has no room', () => {
    const speck = carriedItems({ kind: 'keepsake', name: 'A lock of hair', width: inches(1 / 4), height: inches(1 / 4), thickness: 32, fragile: true, acidic: false });
    expect(textsOf(speck)).toEqual([]);
  });
});
