import { describe, expect, it } from 'vitest';
import type { CommandCall } from '#shared/commands/calls';
import { inches } from '#shared/model/length';
import type { Mat, SpreadDocument } from '#shared/model/spread';
import { buildMat, buildPrint, buildSpread, matIdOf, printContent } from '../../support/builders';
import { commandsWith, matIn } from '../../support/command-driver';

const A = matIdOf(1);
const B = matIdOf(2);
const C = matIdOf(3);
const commands = commandsWith();
const spread = (...mats: Mat[]): SpreadDocument => buildSpread({ mats });
const cellsOf = (mat: Mat): readonly (string | number)[] => [mat.page, mat.x, mat.y, mat.w, mat.h];

describe('adding a mat', () => {
  const add = (args: object = {}): CommandCall => ({ id: 'mats.add', args: { page: 'left', x: 0, y: 0, w: 3, h: 2, ...args } });

  it("takes the scheme's main colour, or the colour of most mats", () => {
    const start = spread(buildMat({ x: 8, color: '#111111' }), buildMat({ x: 12, color: '#222222' }), buildMat({ x: 16, color: '#222222' }));
    expect(commands.after(start, add()).mats.find((mat) => mat.x === 0)?.color).toBe('#222222');
  });

  it('puts one that is laid over on top of all, and any other under those', () => {
    const laid = buildMat({ id: A, laidOver: true, z: 0 });
    const doc = commands.after(spread(laid), add({ x: 10 }), add({ laidOver: true }));
    expect(doc.mats.map((mat) => [mat.laidOver, mat.z])).toEqual([[false, -1], [true, 0], [true, 1]]);
  });

  it.each([
    ['off the page', { x: 20 }, 'off-page'],
    ['onto another mat', { x: 7 }, 'onto-another-mat'],
    ['with an empty name', { content: { kind: 'embellishment', name: ' ', color: '#222222' } }, 'content-does-not-fit'],
    ['as a pane', { content: { kind: 'pane', groupId: A } }, 'not-for-prints'],
  ])('is refused %s', (_name, args, reason) => {
    expect(commands.whyNot(spread(buildMat({ x: 8 })), add(args))).toBe(reason);
  });

  it('is refused on a page that is not there', () => {
    const start = buildSpread({ pages: { left: null, right: { color: '#ffffff' } } });
    expect(commands.whyNot(start, add())).toBe('no-such-page');
  });

  it('ends at 160 mats', () => {
    const mats = Array.from({ length: 160 }, (_, i) => buildMat({ page: 'right', x: i % 22, y: Math.floor(i / 22), w: 1, h: 1 }));
    expect(commands.whyNot(spread(...mats), add())).toBe('spread-full');
    expect(commands.whyNot(spread(...mats.slice(1)), add())).toBe(null);
  });
});

describe('duplicating a mat', () => {
  const duplicate: CommandCall = { id: 'mats.duplicate', args: { matId: A } };
  const copyIn = (doc: SpreadDocument): Mat => doc.mats.find((mat) => mat.id !== A && mat.id !== B)!;

  it.each([
    ['to its right', [], ['left', 4, 0]],
    ['below it, where the right is taken', [buildMat({ id: B, x: 4, w: 18, h: 22 })], ['left', 0, 4]],
    ['on the other page, where its own is full', [buildMat({ id: B, x: 4, w: 18, h: 22 }), buildMat({ id: C, y: 4, h: 18 })], ['right', 0, 0]],
  ])('puts the copy %s', (_name, others, place) => {
    const doc = commands.after(spread(buildMat({ id: A }), ...others), duplicate);
    const copy = doc.mats.find((mat) => ![A, B, C].includes(mat.id))!;
    expect(cellsOf(copy).slice(0, 3)).toEqual(place);
  });

  it('copies lettering, but neither the print nor the focal mark', () => {
    const lettering = { kind: 'lettering', text: 'June', color: '#222222', letterHeight: inches(1) } as const;
    expect(copyIn(commands.after(spread(buildMat({ id: A, content: lettering })), duplicate)).content).toEqual(lettering);
    const print = buildPrint();
    const copy = copyIn(commands.after(spread(buildMat({ id: A, focal: true, content: printContent(print) })), duplicate));
    expect(copy).toMatchObject({ focal: false, content: { kind: 'bare' } });
  });

  it('says when no page has room', () => {
    const start = buildSpread({ pages: { left: { color: '#ffffff' }, right: null }, mats: [buildMat({ id: A, w: 22, h: 12 })] });
    expect(commands.whyNot(start, duplicate)).toBe('no-free-place');
  });
});

describe('moving mats', () => {
  const move = (matIds: string[], dx: number, dy: number, page?: 'left' | 'right'): CommandCall => ({ id: 'mats.move', args: { matIds, dx, dy, page } });

  it('goes by whole steps', () => {
    expect(cellsOf(matIn(commands.after(spread(buildMat({ id: A })), move([A], 1.6, 0.4)), A))).toEqual(['left', 2, 0, 4, 4]);
  });

  it('stops at the rim, all together', () => {
    const doc = commands.after(spread(buildMat({ id: A }), buildMat({ id: B, x: 6, y: 6 })), move([A, B], 99, -5));
    expect([matIn(doc, A), matIn(doc, B)].map(({ x, y }) => [x, y])).toEqual([[12, 0], [18, 6]]);
  });

  it('never goes onto another mat, unless it is laid over', () => {
    const start = spread(buildMat({ id: A }), buildMat({ id: B, x: 6 }));
    expect(commands.whyNot(start, move([A], 3, 0))).toBe('onto-another-mat');
    const laid = spread(buildMat({ id: A, laidOver: true }), buildMat({ id: B, x: 6 }));
    expect(matIn(commands.after(laid, move([A], 3, 0)), A).x).toBe(3);
  });

  it('lets two mats pass each other as one', () => {
    const doc = commands.after(spread(buildMat({ id: A }), buildMat({ id: B, x: 4 })), move([A, B], 4, 0));
    expect([matIn(doc, A).x, matIn(doc, B).x]).toEqual([4, 8]);
  });

  it('goes to the other page, where a focal gives its mark up to the one there', () => {
    const doc = commands.after(spread(buildMat({ id: A, focal: true }), buildMat({ id: B, page: 'right', x: 8, focal: true })), move([A], 0, 0, 'right'));
    expect(matIn(doc, A)).toMatchObject({ page: 'right', focal: false });
    expect(matIn(doc, B).focal).toBe(true);
  });
});

describe('resizing a mat', () => {
  const resize = (x: number, y: number, w: number, h: number): CommandCall => ({ id: 'mats.resize', args: { matId: A, x, y, w, h } });

  it.each([
    ['to whole steps', [0.4, 0, 4.6, 4], [0, 0, 5, 4]],
    ['to a step at least', [4, 4, -3, 0], [4, 4, 1, 1]],
    ['no further than the right rim', [18, 0, 9, 4], [18, 0, 4, 4]],
    ['no further than the left rim, its right side staying where it is', [-3, 0, 7, 4], [0, 0, 4, 4]],
  ] as const)('goes %s', (_name, [x, y, w, h], cells) => {
    const doc = commands.after(spread(buildMat({ id: A, x: 10, y: 10, w: 2, h: 2 })), resize(x, y, w, h));
    expect(cellsOf(matIn(doc, A)).slice(1)).toEqual(cells);
  });

  it('stops at a neighbour', () => {
    expect(commands.whyNot(spread(buildMat({ id: A }), buildMat({ x: 4 })), resize(0, 0, 5, 4))).toBe('onto-another-mat');
  });

  it("keeps a die's true size while it fits", () => {
    const start = spread(buildMat({ id: A, trueSize: { width: inches(1, 1 / 2), height: inches(1) } }));
    expect(matIn(commands.after(start, resize(0, 0, 3, 2)), A).trueSize).toEqual({ width: inches(1, 1 / 2), height: inches(1) });
    expect(matIn(commands.after(start, resize(0, 0, 2, 2)), A).trueSize).toBe(null);
  });
});

describe('mirroring and turning', () => {
  it('mirrors places within their own box, never pictures', () => {
    const print = buildPrint();
    const content = printContent(print, { x: 254, y: 508 });
    const doc = commands.after(
      spread(buildMat({ id: A, x: 2, w: 6, content }), buildMat({ id: B, x: 9, y: 5, w: 3 })),
      { id: 'mats.mirror', args: { matIds: [A, B], axis: 'horizontal' } },
    );
    expect([matIn(doc, A).x, matIn(doc, B).x]).toEqual([6, 2]);
    expect(matIn(doc, A).content).toEqual(content);
    expect(matIn(commands.after(doc, { id: 'mats.mirror', args: { matIds: [A, B], axis: 'vertical' } }), B).y).toBe(0);
  });

  it('turns a mat about its top-left corner, but keeps it on the page', () => {
    const turn: CommandCall = { id: 'mats.turn', args: { matId: A } };
    expect(cellsOf(matIn(commands.after(spread(buildMat({ id: A, x: 1, y: 2, w: 6, h: 3 })), turn), A))).toEqual(['left', 1, 2, 3, 6]);
    expect(cellsOf(matIn(commands.after(spread(buildMat({ id: A, x: 0, y: 18, w: 6, h: 3 })), turn), A))).toEqual(['left', 0, 16, 3, 6]);
    expect(commands.whyNot(spread(buildMat({ id: A })), turn)).toBe('nothing-to-do');
  });

  it('turns a print that has no up with its mat', () => {
    const print = buildPrint({ marks: { noUp: true } });
    const start = spread(buildMat({ id: A, w: 8, h: 6, content: printContent(print) }));
    expect(matIn(commandsWith([print]).after(start, { id: 'mats.turn', args: { matId: A } }), A).content).toMatchObject({ turn: 1 });
  });
});

describe('splitting and merging', () => {
  const split = (columns: number, rows: number): CommandCall => ({ id: 'mats.split', args: { matId: A, columns, rows } });

  it('makes a split print of a mat with a print, and shows the same part of it', () => {
    const print = buildPrint();
    const driver = commandsWith([print]);
    const start = spread(buildMat({ id: A, w: 8, h: 6, content: printContent(print, { x: 2540, y: 1270 }) }));
    const doc = driver.after(start, split(2, 1));
    expect(doc.mats.map(({ x, w }) => [x, w])).toEqual([[0, 4], [4, 4]]);
    expect(doc.panes).toMatchObject([{ content: { printId: print.id, x: 2540, y: 1270, run: 'behind' } }]);
    const merged = driver.after(doc, { id: 'mats.merge', args: { matIds: doc.mats.map((mat) => mat.id) } });
    expect(merged.panes).toEqual([]);
    expect(merged.mats).toMatchObject([{ x: 0, w: 8, h: 6, content: { kind: 'print', x: 2540, y: 1270 } }]);
  });

  it('shares steps out as evenly as they go', () => {
    const doc = commands.after(spread(buildMat({ id: A, w: 7, h: 3 })), split(3, 2));
    expect(doc.mats.map(({ w }) => w).sort()).toEqual([2, 2, 2, 2, 3, 3]);
    expect(doc.mats.reduce((sum, { w, h }) => sum + w * h, 0)).toBe(21);
    expect(matIn(doc, A)).toMatchObject({ x: 0, y: 0 });
  });

  it('leaves lettering and the focal mark on the first piece', () => {
    const lettering = { kind: 'lettering', text: 'June', color: '#222222', letterHeight: inches(1) } as const;
    const doc = commands.after(spread(buildMat({ id: A, focal: true, content: lettering })), split(1, 2));
    expect(doc.mats.map((mat) => [mat.y, mat.focal, mat.content.kind])).toEqual(expect.arrayContaining([[0, true, 'lettering'], [2, false, 'bare']]));
  });

  it('adds panes to the group where a pane is split', () => {
    const print = buildPrint();
    const driver = commandsWith([print]);
    const doc = driver.after(spread(buildMat({ id: A, w: 8, h: 6, content: printContent(print) })), split(2, 1), split(1, 2));
    expect(doc.panes).toMatchObject([{ matIds: { length: 3 } }]);
  });

  it.each([
    ['more columns than steps', split(5, 1), 'too-small-to-split'],
    ['no columns', split(0, 1), 'too-small-to-split'],
    ['one piece', split(1, 1), 'nothing-to-do'],
  ] as const)('is refused for %s', (_name, call, reason) => {
    expect(commands.whyNot(spread(buildMat({ id: A })), call)).toBe(reason);
  });

  it('merges mats into the largest that carries something, and sends the other print back', () => {
    const [first, second] = [buildPrint(), buildPrint()];
    const start = spread(buildMat({ id: A, content: printContent(first) }), buildMat({ id: B, x: 4, w: 6, content: printContent(second) }));
    const doc = commandsWith([first, second]).after(start, { id: 'mats.merge', args: { matIds: [A, B] } });
    expect(doc.mats).toMatchObject([{ id: B, x: 0, w: 10, h: 4, content: { printId: second.id } }]);
    expect(doc.table).toEqual([first.id]);
  });

  it.each([
    ['do not fill a rectangle', [buildMat({ id: A }), buildMat({ id: B, x: 4, h: 3 })], 'not-a-rectangle'],
    ['stand apart', [buildMat({ id: A }), buildMat({ id: B, x: 5 })], 'not-a-rectangle'],
    ['lie on two pages', [buildMat({ id: A }), buildMat({ id: B, page: 'right' })], 'on-two-pages'],
  ] as const)('does not merge mats that %s', (_name, mats, reason) => {
    expect(commands.whyNot(spread(...mats), { id: 'mats.merge', args: { matIds: [A, B] } })).toBe(reason);
  });
});

describe('how a mat looks', () => {
  it('has one focal on a page: the last declared', () => {
    const start = spread(buildMat({ id: A, focal: true }), buildMat({ id: B, x: 8 }), buildMat({ id: C, page: 'right', focal: true }));
    const doc = commands.after(start, { id: 'mats.setFocal', args: { matId: B, focal: true } });
    expect([A, B, C].map((id) => matIn(doc, id).focal)).toEqual([false, true, true]);
  });

  it('goes on top when it is laid over, and back only where nothing is under it', () => {
    const start = spread(buildMat({ id: A }), buildMat({ id: B, x: 8, z: 4 }));
    const laid = commands.after(start, { id: 'mats.setLaidOver', args: { matIds: [A], laidOver: true } }, { id: 'mats.move', args: { matIds: [A], dx: 8, dy: 0 } });
    expect(laid.mats.map((mat) => mat.id)).toEqual([B, A]);
    expect(commands.whyNot(laid, { id: 'mats.setLaidOver', args: { matIds: [A], laidOver: false } })).toBe('onto-another-mat');
  });

  it('is given text as the server will store it', () => {
    const content = { kind: 'journaling', text: 'Cafe\u0301\u202e,\tnine o’clock', color: '#222222', lineHeight: 1000 } as const;
    const doc = commands.after(spread(buildMat({ id: A })), { id: 'mats.setContent', args: { matId: A, content } });
    expect(matIn(doc, A).content).toMatchObject({ text: 'Café,nine o’clock' });
    expect(commands.whyNot(doc, { id: 'mats.setContent', args: { matId: A, content: { ...content, text: 'x'.repeat(4001) } } })).toBe('content-does-not-fit');
  });

  it('has no true size larger than its place', () => {
    const setTrueSize = (width: number): CommandCall => ({ id: 'mats.setTrueSize', args: { matId: A, trueSize: { width, height: inches(1) } } });
    expect(commands.whyNot(spread(buildMat({ id: A })), setTrueSize(inches(2)))).toBe(null);
    expect(commands.whyNot(spread(buildMat({ id: A })), setTrueSize(inches(2) + 1))).toBe('true-size-too-large');
  });
});
