import { describe, expect, it } from 'vitest';
import { runChecks } from '#shared/checks/run-checks';
import { shaving } from '#shared/checks/shaving';
import { inches } from '#shared/model/length';
import type { PxRect } from '#shared/model/print';
import type { Placement } from '#shared/model/spread';
import { buildMat, buildPrint, buildSpread, buildView, printContent } from '../../support/builders';

/** A window of 4 1/8 × 3 1/8 in on a 6 × 4 in print: 1 7/8 in are cut off across, 7/8 in along. */
function viewOf(placement: Partial<Placement>, keepZone: PxRect | null = null, noUp = false, paperWidth = inches(6)) {
  const print = buildPrint({ keepZone, paperWidth, marks: { noUp } });
  return buildView({ doc: buildSpread({ mats: [buildMat({ w: 9, h: 7, content: printContent(print, placement) })] }), prints: [print] });
}
const run = (...args: Parameters<typeof viewOf>) => shaving.run(viewOf(...args));

describe('shaving', () => {
  it('notes a strip under 1/4 in, and slides to the paper’s edge', () => {
    expect(run({ x: inches(3 / 16) })).toMatchObject([{ messageId: 'shaving', data: { width: inches(3 / 16), edge: 'left' } }]);
    expect(runChecks(viewOf({ x: inches(3 / 16) })).find(({ checkId }) => checkId === 'shaving')?.remedy).toMatchObject({ call: { args: { x: 0, y: 0 } } });
    expect(run({ x: inches(1.75) })).toMatchObject([{ data: { width: inches(1 / 8), edge: 'right' } }]);
  });

  it('is content with 1/4 in and with no strip at all', () => {
    expect(run({ x: inches(1 / 4) })).toEqual([]);
    expect(run({ x: 0 })).toEqual([]);
  });

  it('is content where sliding would lose the keep zone or only move the shaving', () => {
    expect(run({ x: inches(3 / 16) }, { x: 25, y: 50, width: 400, height: 100 })).toEqual([]);
    expect(run({ x: inches(1 / 8) }, null, false, inches(4.25))).toEqual([]);
  });

  it('names the side as it lies on the page', () => {
    // 3 1/8 across and 4 1/8 along of the paper are shown; its left is the page's top after a quarter-turn.
    const upright = buildPrint({ paperWidth: inches(4), paperHeight: inches(6), marks: { noUp: true } });
    const mat = buildMat({ w: 9, h: 7, content: printContent(upright, { turn: 1, x: inches(1 / 8) }) });
    expect(shaving.run(buildView({ doc: buildSpread({ mats: [mat] }), prints: [upright] }))).toMatchObject([{ data: { edge: 'top' } }]);
  });
});
