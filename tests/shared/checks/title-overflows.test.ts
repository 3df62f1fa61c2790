import { describe, expect, it } from 'vitest';
import { runChecks } from '#shared/checks/run-checks';
import { titleOverflows } from '#shared/checks/title-overflows';
import { fitTitle, letterCounts } from '#shared/lettering/title-letters';
import { inches } from '#shared/model/length';
import { buildMat, buildSpread, buildView, matIdOf } from '../../support/builders';

const title = (text: string, letterHeight: number) => ({ kind: 'lettering', text, color: '#1f4e5f', letterHeight }) as const;
const viewOf = (text: string, letterHeight: number, w = 8, h = 4, more: ReturnType<typeof buildMat>[] = []) =>
  buildView({ doc: buildSpread({ mats: [buildMat({ id: matIdOf(1), w, h, content: title(text, letterHeight) }), ...more] }) });
/** The place that a title has on a mat of 8 × 4 steps: 4 in and 2 in, less the gap and two reveals of 1/8 in. */
const PLACE = { x: 0, y: 0, width: inches(3, 5 / 8), height: inches(1, 5 / 8) };

describe('title-overflows', () => {
  it('notes a word that is wider than its mat at its true letter widths', () => {
    const [found] = titleOverflows.run(viewOf('Lighthouse', inches(1)));
    expect(found).toMatchObject({ messageId: 'title-overflows', data: { axis: 'wide', has: PLACE.width }, matIds: [matIdOf(1)] });
    expect(found?.data).toMatchObject({ needs: fitTitle(title('Lighthouse', inches(1)), PLACE).width });
  });

  it('notes too many lines', () => {
    expect(titleOverflows.run(viewOf('Sea\nSky\nSun', inches(1 / 2)))).toMatchObject([{ data: { axis: 'high' } }]);
  });

  it('turns over exactly where the letters reach the edge', () => {
    // Widths grow with the height of the capitals, so one height fits to the unit.
    const widthPerHeight = fitTitle(title('Lighthouse', inches(4)), { ...PLACE, width: inches(40), height: inches(40) }).width / inches(4);
    const most = Math.floor(PLACE.width / widthPerHeight);
    expect(titleOverflows.run(viewOf('Lighthouse', most - 1))).toEqual([]);
    expect(titleOverflows.run(viewOf('Lighthouse', most + 2))).toHaveLength(1);
    expect(titleOverflows.run(viewOf('Lighthouse', most + 2), { over: inches(1 / 16) })).toEqual([]);
  });

  it('offers the largest usual letters that fit, and else a larger mat', () => {
    expect(runChecks(viewOf('Lighthouse', inches(3 / 4)))[0]?.remedy).toMatchObject({ messageId: 'smaller-letters' });
    // Nine inches wide at this height, so that letters half as high are too wide as well.
    const inch = fitTitle(title('Lighthouse', inches(1)), { ...PLACE, width: inches(40) }).width;
    expect(runChecks(viewOf('Lighthouse', Math.round((inches(1) * inches(9)) / inch)))[0]?.remedy).toMatchObject({ messageId: 'larger-mat' });
  });
});

describe('letters to cut', () => {
  it('are counted each, small and large apart, the most first', () => {
    expect(letterCounts('Otto to\ntea')).toEqual([
      { letter: 't', count: 4 },
      { letter: 'o', count: 2 },
      { letter: 'O', count: 1 },
      { letter: 'a', count: 1 },
      { letter: 'e', count: 1 },
    ]);
    expect(letterCounts(' \n')).toEqual([]);
  });

  it('take no room where there are none', () => {
    expect(fitTitle(title('', inches(1)), PLACE)).toMatchObject({ width: 0, fits: true });
  });
});
