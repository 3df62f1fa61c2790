import { describe, expect, it } from 'vitest';
import { printSmallerThanPhoto } from '#shared/checks/print-smaller-than-photo';
import { runChecks } from '#shared/checks/run-checks';
import { inches } from '#shared/model/length';
import type { Placement } from '#shared/model/spread';
import { buildMat, buildPrint, buildSpread, buildView, printContent } from '../../support/builders';

/** A 7 × 5 step mat: photo 3 1/8 × 2 1/8 in, mat 3 3/8 × 2 3/8 in. */
function viewOf(paper: { width: number; height: number }, placement: Partial<Placement> = {}, noUp = false) {
  const print = buildPrint({ paperWidth: paper.width, paperHeight: paper.height, marks: { noUp } });
  return buildView({ doc: buildSpread({ mats: [buildMat({ w: 7, h: 5, content: printContent(print, placement) })] }), prints: [print] });
}
const PHOTO = { width: inches(3, 1 / 8), height: inches(2, 1 / 8) };

describe('print-smaller-than-photo', () => {
  it('accepts paper of just the photo’s size, and notes 1/160 mm less', () => {
    expect(printSmallerThanPhoto.run(viewOf(PHOTO))).toEqual([]);
    expect(printSmallerThanPhoto.run(viewOf({ ...PHOTO, width: PHOTO.width - 1 }))).toMatchObject([
      { messageId: 'print-smaller', data: { print: PHOTO.width - 1, photo: PHOTO.width, axis: 'wide' } },
    ]);
  });

  it('offers to mount a smaller print whole', () => {
    const [note] = runChecks(viewOf({ width: inches(3), height: inches(2) }));
    expect(note).toMatchObject({ checkId: 'print-smaller-than-photo', severity: 'fix', remedy: { messageId: 'mount-whole' } });
  });

  it('offers to slide a large print’s window back', () => {
    const [note] = runChecks(viewOf({ width: inches(6), height: inches(4) }, { x: inches(4) }));
    expect(note).toMatchObject({ data: { axis: 'wide' }, remedy: { messageId: 'slide-window', call: { args: { x: inches(2, 7 / 8) } } } });
  });

  it('offers a smaller mat to a print that is shorter than its photo and wider than its card', () => {
    // The photo's 2 1/8 in come down to 1 5/8 with one step.
    const [note] = runChecks(viewOf({ width: inches(6), height: inches(2) }));
    expect(note).toMatchObject({ data: { axis: 'high' }, remedy: { messageId: 'smaller-mat', call: { id: 'mats.resize', args: { w: 7, h: 4 } } } });
  });

  it('says the side as it lies on the page', () => {
    // Turned, the paper’s 3 in stand upright on the page, where 2 1/8 are shown; across it has 2 of 3 1/8.
    expect(printSmallerThanPhoto.run(viewOf({ width: inches(3), height: inches(2) }, { turn: 1 }, true))).toMatchObject([
      { data: { axis: 'wide', print: inches(2), photo: inches(3, 1 / 8) } },
    ]);
  });

  it('leaves a whole print alone', () => {
    expect(printSmallerThanPhoto.run(viewOf({ width: inches(2), height: inches(2) }, { mode: 'whole' }))).toEqual([]);
  });
});
