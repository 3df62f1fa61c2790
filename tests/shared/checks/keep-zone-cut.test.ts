import { describe, expect, it } from 'vitest';
import { keepZoneCut } from '#shared/checks/keep-zone-cut';
import { runChecks } from '#shared/checks/run-checks';
import { inches } from '#shared/model/length';
import type { Mat, Placement } from '#shared/model/spread';
import type { Print } from '#shared/model/print';
import { buildMat, buildPrint, buildSpread, buildView, printContent } from '../../support/builders';

/** On a 12 × 12 page a 7 × 5 step mat's photo is 3 1/8 × 2 1/8 in. */
const photoWidth = inches(3, 1 / 8);
const CUT = { w: 7, h: 5 };

/** A 6 × 4 in print whose keep zone starts 1 in from left and top; sizes in hundredths of an inch. */
const printWithZone = (width: number, height = 100, parts: Parameters<typeof buildPrint>[0] = {}): Print =>
  buildPrint({ keepZone: { x: 100, y: 100, width, height }, ...parts });

function viewOf(print: Print, window: Partial<Placement> & { x: number; y: number }, mat: Partial<Mat> = {}, more: readonly Mat[] = []) {
  const placed = buildMat({ ...CUT, ...mat, content: printContent(print, window) });
  return buildView({ doc: buildSpread({ mats: [placed, ...more] }), prints: [print] });
}

const findings = (...args: Parameters<typeof viewOf>) => keepZoneCut.run(viewOf(...args));

describe('keep-zone-cut', () => {
  it('accepts a window that holds the keep zone with the tolerance to spare', () => {
    expect(findings(printWithZone(200), { x: inches(1 / 2), y: inches(1 / 2) })).toEqual([]);
  });

  it('accepts exactly 1/16 in to spare and refuses 1/160 mm less', () => {
    // The zone is 1 in to 4 in: with the window at 15/16 in, exactly 1/16 in stays on both sides.
    const print = printWithZone(300);
    expect(photoWidth).toBe(inches(3, 1 / 8));
    expect(findings(print, { x: inches(15 / 16), y: inches(1 / 2) })).toEqual([]);
    const [tight] = findings(print, { x: inches(15 / 16) + 1, y: inches(1 / 2) });
    expect(tight).toMatchObject({ messageId: 'keep-zone-tight', data: { edge: 'left', spare: inches(1 / 16) - 1, tolerance: inches(1 / 16) } });
  });

  it('says how much is lost, and on which side of the page', () => {
    const print = printWithZone(200);
    expect(findings(print, { x: inches(1, 1 / 4), y: inches(1 / 2) })[0]).toMatchObject({
      messageId: 'keep-zone-missed',
      data: { title: 'Lunch on the grass', lost: inches(1 / 4), edge: 'left' },
    });
    // A half-turn brings the paper's left to the page's right.
    const turned = { ...print, marks: { ...print.marks, noUp: true } };
    expect(findings(turned, { x: inches(1, 1 / 4), y: inches(1 / 2), turn: 2 })[0]).toMatchObject({ data: { edge: 'right' } });
    // A quarter-turn clockwise brings it to the top.
    const upright = findings(turned, { x: inches(1, 1 / 4), y: inches(1 / 2), turn: 1 }, { w: 5, h: 7 });
    expect(upright[0]).toMatchObject({ data: { edge: 'top' } });
  });

  it('says that a keep zone wider than the window cannot be held', () => {
    expect(findings(printWithZone(350), { x: inches(1), y: inches(1 / 2) })[0]).toMatchObject({
      messageId: 'keep-zone-larger',
      data: { zone: inches(3.5), window: photoWidth, axis: 'wide' },
    });
  });

  it('asks for nothing to spare at the paper’s own edge, which is not cut', () => {
    const print = buildPrint({ keepZone: { x: 0, y: 0, width: 250, height: 150 } });
    expect(findings(print, { x: 0, y: 0 })).toEqual([]);
  });

  it('leaves a whole print and a print without a keep zone alone', () => {
    expect(findings(printWithZone(500), { x: 0, y: 0, mode: 'whole' })).toEqual([]);
    expect(findings(buildPrint(), { x: inches(2), y: inches(2) })).toEqual([]);
  });

  it('holds a piece that was placed for a detail to that detail, with the same to spare', () => {
    const detail = { id: 'd', name: 'The bell', rect: { x: 420, y: 120, width: 100, height: 100 } };
    const print = printWithZone(200, 100, { details: [detail] });
    const bell = { x: inches(2.875), y: inches(1), detailId: 'd' };
    expect(findings(print, bell)).toEqual([]);
    expect(findings(print, { ...bell, x: inches(4.25) })).toHaveLength(1);
    // The same window without the detail cuts the keep zone, though the bell is whole.
    expect(findings(print, { ...bell, detailId: null })).toHaveLength(1);
    expect(findings({ ...print, details: [] }, bell)).toHaveLength(1);
  });

  it('ignores the part of a keep zone that is not on the paper', () => {
    const print = printWithZone(200, 100, { paperRect: { x: 150, y: 50, width: 450, height: 300 } });
    // The paper starts at 150 px, so of the zone 150–300 px are on it, from its left edge on.
    expect(findings(print, { x: 0, y: 0 })).toEqual([]);
  });

  it('yields to the note that the print must not be cut at all', () => {
    const print = printWithZone(350, 100, { marks: { oneOfAKind: true } });
    expect(runChecks(viewOf(print, { x: inches(1), y: 0 })).map((note) => note.checkId)).toEqual(['never-cut']);
  });
});

describe('remedies for a cut keep zone, in this order', () => {
  const remedyOf = (...args: Parameters<typeof viewOf>) =>
    runChecks(viewOf(...args)).find((note) => note.checkId === 'keep-zone-cut')?.remedy;
  const neighbour = (x: number, y: number, w: number, h: number): Mat => buildMat({ x, y, w, h });

  it('slides the window where that is enough, by as little as possible', () => {
    const remedy = remedyOf(printWithZone(200), { x: inches(1, 1 / 4), y: inches(1 / 2) });
    expect(remedy).toMatchObject({ messageId: 'slide-window', call: { id: 'window.slide', args: { x: inches(15 / 16), y: inches(1 / 2) } } });
  });

  it('mounts the print whole where it fits its card', () => {
    // The print is 3 1/4 in wide, the photo 3 1/8, the mat 3 3/8.
    const print = buildPrint({ paperWidth: inches(3.25), paperHeight: inches(2.25), keepZone: { x: 10, y: 50, width: 305, height: 100 } });
    expect(remedyOf(print, { x: 0, y: 0 })).toMatchObject({ messageId: 'mount-whole' });
  });

  it('makes the mat larger where the page has room, to both sides alike', () => {
    const centred = { x: inches(1, 3 / 16), y: inches(7 / 16) };
    const resize = (args: object) => ({ messageId: 'larger-mat', call: { id: 'mats.resize', args } });
    expect(remedyOf(printWithZone(350), centred, { x: 4, y: 4 })).toMatchObject(resize({ w: 8, h: 5, y: 4 }));
    // A window that somebody slid keeps its centre, so the mat must grow by more: to both sides alike.
    expect(remedyOf(printWithZone(350), { x: inches(1), y: inches(1 / 2) }, { x: 4, y: 4 })).toMatchObject(resize({ x: 3, w: 9, h: 5, y: 4 }));
  });

  it('takes the reveal away where the mat cannot grow', () => {
    const hemmedIn = [neighbour(7, 0, 2, 5)];
    expect(remedyOf(printWithZone(315), { x: inches(1), y: inches(7 / 16) }, {}, hemmedIn)).toMatchObject({
      messageId: 'no-reveal',
      call: { id: 'mats.setReveal', args: { reveal: 0 } },
    });
  });

  it('offers nothing where nothing helps', () => {
    const hemmedIn = [neighbour(7, 0, 2, 5)];
    expect(remedyOf(printWithZone(400), { x: inches(1), y: inches(1 / 2) }, {}, hemmedIn)).toBeNull();
  });
});
