import { describe, expect, it } from 'vitest';
import type { CommandCall } from '#shared/commands/calls';
import { inches, millimetres } from '#shared/model/length';
import type { SpreadDocument } from '#shared/model/spread';
import { TRIM_SETTINGS_METRIC } from '#shared/model/trim-settings';
import { buildMat, buildPanes, buildPrint, buildSpread, formatOf, matIdOf, printContent } from '../../support/builders';
import { commandsWith, matIn, placeCall } from '../../support/command-driver';

const A = matIdOf(1);
const B = matIdOf(2);
const MARK = inches(1 / 16);
const slide = (x: number, y: number): CommandCall => ({ id: 'window.slide', args: { matId: A, x, y } });
const oneMat = (parts: Parameters<typeof buildMat>[0] = {}): SpreadDocument => buildSpread({ mats: [buildMat({ id: A, w: 8, h: 6, ...parts })] });

describe('sliding a window', () => {
  const print = buildPrint();
  const start = oneMat({ content: printContent(print) });

  it.each([
    ['to the nearest mark', 1000, 300, 4 * MARK, MARK],
    ['no further than the left and top edges', -9000, -1, 0, 0],
    ['no further than the right and bottom edges', 99_999, 99_999, 38 * MARK, 22 * MARK],
  ])('goes %s', (_name, x, y, atX, atY) => {
    expect(matIn(commandsWith([print]).after(start, slide(x, y)), A).content).toMatchObject({ x: atX, y: atY });
  });

  it('stays on the paper although its last mark is not at the edge', () => {
    const odd = buildPrint({ paperWidth: millimetres(130), paperHeight: millimetres(90) });
    const doc = commandsWith([odd]).after(oneMat({ content: printContent(odd) }), slide(99_999, 99_999));
    const { window } = commandsWith([odd]).photoOn(doc, A);
    expect(window.x % MARK).toBe(0);
    expect(window.x + window.width).toBeLessThanOrEqual(millimetres(130));
    expect(window.x + window.width).toBeGreaterThan(millimetres(130) - MARK);
  });

  it('follows a metric trimmer', () => {
    const doc = commandsWith([print], TRIM_SETTINGS_METRIC).after(start, slide(1000, 300));
    expect(matIn(doc, A).content).toMatchObject({ x: millimetres(6), y: millimetres(2) });
  });

  it('stays in the middle where the paper is too small, so that both sides lack the same', () => {
    const small = buildPrint({ paperWidth: inches(3), paperHeight: inches(4) });
    const doc = commandsWith([small]).after(oneMat({ content: printContent(small) }), slide(0, inches(1)));
    expect(matIn(doc, A).content).toMatchObject({ x: -5 * MARK, y: 16 * MARK });
  });

  it('moves the picture of all panes together', () => {
    const { mats, group } = buildPanes(print, [buildMat({ id: A, w: 4, h: 6 }), buildMat({ id: B, x: 4, w: 4, h: 6 })]);
    const doc = commandsWith([print]).after(buildSpread({ mats, panes: [group] }), slide(1000, 300));
    expect(doc.panes[0]!.content).toMatchObject({ x: 4 * MARK, y: MARK });
  });

  it('is not for a print that is mounted whole, nor for a bare mat', () => {
    expect(commandsWith([print]).whyNot(oneMat({ content: printContent(print, { mode: 'whole' }) }), slide(0, 0))).toBe('is-whole');
    expect(commandsWith([print]).whyNot(oneMat(), slide(0, 0))).toBe('no-print-there');
  });
});

describe('mounting whole', () => {
  const setWhole = (whole: boolean): CommandCall => ({ id: 'placement.setWhole', args: { matId: A, whole } });

  it('works for a print up to the size of its mat, and trims it again', () => {
    const print = buildPrint({ paperWidth: inches(3, 7 / 8), paperHeight: inches(2, 7 / 8) });
    const commands = commandsWith([print]);
    const start = commands.after(oneMat(), placeCall(print.id, A));
    const whole = commands.after(start, setWhole(true));
    expect(matIn(whole, A).content).toMatchObject({ mode: 'whole', turn: 0, scaledWidth: null });
    expect(commands.after(whole, setWhole(false))).toEqual(start);
  });

  it('is refused for a print that would hang over', () => {
    const print = buildPrint({ paperWidth: inches(3, 7 / 8) + 1, paperHeight: inches(2, 7 / 8) });
    const commands = commandsWith([print]);
    expect(commands.whyNot(commands.after(oneMat(), placeCall(print.id, A)), setWhole(true))).toBe('does-not-fit-whole');
  });

  it('is refused for panes', () => {
    const print = buildPrint();
    const { mats, group } = buildPanes(print, [buildMat({ id: A }), buildMat({ id: B, x: 4 })]);
    expect(commandsWith([print]).whyNot(buildSpread({ mats, panes: [group] }), setWhole(true))).toBe('whole-panes');
  });

  it('prints a digital photo as large as the photo holds', () => {
    const print = buildPrint({ marks: { digital: true } });
    const commands = commandsWith([print]);
    const doc = commands.after(oneMat(), placeCall(print.id, A), setWhole(true));
    expect(commands.photoOn(doc, A).rect).toMatchObject({ width: inches(3, 5 / 8), height: Math.round((inches(3, 5 / 8) * 2) / 3) });
  });
});

describe('turning and scaling', () => {
  const turn = (turns: 0 | 1 | 2 | 3): CommandCall => ({ id: 'placement.turn', args: { matId: A, turn: turns } });
  const scale = (scaledWidth: number): CommandCall => ({ id: 'placement.scale', args: { matId: A, scaledWidth } });

  it('turns a print that has no up, about the same spot of the picture', () => {
    const print = buildPrint({ paperWidth: inches(6), paperHeight: inches(6), marks: { noUp: true } });
    const commands = commandsWith([print]);
    const start = oneMat({ content: printContent(print, { x: 20 * MARK, y: 20 * MARK }) });
    const before = commands.photoOn(start, A).window;
    const after = commands.photoOn(commands.after(start, turn(1)), A).window;
    expect([after.width, after.height]).toEqual([before.height, before.width]);
    expect(after.x + after.width / 2).toBe(before.x + before.width / 2);
    expect(after.y + after.height / 2).toBe(before.y + before.height / 2);
  });

  it('never turns a print that has an up', () => {
    const print = buildPrint();
    expect(commandsWith([print]).whyNot(oneMat({ content: printContent(print) }), turn(2))).toBe('has-an-up');
  });

  it('never scales a printed photo', () => {
    const print = buildPrint();
    expect(commandsWith([print]).whyNot(oneMat({ content: printContent(print) }), scale(inches(5)))).toBe('not-digital');
  });

  it('scales a digital photo about its middle, never below what covers', () => {
    const print = buildPrint({ marks: { digital: true } });
    const commands = commandsWith([print]);
    const start = commands.after(oneMat(), placeCall(print.id, A));
    const large = commands.photoOn(commands.after(start, scale(inches(8))), A);
    expect(large.placement.scaledWidth).toBe(inches(8));
    expect(Math.abs(large.window.x + large.window.width / 2 - inches(4))).toBeLessThan(2 * MARK);
    expect(commands.after(start, scale(inches(8)), scale(1))).toMatchObject({ mats: [{ content: { scaledWidth: inches(2, 5 / 8) * 1.5 } }] });
  });
});

describe('a mat that changes its size', () => {
  const print = buildPrint();
  const resize = (w: number, h: number): CommandCall => ({ id: 'mats.resize', args: { matId: A, x: 0, y: 0, w, h } });

  it('keeps the middle of a window that was slid', () => {
    const doc = commandsWith([print]).after(oneMat({ content: printContent(print, { x: 10 * MARK, y: 6 * MARK }) }), resize(6, 6));
    // One inch (16 marks) narrower: the window begins half of that further in.
    expect(matIn(doc, A).content).toMatchObject({ x: 18 * MARK, y: 6 * MARK });
  });

  it('keeps a window on its keep zone that was centred there', () => {
    const zoned = buildPrint({ keepZone: { x: 100, y: 100, width: 100, height: 100 } });
    const commands = commandsWith([zoned]);
    const doc = commands.after(oneMat(), placeCall(zoned.id, A), resize(4, 4));
    expect(commands.photoOn(doc, A).window).toMatchObject({ x: 11 * MARK, y: 11 * MARK });
  });

  it('keeps the window on the paper as it grows', () => {
    const commands = commandsWith([print]);
    const doc = commands.after(oneMat({ content: printContent(print, { x: 38 * MARK, y: 22 * MARK }) }), resize(10, 8));
    const { window } = commands.photoOn(doc, A);
    expect(window.x + window.width).toBeLessThanOrEqual(print.paperWidth);
    expect(window.y + window.height).toBeLessThanOrEqual(print.paperHeight);
  });

  it('mounts the print whole when the photo outgrows it, and trims it again when it no longer fits', () => {
    const commands = commandsWith([print]);
    const large = commands.after(oneMat({ content: printContent(print) }), resize(14, 10));
    expect(matIn(large, A).content).toMatchObject({ mode: 'whole' });
    expect(matIn(commands.after(large, resize(8, 6)), A).content).toMatchObject({ mode: 'window', x: 19 * MARK, y: 11 * MARK });
  });

  it.each([
    ["the mat's reveal", { id: 'mats.setReveal', args: { matIds: [A], reveal: inches(1 / 4) } }],
    ["the spread's reveal", { id: 'spread.setReveal', args: { reveal: inches(1 / 4) } }],
    ['an inner mat', { id: 'mats.setInner', args: { matIds: [A], inner: { color: '#ffffff', reveal: inches(1 / 8) } } }],
    ['a true size', { id: 'mats.setTrueSize', args: { matId: A, trueSize: { width: inches(3, 5 / 8), height: inches(2, 5 / 8) } } }],
  ] satisfies [string, CommandCall][])('is one whose photo %s makes smaller', (_name, call) => {
    const commands = commandsWith([print]);
    const doc = commands.after(oneMat({ content: printContent(print, { x: 10 * MARK, y: 6 * MARK }) }), call);
    expect(commands.photoOn(doc, A).window).toEqual({ x: 12 * MARK, y: 8 * MARK, width: inches(3, 3 / 8), height: inches(2, 3 / 8) });
  });

  it('refuses a reveal that leaves no photo anywhere on the spread', () => {
    const commands = commandsWith([print]);
    const start = oneMat({ content: printContent(print) });
    expect(commands.whyNot(start, { id: 'spread.setReveal', args: { reveal: inches(1, 1 / 2) } })).toBe('no-room-for-photo');
    expect(commands.whyNot(start, { id: 'mats.setInner', args: { matIds: [A], inner: { color: '#ffffff', reveal: inches(2) } } })).toBe('no-room-for-photo');
  });

  it('is a mat on the rim of an edge-to-edge page', () => {
    const commands = commandsWith([print]);
    const start = buildSpread({ format: formatOf('12x12in-bleed'), mats: [buildMat({ id: A, x: 2, w: 8, h: 6, content: printContent(print, { x: 10 * MARK, y: 6 * MARK }) })] });
    const doc = commands.after(start, { id: 'mats.move', args: { matIds: [A], dx: -2, dy: 0 } });
    // The rim takes no half gap, so the photo is 1/16 in wider; half a mark more on the left goes to the nearest mark.
    expect(commands.photoOn(doc, A).window).toMatchObject({ x: 10 * MARK, width: inches(3, 11 / 16) });
  });
});
