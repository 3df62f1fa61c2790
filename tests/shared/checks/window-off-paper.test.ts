import { describe, expect, it } from 'vitest';
import { runChecks } from '#shared/checks/run-checks';
import { windowOffPaper } from '#shared/checks/window-off-paper';
import { inches } from '#shared/model/length';
import type { Mat, Placement } from '#shared/model/spread';
import { buildMat, buildPanes, buildPrint, buildSpread, buildView, formatOf, printContent } from '../../support/builders';

/** Two 4 × 4 step mats side by side: with gap and reveals a window of 3 5/8 × 1 5/8 in. */
function split(placement: Partial<Placement> & { run?: 'behind' | 'apart' }, parts: Parameters<typeof buildPrint>[0] = {}) {
  const print = buildPrint(parts);
  const { group, mats } = buildPanes(print, [buildMat({ x: 0 }), buildMat({ x: 4 })], placement);
  return buildView({ doc: buildSpread({ mats, panes: [group] }), prints: [print] });
}

/** A mat on the corner of an edge-to-edge page: its photo is 2 15/16 in square without reveal. */
function bleed(placement: Partial<Placement>, mat: Partial<Mat> = {}) {
  const print = buildPrint();
  const placed = buildMat({ w: 6, h: 6, reveal: 0, content: printContent(print, placement), ...mat });
  return buildView({ doc: buildSpread({ format: formatOf('12x12in-bleed'), mats: [placed] }), prints: [print] });
}

describe('window-off-paper', () => {
  it('accepts panes whose windows end on the paper’s edge, and stops one unit further', () => {
    const room = inches(6) - inches(3, 5 / 8);
    expect(windowOffPaper.run(split({ x: room }))).toEqual([]);
    expect(windowOffPaper.run(split({ x: room + 1 }))).toMatchObject([{ messageId: 'pane-off-paper', data: { missing: 1 } }]);
    expect(windowOffPaper.run(split({ x: -1 }))).toHaveLength(1);
  });

  it('slides the window back where the paper is large enough', () => {
    const [note] = runChecks(split({ x: inches(4) }));
    expect(note).toMatchObject({ severity: 'stop', remedy: { messageId: 'slide-window', call: { args: { x: inches(2, 3 / 8), y: 0 } } } });
  });

  it('spreads the panes apart where the paper is too small only because gaps swallow some', () => {
    // Apart, the two windows need 3 1/4 in.
    const [note] = runChecks(split({ x: 0 }, { paperWidth: inches(3.5), paperHeight: inches(2.5) }));
    expect(note).toMatchObject({ checkId: 'window-off-paper', remedy: { messageId: 'spread-apart' } });
    expect(windowOffPaper.run(split({ x: 0, run: 'apart' }, { paperWidth: inches(3.5), paperHeight: inches(2.5) }))).toEqual([]);
  });

  it('puts the print back on the table where nothing else helps', () => {
    const [note] = runChecks(split({ x: 0 }, { paperWidth: inches(3), paperHeight: inches(2) }));
    expect(note).toMatchObject({ checkId: 'window-off-paper', remedy: { messageId: 'back-to-table' } });
  });

  it('stops a photo that bleeds off the page and leaves its paper', () => {
    expect(windowOffPaper.run(bleed({ x: inches(3) }))).toEqual([]);
    expect(windowOffPaper.run(bleed({ x: inches(4) }))).toMatchObject([{ messageId: 'bleed-off-paper', data: { missing: inches(15 / 16) } }]);
  });

  it('leaves it to another check where card shows, inside the page, or whole', () => {
    expect(windowOffPaper.run(bleed({ x: inches(4) }, { reveal: null }))).toEqual([]);
    expect(windowOffPaper.run(bleed({ x: inches(4) }, { x: 6, y: 6 }))).toEqual([]);
    expect(windowOffPaper.run(bleed({ x: inches(4), mode: 'whole' }))).toEqual([]);
  });
});
