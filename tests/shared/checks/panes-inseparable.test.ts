import { describe, expect, it } from 'vitest';
import { panesInseparable } from '#shared/checks/panes-inseparable';
import { runChecks } from '#shared/checks/run-checks';
import { inches } from '#shared/model/length';
import { buildMat, buildPanes, buildPrint, buildSpread, buildView } from '../../support/builders';

type Cells = readonly [x: number, y: number, w: number, h: number];

function viewOf(cells: readonly Cells[], marks: { digital?: boolean } = {}) {
  const print = buildPrint({ paperWidth: inches(10), paperHeight: inches(10), title: 'The mill', marks });
  const { group, mats } = buildPanes(print, cells.map(([x, y, w, h]) => buildMat({ x, y, w, h })));
  return buildView({ doc: buildSpread({ mats, panes: [group] }), prints: [print] });
}
/** Four mats that each stand against the last, round a middle of 2 × 2 steps. */
const PINWHEEL: readonly Cells[] = [[0, 0, 6, 4], [6, 0, 4, 6], [4, 6, 6, 4], [0, 4, 4, 6]];

describe('panes-inseparable', () => {
  it('stops a split print in a pinwheel, and takes it back to the table', () => {
    const notes = runChecks(viewOf(PINWHEEL)).filter((note) => note.checkId === 'panes-inseparable');
    expect(notes).toMatchObject([{ severity: 'stop', data: { title: 'The mill' }, remedy: { messageId: 'back-to-table' } }]);
    expect(notes[0]!.matIds).toHaveLength(4);
  });

  it('accepts panes that cuts from edge to edge part', () => {
    expect(panesInseparable.run(viewOf([[0, 0, 6, 4], [6, 0, 4, 4], [0, 4, 4, 6], [4, 4, 6, 6]]))).toEqual([]);
    expect(panesInseparable.run(viewOf(PINWHEEL.slice(0, 3)))).toEqual([]);
  });

  it('leaves a digital photo alone, which is printed pane by pane', () => {
    expect(panesInseparable.run(viewOf(PINWHEEL, { digital: true }))).toEqual([]);
  });
});
