import { describe, expect, it } from 'vitest';
import { inches } from '#shared/model/length';
import type { SpreadDocument } from '#shared/model/spread';
import { buildMat, buildPanes, buildPrint, buildSpread, matIdOf, printContent } from '../../support/builders';
import { commandsWith, matIn, placeCall } from '../../support/command-driver';

const A = matIdOf(1);
const B = matIdOf(2);
const C = matIdOf(3);
const MARK = inches(1 / 16);

/** A mat of 8 × 6 steps: its photo is 3 5/8 × 2 5/8 in, its card 3 7/8 × 2 7/8 in. */
const oneMat = (parts: Parameters<typeof buildMat>[0] = {}): SpreadDocument => buildSpread({ mats: [buildMat({ id: A, w: 8, h: 6, ...parts })] });

describe('placing a print', () => {
  it.each([
    ['on the middle of the paper without a keep zone', null, { x: 19 * MARK, y: 11 * MARK }],
    ['on the keep zone, at the nearest mark', { x: 250, y: 180, width: 100, height: 100 }, { x: 19 * MARK, y: 16 * MARK }],
    ['as near to a keep zone in the corner as the paper reaches', { x: 50, y: 50, width: 100, height: 100 }, { x: 0, y: 0 }],
    ['as near to a keep zone at the far edge as the paper reaches', { x: 400, y: 100, width: 100, height: 100 }, { x: 38 * MARK, y: 0 }],
    ['at the paper’s edge rather than a shaving away from it', { x: 250, y: 100, width: 100, height: 100 }, { x: 19 * MARK, y: 0 }],
  ])('centres its window %s', (_name, keepZone, at) => {
    const print = buildPrint({ keepZone });
    const doc = commandsWith([print]).after(oneMat(), placeCall(print.id, A));
    expect(matIn(doc, A).content).toEqual(printContent(print, at));
  });

  it('centres on a detail where it is placed for one, and remembers which', () => {
    const bell = { id: 'd1', name: 'The bell', rect: { x: 420, y: 220, width: 100, height: 100 } };
    const print = buildPrint({ keepZone: { x: 50, y: 50, width: 100, height: 100 }, details: [bell] });
    const commands = commandsWith([print]);
    const call = { id: 'prints.place' as const, args: { printId: print.id, matId: A, detailId: 'd1' } };
    const doc = commands.after(oneMat({ w: 4, h: 4 }), call);
    // The bell's middle is 4.7 × 2.7 in, the photo 1 5/8 in square.
    expect(matIn(doc, A).content).toEqual(printContent(print, { x: 62 * MARK, y: 30 * MARK, detailId: 'd1' }));
    expect(commands.whyNot(doc, { ...call, args: { ...call.args, detailId: 'gone' } })).toBe('no-such-detail');
    const moved = commands.after(buildSpread({ ...doc, mats: [...doc.mats, buildMat({ id: B, x: 8, w: 6, h: 6 })] }), { id: 'prints.move', args: { fromMatId: A, toMatId: B } });
    expect(matIn(moved, B).content).toMatchObject({ printId: print.id, detailId: 'd1' });
  });

  it('chooses the print for the spread', () => {
    const print = buildPrint();
    const doc = commandsWith([print]).after(oneMat(), placeCall(print.id, A));
    expect(doc.table).toEqual([print.id]);
  });

  it('sends what lay there back to the table', () => {
    const [first, second] = [buildPrint(), buildPrint()];
    const doc = commandsWith([first, second]).after(oneMat(), placeCall(first.id, A), placeCall(second.id, A));
    expect(matIn(doc, A).content).toMatchObject({ printId: second.id });
    expect(doc.table).toEqual([first.id, second.id]);
  });

  it.each([
    ['instant film', { instantFilm: true }],
    ['one of a kind', { oneOfAKind: true }],
    ['borrowed', { borrowedUntil: '2026-12-24' }],
  ])('mounts a print that is %s whole where it fits, and else trims it', (_name, marks) => {
    const print = buildPrint({ paperWidth: inches(3, 3 / 4), paperHeight: inches(2, 3 / 4), marks });
    const commands = commandsWith([print]);
    expect(matIn(commands.after(oneMat(), placeCall(print.id, A)), A).content).toMatchObject({ mode: 'whole' });
    expect(matIn(commands.after(oneMat({ w: 7 }), placeCall(print.id, A)), A).content).toMatchObject({ mode: 'window' });
  });

  it('trims any other print of that size', () => {
    const print = buildPrint({ paperWidth: inches(3, 3 / 4), paperHeight: inches(2, 3 / 4) });
    expect(matIn(commandsWith([print]).after(oneMat(), placeCall(print.id, A)), A).content).toMatchObject({ mode: 'window' });
  });

  it('mounts a print whole that is smaller than the photo would be', () => {
    const print = buildPrint({ paperWidth: inches(2, 1 / 2), paperHeight: inches(2) });
    expect(matIn(commandsWith([print]).after(oneMat(), placeCall(print.id, A)), A).content).toMatchObject({ mode: 'whole' });
  });

  it('scales a digital photo until it just covers', () => {
    const print = buildPrint({ marks: { digital: true } });
    const doc = commandsWith([print]).after(oneMat(), placeCall(print.id, A));
    // 2 5/8 in high and one and a half times as wide; 5/16 in of it is too much, cut at the nearest marks.
    expect(matIn(doc, A).content).toEqual(printContent(print, { scaledWidth: inches(2, 5 / 8) * 1.5, x: 3 * MARK, y: 0 }));
  });

  it('turns a print that has no up where it suits the mat better so, and only such a print', () => {
    const size = { paperWidth: inches(4), paperHeight: inches(6) };
    const [turnable, upright] = [buildPrint({ ...size, marks: { noUp: true } }), buildPrint(size)];
    const commands = commandsWith([turnable, upright]);
    expect(matIn(commands.after(oneMat(), placeCall(turnable.id, A)), A).content).toMatchObject({ turn: 1 });
    expect(matIn(commands.after(oneMat({ w: 6, h: 8 }), placeCall(turnable.id, A)), A).content).toMatchObject({ turn: 0 });
    expect(matIn(commands.after(oneMat(), placeCall(upright.id, A)), A).content).toMatchObject({ turn: 0 });
  });

  it('prefers the turn that holds the keep zone', () => {
    // Upright the window is 2 5/8 in high, too low for a zone of 3 in; turned it is 3 5/8 in.
    const print = buildPrint({ paperWidth: inches(6), paperHeight: inches(6), marks: { noUp: true }, keepZone: { x: 200, y: 100, width: 100, height: 300 } });
    expect(matIn(commandsWith([print]).after(oneMat(), placeCall(print.id, A)), A).content).toMatchObject({ turn: 1 });
  });

  it('says why where it cannot be', () => {
    const print = buildPrint();
    const commands = commandsWith([print]);
    expect(commands.whyNot(oneMat(), placeCall(print.id, B))).toBe('no-such-mat');
    expect(commands.whyNot(oneMat(), placeCall(buildPrint().id, A))).toBe('no-such-print');
    expect(commands.whyNot(oneMat({ h: 1, reveal: inches(1 / 4) }), placeCall(print.id, A))).toBe('no-room-for-photo');
  });
});

describe('moving a print', () => {
  const print = buildPrint();
  const other = buildPrint();
  const move = { id: 'prints.move', args: { fromMatId: A, toMatId: B } } as const;
  const two = (onA: Parameters<typeof buildMat>[0], onB: Parameters<typeof buildMat>[0]): SpreadDocument =>
    buildSpread({ mats: [buildMat({ id: A, w: 8, h: 6, ...onA }), buildMat({ id: B, x: 10, w: 10, h: 6, ...onB })] });

  it('leaves its old mat bare', () => {
    const doc = commandsWith([print]).after(two({ content: printContent(print) }, {}), move);
    expect(matIn(doc, A).content).toEqual({ kind: 'bare' });
    expect(matIn(doc, B).content).toMatchObject({ printId: print.id });
  });

  it('changes places with the print that lies there, each fitted to its new mat', () => {
    const commands = commandsWith([print, other]);
    const start = commands.after(two({}, {}), placeCall(print.id, A), placeCall(other.id, B));
    const doc = commands.after(start, move);
    expect(commands.photoOn(doc, B)).toMatchObject({ printId: print.id, window: { x: 11 * MARK, width: inches(4, 5 / 8) } });
    expect(commands.photoOn(doc, A)).toMatchObject({ printId: other.id, window: { x: 19 * MARK, width: inches(3, 5 / 8) } });
    expect(commands.after(doc, move)).toEqual(start);
  });

  it('keeps a window that was slid about the same middle', () => {
    const commands = commandsWith([print]);
    const doc = commands.after(two({ content: printContent(print, { x: 10 * MARK, y: 2 * MARK }) }, {}), move);
    // The photo is 1 in (16 marks) wider on the new mat.
    expect(matIn(doc, B).content).toMatchObject({ x: 2 * MARK, y: 2 * MARK });
  });

  it('takes lettering along where it changes places with it', () => {
    const lettering = { kind: 'lettering', text: 'Harbour day', color: '#222222', letterHeight: inches(1) } as const;
    const doc = commandsWith([print]).after(two({ content: printContent(print) }, { content: lettering }), move);
    expect(matIn(doc, A).content).toEqual(lettering);
    expect(matIn(doc, B).content).toMatchObject({ kind: 'print', printId: print.id });
  });

  it('gives a split print a new picture as a whole, and takes the old one out', () => {
    const { mats, group } = buildPanes(other, [buildMat({ id: B, x: 10, w: 5, h: 6 }), buildMat({ id: C, x: 15, w: 5, h: 6 })]);
    const start = buildSpread({ mats: [buildMat({ id: A, w: 8, h: 6, content: printContent(print) }), ...mats], panes: [group] });
    const doc = commandsWith([print, other]).after(start, move);
    expect(doc.panes).toMatchObject([{ matIds: [B, C], content: { printId: print.id, mode: 'window' } }]);
    expect(matIn(doc, A).content).toMatchObject({ kind: 'print', printId: other.id });
  });

  it('does not put lettering on panes', () => {
    const { mats, group } = buildPanes(other, [buildMat({ id: B, x: 10 }), buildMat({ id: C, x: 15 })]);
    const paper = { kind: 'paper', pattern: 'dot', color: '#222222', ground: '#ffffff' } as const;
    const start = buildSpread({ mats: [buildMat({ id: A, content: paper }), ...mats], panes: [group] });
    expect(commandsWith([other]).whyNot(start, move)).toBe('not-for-prints');
  });

  it('does nothing from one pane to another of the same print', () => {
    const { mats, group } = buildPanes(other, [buildMat({ id: A }), buildMat({ id: B, x: 10 })]);
    expect(commandsWith([other]).whyNot(buildSpread({ mats, panes: [group] }), move)).toBe('nothing-to-do');
  });
});

describe('lifting a print', () => {
  it('puts it back to the table, panes with their whole picture', () => {
    const [print, split] = [buildPrint(), buildPrint()];
    const { mats, group } = buildPanes(split, [buildMat({ id: B, x: 10 }), buildMat({ id: C, x: 15 })]);
    const start = buildSpread({ mats: [buildMat({ id: A, content: printContent(print) }), ...mats], panes: [group] });
    const doc = commandsWith([print, split]).after(start, { id: 'prints.lift', args: { matIds: [A, C] } });
    expect(matIn(doc, A).content).toEqual({ kind: 'bare' });
    expect(doc.panes[0]!.content).toBe(null);
    expect([...doc.table].sort()).toEqual([print.id, split.id].sort());
  });
});

describe('the table', () => {
  const print = buildPrint();
  it('lists a print once', () => {
    const doc = commandsWith([print]).after(buildSpread(), { id: 'table.add', args: { printIds: [print.id, print.id] } }, { id: 'table.add', args: { printIds: [print.id] } });
    expect(doc.table).toEqual([print.id]);
  });

  it('lets a print go only when it lies on no mat', () => {
    const commands = commandsWith([print]);
    const remove = { id: 'table.remove', args: { printIds: [print.id] } } as const;
    const placed = commands.after(oneMat(), placeCall(print.id, A));
    expect(commands.whyNot(placed, remove)).toBe('still-placed');
    expect(commands.after(placed, { id: 'prints.lift', args: { matIds: [A] } }, remove).table).toEqual([]);
  });
});
