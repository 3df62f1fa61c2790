import { describe, expect, it } from 'vitest';
import type { CommandCall } from '#shared/commands/calls';
import { inches } from '#shared/model/length';
import type { Mat, Scheme, SpreadDocument } from '#shared/model/spread';
import { buildMat, buildPanes, buildPrint, buildSpread, matIdOf, printContent } from '../../support/builders';
import { commandsWith, matIn, placeCall } from '../../support/command-driver';

const A = matIdOf(1);
const B = matIdOf(2);
const C = matIdOf(3);
const print = buildPrint();
const commands = commandsWith([print]);
const spread = (...mats: Mat[]): SpreadDocument => buildSpread({ mats });
/** Two mats side by side; with gap and reveals their photos span 3 5/8 × 2 5/8 in. */
const pair = (): Mat[] => [buildMat({ id: A, w: 4, h: 6 }), buildMat({ id: B, x: 4, w: 4, h: 6 })];
const group = (printId: string | null, matIds = [A, B]): CommandCall => ({ id: 'panes.group', args: { matIds, printId } });

describe('a split print', () => {
  it('has its window over all panes, centred', () => {
    const doc = commands.after(spread(...pair()), group(print.id));
    expect(doc.panes).toMatchObject([{ matIds: [A, B], content: { printId: print.id, x: (inches(6) - inches(3, 5 / 8)) / 2, run: 'behind' } }]);
    expect(doc.table).toEqual([print.id]);
    const [left, right] = [commands.photoOn(doc, A), commands.photoOn(doc, B)];
    // The gap (1/8 in) and two reveals (1/8 in each) swallow 3/8 in of the picture.
    expect(right.window.x - (left.window.x + left.window.width)).toBe(inches(3 / 8));
  });

  it('loses nothing when it is spread apart', () => {
    const doc = commands.after(spread(...pair()), group(print.id));
    const apart = commands.after(doc, { id: 'panes.setRun', args: { groupId: doc.panes[0]!.id, run: 'apart' } });
    const [left, right] = [commands.photoOn(apart, A), commands.photoOn(apart, B)];
    expect(right.window.x).toBe(left.window.x + left.window.width);
    expect(left.window.x).toBe(Math.round((inches(6) - inches(3, 1 / 4)) / 2 / 254) * 254);
  });

  it('takes any print that is dropped on one of its panes', () => {
    const doc = commands.after(spread(...pair()), group(null), placeCall(print.id, B));
    expect(doc.panes[0]!.content).toMatchObject({ printId: print.id });
    expect(matIn(doc, B).content.kind).toBe('pane');
  });

  it('stays spread apart when its picture changes', () => {
    const panes = buildPanes(buildPrint(), pair(), { run: 'apart' });
    const doc = commands.after(buildSpread({ mats: panes.mats, panes: [panes.group] }), placeCall(print.id, A));
    expect(doc.panes[0]!.content).toMatchObject({ printId: print.id, run: 'apart' });
  });

  it('keeps the print that one of its mats carried', () => {
    const start = spread(pair()[0]!, { ...pair()[1]!, content: printContent(print) });
    expect(commands.after(start, group(null)).panes[0]!.content).toMatchObject({ printId: print.id });
  });

  it('lists its panes as one reads, also after they were mirrored', () => {
    const doc = commands.after(spread(...pair()), group(print.id, [B, A]));
    expect(doc.panes[0]!.matIds).toEqual([A, B]);
    const mirrored = commands.after(doc, { id: 'mats.mirror', args: { matIds: [A, B], axis: 'horizontal' } });
    expect(mirrored.panes[0]!.matIds).toEqual([B, A]);
    expect(commands.photoOn(mirrored, B).window).toEqual(commands.photoOn(doc, A).window);
  });

  it('becomes a print on the last pane when the others are deleted', () => {
    const doc = commands.after(spread(...pair()), group(print.id));
    const part = commands.photoOn(doc, B).window;
    const last = commands.after(doc, { id: 'mats.delete', args: { matIds: [A] } });
    expect(last.panes).toEqual([]);
    expect(commands.photoOn(last, B).window.x).toBe(part.x);
  });

  it('goes to its largest pane when it is ungrouped', () => {
    const start = spread(buildMat({ id: A }), buildMat({ id: B, x: 4, w: 6 }), buildMat({ id: C, y: 4, w: 6 }));
    const grouped = commands.after(start, group(print.id, [A, B, C]));
    const doc = commands.after(grouped, { id: 'panes.ungroup', args: { groupId: grouped.panes[0]!.id } });
    expect(doc.panes).toEqual([]);
    expect(doc.mats.map((mat) => [mat.id, mat.content.kind])).toEqual([[A, 'bare'], [B, 'print'], [C, 'bare']]);
  });

  it('moves to the other page as a whole', () => {
    const doc = commands.after(spread(...pair()), group(print.id), { id: 'mats.move', args: { matIds: [A], dx: 2, dy: 0, page: 'right' } });
    expect([matIn(doc, A), matIn(doc, B)].map(({ page, x }) => [page, x])).toEqual([['right', 2], ['right', 6]]);
  });

  it('loses a pane that is given something else to carry', () => {
    const third = buildMat({ id: C, x: 8, w: 4, h: 6 });
    const doc = commands.after(spread(...pair(), third), group(print.id, [A, B, C]), { id: 'mats.setContent', args: { matId: C, content: { kind: 'bare' } } });
    expect(doc.panes[0]!.matIds).toEqual([A, B]);
  });

  it.each([
    ['one mat', [A], 'too-few-mats'],
    ['mats of both pages', [A, C], 'on-two-pages'],
  ])('is not made of %s', (_name, ids, reason) => {
    expect(commands.whyNot(spread(...pair(), buildMat({ id: C, page: 'right' })), group(null, ids))).toBe(reason);
  });

  it('takes panes out of another group, which keeps its print on what is left', () => {
    const panes = buildPanes(print, pair());
    const start = buildSpread({ mats: [...panes.mats, buildMat({ id: C, x: 8, w: 4, h: 6 })], panes: [panes.group] });
    const doc = commands.after(start, group(null, [B, C]));
    expect(doc.panes.map(({ matIds }) => matIds)).toEqual([[B, C]]);
    expect(matIn(doc, A).content).toMatchObject({ kind: 'print', printId: print.id });
  });
});

describe('whole pages', () => {
  const onLeft = buildMat({ id: A, x: 2, y: 1, w: 6, h: 3, content: printContent(print, { x: 254, y: 508 }) });

  it('are mirrored about their middle, without touching pictures', () => {
    const doc = commands.after(spread(onLeft), { id: 'pages.mirror', args: { page: 'left', axis: 'horizontal' } });
    expect(matIn(doc, A)).toEqual({ ...onLeft, x: 14 });
    expect(matIn(commands.after(doc, { id: 'pages.mirror', args: { page: 'left', axis: 'vertical' } }), A).y).toBe(18);
  });

  it('are swapped with their colours', () => {
    const start = buildSpread({ pages: { left: { color: '#111111' }, right: { color: '#eeeeee' } }, mats: [onLeft] });
    const doc = commands.after(start, { id: 'pages.swap', args: {} });
    expect(doc.pages).toEqual({ left: { color: '#eeeeee' }, right: { color: '#111111' } });
    expect(matIn(doc, A)).toEqual({ ...onLeft, page: 'right' });
    expect(commands.after(doc, { id: 'pages.swap', args: {} })).toEqual(start);
  });

  it('are not swapped where there is one only', () => {
    expect(commands.whyNot(buildSpread({ pages: { left: null, right: { color: '#ffffff' } } }), { id: 'pages.swap', args: {} })).toBe('single-page');
  });

  it('start from a sketch, and the prints on them go back to the table', () => {
    const mats = [
      { x: 0, y: 0, w: 8, h: 8, focal: true },
      { x: 8, y: 0, w: 4, h: 4, paneGroup: 1 },
      { x: 12, y: 0, w: 4, h: 4, paneGroup: 1 },
      { x: 0, y: 8, w: 4, h: 4, paneGroup: 2 },
    ];
    const doc = commands.after(spread(onLeft, buildMat({ id: B, page: 'right' })), { id: 'pages.useSketch', args: { page: 'left', mats, color: '#7a1f2b' } });
    expect(doc.mats.filter((mat) => mat.page === 'left').map(({ x, focal, color, content }) => [x, focal, color, content.kind])).toEqual([
      [0, true, '#7a1f2b', 'bare'],
      [8, false, '#7a1f2b', 'pane'],
      [12, false, '#7a1f2b', 'pane'],
      [0, false, '#7a1f2b', 'bare'],
    ]);
    expect(doc.panes).toMatchObject([{ matIds: { length: 2 }, content: null }]);
    expect(doc.table).toEqual([print.id]);
    expect(matIn(doc, B).page).toBe('right');
  });

  it('do not take a sketch that is larger than they are', () => {
    const call: CommandCall = { id: 'pages.useSketch', args: { page: 'left', mats: [{ x: 0, y: 0, w: 23, h: 2 }], color: '#7a1f2b' } };
    expect(commands.whyNot(buildSpread(), call)).toBe('off-page');
  });
});

describe('a scheme', () => {
  const color = { hex: '#d8c3a5', printIds: [] };
  const scheme: Scheme = { character: 'echo', colors: { base: color, main: color, second: color, accent: color } };

  it('colours pages and mats in one step, and leaves out an inner mat that has no room', () => {
    const start = spread(buildMat({ id: A, w: 8, h: 6, content: printContent(print) }), buildMat({ id: B, x: 8, w: 1, h: 1, content: printContent(print) }));
    const inner = { color: '#ffffff', reveal: inches(1 / 16) };
    const doc = commands.after(start, {
      id: 'scheme.apply',
      args: { scheme, pageColor: '#f4efe6', matColors: { [A]: '#1f4e5f', [B]: '#7a1f2b' }, inners: { [A]: inner, [B]: inner } },
    });
    expect(doc.scheme).toEqual(scheme);
    expect(doc.pages).toEqual({ left: { color: '#f4efe6' }, right: { color: '#f4efe6' } });
    expect(matIn(doc, A)).toMatchObject({ color: '#1f4e5f', inner });
    expect(matIn(doc, B)).toMatchObject({ color: '#7a1f2b', inner: null });
  });
});
