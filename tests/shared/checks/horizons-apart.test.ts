import { describe, expect, it } from 'vitest';
import { horizonsApart } from '#shared/checks/horizons-apart';
import { runChecks } from '#shared/checks/run-checks';
import { heightAt, horizonOnPage } from '#shared/geometry/horizon';
import { inches } from '#shared/model/length';
import { applyPatch } from '#shared/model/patch';
import { runCommand } from '#shared/commands/run-command';
import { buildMat, buildPrint, buildSpread, buildView, idOf, matIdOf, printContent } from '../../support/builders';

const level = (y: number) => ({ x1: 0, y1: y, x2: 599, y2: y });

/** Two 6 × 4 in prints (100 px to the inch) side by side in mats of 8 × 6 steps, their windows 1/2 in from the top. */
const viewOf = (left: number | null, right: number | null, { secondY = 0 } = {}) => {
  const prints = [left, right].map((y, i) => buildPrint({ title: `Bay ${i + 1}`, horizon: y === null ? null : level(y) }));
  const mats = prints.map((print, i) => buildMat({ id: matIdOf(i + 1), x: 8 * i, y: i === 1 ? secondY : 0, w: 8, h: 6, content: printContent(print, { y: inches(1 / 2) }) }));
  return buildView({ doc: buildSpread({ mats }), prints });
};

describe('horizons-apart', () => {
  it('notes neighbours whose horizons miss each other', () => {
    expect(horizonsApart.run(viewOf(150, 175))).toMatchObject([
      { messageId: 'horizons-apart', data: { title: 'Bay 1', other: 'Bay 2', apart: inches(1 / 4) }, matIds: [matIdOf(2), matIdOf(1)] },
    ]);
  });

  it('is content where they meet to a sixteenth, where none is marked, and where they are no row', () => {
    expect(horizonsApart.run(viewOf(150, 156))).toEqual([]);
    expect(horizonsApart.run(viewOf(150, 157))).toHaveLength(1);
    expect(horizonsApart.run(viewOf(150, null))).toEqual([]);
    expect(horizonsApart.run(viewOf(150, 175, { secondY: 1 }))).toEqual([]);
  });

  it('lines them up by sliding one window', () => {
    const view = viewOf(150, 175);
    const note = runChecks(view).find(({ checkId }) => checkId === 'horizons-apart')!;
    expect(note.remedy).toMatchObject({ messageId: 'line-up', call: { id: 'window.slide', args: { matId: matIdOf(2), y: inches(3 / 4) } } });
    const doc = applyPatch(view.doc, runCommand(view.doc, note.remedy!.call, { prints: view.prints, trim: view.trim, newId: () => idOf(1, 9) }));
    expect(horizonsApart.run(buildView({ doc, prints: [...view.prints.values()] }))).toEqual([]);
  });

  it('measures a slope where the photos meet', () => {
    const line = { x1: 0, y1: 0, x2: 100, y2: 50 };
    expect(heightAt(line, 40)).toBe(20);
    expect(heightAt({ x1: 0, y1: 0, x2: 10, y2: 50 }, 5)).toBeNull();
    const print = buildPrint({ horizon: level(100) });
    const photo = { rect: { x: 1000, y: 2000, width: inches(3), height: inches(2) }, window: { x: 0, y: inches(1 / 2), width: inches(3), height: inches(2) }, placement: { printId: print.id, mode: 'window', x: 0, y: inches(1 / 2), turn: 0, scaledWidth: null, detailId: null } } as const;
    expect(horizonOnPage(print, photo)).toMatchObject({ x1: 1000, y1: 2000 + inches(1 / 2), y2: 2000 + inches(1 / 2) });
  });
});
