import { describe, expect, it } from 'vitest';
import { runChecks } from '#shared/checks/run-checks';
import { wholeOverhangs } from '#shared/checks/whole-overhangs';
import { inches } from '#shared/model/length';
import type { Print } from '#shared/model/print';
import type { Mat } from '#shared/model/spread';
import { buildMat, buildPrint, buildSpread, buildView, printContent } from '../../support/builders';

/** A 7 × 5 step mat of 3 3/8 × 2 3/8 in. */
function viewOf(parts: Parameters<typeof buildPrint>[0], mat: Partial<Mat> = {}, more: readonly Mat[] = []) {
  const print: Print = buildPrint(parts);
  const placed = buildMat({ w: 7, h: 5, content: printContent(print, { mode: 'whole' }), ...mat });
  return buildView({ doc: buildSpread({ mats: [placed, ...more] }), prints: [print] });
}
const sized = (paperWidth: number, paperHeight: number) => ({ paperWidth, paperHeight });

describe('whole-overhangs', () => {
  it('accepts a whole print just as large as its mat, and notes 1/160 mm more', () => {
    expect(wholeOverhangs.run(viewOf(sized(inches(3, 3 / 8), inches(2, 3 / 8))))).toEqual([]);
    expect(wholeOverhangs.run(viewOf(sized(inches(3, 3 / 8) + 1, inches(2))))).toMatchObject([{ messageId: 'whole-overhangs', data: { over: 1 } }]);
  });

  it('holds it against the inner mat where there is one', () => {
    const inner = { color: '#ffffff', reveal: inches(1 / 16) };
    expect(wholeOverhangs.run(viewOf(sized(inches(3, 1 / 8), inches(2)), { inner }))).toEqual([]);
    expect(wholeOverhangs.run(viewOf(sized(inches(3, 1 / 4), inches(2)), { inner }))).toHaveLength(1);
  });

  it('first makes the mat larger, then trims, and takes up what must not be trimmed', () => {
    const remedyOf = (...args: Parameters<typeof viewOf>) => runChecks(viewOf(...args)).find((note) => note.checkId === 'whole-overhangs')?.remedy;
    const hemmedIn = [buildMat({ x: 7, w: 4, h: 5 })];
    const big = sized(inches(3.5), inches(2));
    expect(remedyOf(big)).toMatchObject({ messageId: 'larger-mat', call: { args: { w: 8, h: 5 } } });
    expect(remedyOf(big, {}, hemmedIn)).toMatchObject({ messageId: 'trim-to-mat' });
    expect(remedyOf({ ...big, marks: { instantFilm: true } }, {}, hemmedIn)).toMatchObject({ messageId: 'back-to-table' });
  });
});
