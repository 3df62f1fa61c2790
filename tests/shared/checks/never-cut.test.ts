import { describe, expect, it } from 'vitest';
import { neverCut } from '#shared/checks/never-cut';
import { runChecks } from '#shared/checks/run-checks';
import { inches } from '#shared/model/length';
import type { PrintMarks } from '#shared/model/print';
import type { Placement } from '#shared/model/spread';
import { buildMat, buildPanes, buildPrint, buildSpread, buildView, printContent } from '../../support/builders';

/** A 4 × 3 in print on a 9 × 7 step mat: photo 4 1/8 × 3 1/8 in; or on a smaller one. */
function viewOf(marks: Partial<PrintMarks>, placement: Partial<Placement> = {}, w = 9, h = 7) {
  const print = buildPrint({ paperWidth: inches(4), paperHeight: inches(3), marks });
  return buildView({ doc: buildSpread({ mats: [buildMat({ w, h, content: printContent(print, placement) })] }), prints: [print] });
}

describe('never-cut', () => {
  it.each([
    [{ instantFilm: true }, 'instant-film-cut'],
    [{ oneOfAKind: true }, 'one-of-a-kind-cut'],
    [{ borrowedUntil: '2027-03-01' }, 'borrowed-cut'],
    // Film is never cut, not even a copy of it.
    [{ instantFilm: true, oneOfAKind: true }, 'instant-film-cut'],
  ] as const)('stops a cut of %o', (marks, messageId) => {
    expect(neverCut.run(viewOf(marks, {}, 7, 5))).toMatchObject([{ messageId, data: { title: 'Lunch on the grass' } }]);
  });

  it('is content with such a print whole, with one that may be cut, and with a digital photo', () => {
    expect(neverCut.run(viewOf({ oneOfAKind: true }, { mode: 'whole' }))).toEqual([]);
    expect(neverCut.run(viewOf({}, {}, 7, 5))).toEqual([]);
    expect(neverCut.run(viewOf({ oneOfAKind: true, digital: true }, { scaledWidth: inches(4) }, 7, 5))).toEqual([]);
  });

  it('takes a window as large as the paper for uncut, and one 1/160 mm smaller for a cut', () => {
    expect(neverCut.run(viewOf({ oneOfAKind: true }, { x: 0, y: 0 }))).toEqual([]);
    expect(neverCut.run(viewOf({ oneOfAKind: true }, { x: 1, y: 0 }))).toHaveLength(1);
  });

  it('stops a split of such a print', () => {
    const print = buildPrint({ marks: { oneOfAKind: true } });
    const { group, mats } = buildPanes(print, [buildMat({ x: 0 }), buildMat({ x: 4 })]);
    const view = buildView({ doc: buildSpread({ mats, panes: [group] }), prints: [print] });
    expect(neverCut.run(view)).toMatchObject([{ messageId: 'one-of-a-kind-cut', matIds: group.matIds }]);
    expect(runChecks(view)[0]?.remedy).toMatchObject({ messageId: 'back-to-table' });
  });

  it('mounts it whole where it fits its card, and takes it up where it does not', () => {
    // A mat of 4 3/8 × 3 3/8 in carries all of it; one of 3 3/8 × 2 3/8 does not.
    expect(runChecks(viewOf({ oneOfAKind: true }, { x: inches(1 / 2) }))[0]?.remedy).toMatchObject({ messageId: 'mount-whole' });
    expect(runChecks(viewOf({ oneOfAKind: true }, {}, 7, 5))[0]?.remedy).toMatchObject({ messageId: 'back-to-table' });
  });
});
