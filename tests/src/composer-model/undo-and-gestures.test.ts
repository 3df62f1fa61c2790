import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { CommandCall } from '#shared/commands/calls';
import type { SpreadDocument } from '#shared/model/spread';
import { buildMat, buildPrint, buildSpread, matIdOf } from '../../support/builders';
import { openTab } from '../../support/composer';
import { callsOn, PRINTS, spreads } from '../../support/spread-arbitraries';

const A = matIdOf(1);
const B = matIdOf(2);
const twoMats = (): SpreadDocument => buildSpread({ mats: [buildMat({ id: A, x: 0, y: 0 }), buildMat({ id: B, x: 10, y: 0 })] });

const move = (matId: string, dx: number, dy = 0): CommandCall => ({ id: 'mats.move', args: { matIds: [matId], dx, dy } });
const matIn = (doc: SpreadDocument, id: string) => doc.mats.find((mat) => mat.id === id)!;

describe('undo and redo', { timeout: 30_000 }, () => {
  it('takes back and brings back a step', () => {
    const { store } = openTab({ doc: twoMats() });
    const before = store.getState().doc;
    expect(store.getState().run(move(A, 3))).toBe(true);
    const after = store.getState().doc;
    expect(matIn(after, A).x).toBe(3);
    expect(store.getState()).toMatchObject({ canUndo: true, undoCommand: 'mats.move', canRedo: false });
    store.getState().undo();
    expect(store.getState().doc).toEqual(before);
    expect(store.getState()).toMatchObject({ canUndo: false, undoCommand: null, redoCommand: 'mats.move' });
    store.getState().redo();
    expect(store.getState().doc).toEqual(after);
  });

  it('forgets what was undone once something else is done', () => {
    const { store } = openTab({ doc: twoMats() });
    store.getState().run(move(A, 1));
    store.getState().undo();
    store.getState().run(move(B, 1));
    expect(store.getState().redo()).toBe(false);
    expect(matIn(store.getState().doc, A).x).toBe(0);
  });

  it('goes back to the very first document after any number of steps, and forward to the last', () => {
    fc.assert(
      fc.property(spreads.chain((doc) => fc.tuple(fc.constant(doc), fc.array(callsOn(doc), { maxLength: 12 }))), ([doc, calls]) => {
        const { store } = openTab({ doc, prints: PRINTS });
        for (const call of calls) store.getState().run(call);
        const last = store.getState().doc;
        while (store.getState().canUndo) expect(store.getState().undo()).toBe(true);
        expect(store.getState().doc).toEqual(doc);
        while (store.getState().canRedo) expect(store.getState().redo()).toBe(true);
        expect(store.getState().doc).toEqual(last);
      }),
      { numRuns: 150 },
    );
  });

  it('makes no step of a command that cannot be done', () => {
    const { store } = openTab({ doc: twoMats() });
    expect(store.getState().run(move(A, 9))).toBe(false);
    expect(store.getState().whyNot(move(A, 9))).toBe('onto-another-mat');
    expect(store.getState().canUndo).toBe(false);
  });

  it('leaves the selection out of undo, but drops mats that are gone from it', () => {
    const { store } = openTab({ doc: twoMats() });
    store.getState().run(move(A, 1));
    store.getState().select([A, B]);
    store.getState().undo();
    expect(store.getState().selection).toEqual([A, B]);
    store.getState().run({ id: 'mats.delete', args: { matIds: [B] } });
    expect(store.getState().selection).toEqual([A]);
  });

  it('changes nothing for somebody who may only look', () => {
    const { store } = openTab({ doc: twoMats(), mayEdit: false });
    expect(store.getState().run(move(A, 1))).toBe(false);
    const gesture = store.getState().beginGesture();
    expect(gesture.preview(move(A, 1))).toBe(false);
    expect(gesture.commit()).toBe(false);
    expect(matIn(store.getState().doc, A).x).toBe(0);
  });
});

describe('a drag', () => {
  it('shows each preview from where it began, and is one step', () => {
    const { store } = openTab({ doc: twoMats() });
    const gesture = store.getState().beginGesture();
    for (const dx of [1, 2, 3]) gesture.preview(move(A, dx));
    expect(matIn(store.getState().doc, A).x).toBe(3);
    expect(gesture.commit()).toBe(true);
    store.getState().undo();
    expect(matIn(store.getState().doc, A).x).toBe(0);
    expect(store.getState().canUndo).toBe(false);
  });

  it('keeps the redo stack when it is cancelled', () => {
    const { store } = openTab({ doc: twoMats() });
    store.getState().run(move(B, 2));
    store.getState().undo();
    const gesture = store.getState().beginGesture();
    gesture.preview(move(A, 4));
    gesture.cancel();
    expect(matIn(store.getState().doc, A).x).toBe(0);
    store.getState().redo();
    expect(matIn(store.getState().doc, B).x).toBe(12);
  });

  it('makes no step when the mat is put down where it was taken up', () => {
    const { store } = openTab({ doc: twoMats() });
    const gesture = store.getState().beginGesture();
    gesture.preview(move(A, 2));
    gesture.preview(move(A, 0));
    expect(gesture.commit()).toBe(false);
    expect(store.getState().canUndo).toBe(false);
  });

  it('leaves a mat at the edge of the one that it is dragged onto', () => {
    const { store } = openTab({ doc: twoMats() });
    const gesture = store.getState().beginGesture();
    expect(gesture.preview(move(A, 6))).toBe(true);
    expect(gesture.preview(move(A, 7))).toBe(false);
    expect(gesture.commit()).toBe(true);
    expect(matIn(store.getState().doc, A).x).toBe(6);
  });

  it('shows a print back where it was while it is over nothing', () => {
    const print = buildPrint();
    const { store } = openTab({ doc: twoMats(), prints: [print] });
    const gesture = store.getState().beginGesture();
    gesture.preview({ id: 'prints.place', args: { printId: print.id, matId: A } });
    expect(matIn(store.getState().doc, A).content.kind).toBe('print');
    gesture.preview([]);
    expect(matIn(store.getState().doc, A).content.kind).toBe('bare');
    expect(gesture.commit()).toBe(false);
  });

  it('joins several commands to one step', () => {
    const { store } = openTab({ doc: twoMats() });
    store.getState().run([move(A, 1), { id: 'mats.setColor', args: { matIds: [A], color: '#7a1f2b' } }]);
    expect(matIn(store.getState().doc, A)).toMatchObject({ x: 1, color: '#7a1f2b' });
    store.getState().undo();
    expect(matIn(store.getState().doc, A)).toMatchObject({ x: 0, color: '#1f4e5f' });
  });

  it('ends when something else is done', () => {
    const { store } = openTab({ doc: twoMats() });
    const gesture = store.getState().beginGesture();
    gesture.preview(move(A, 2));
    store.getState().run(move(B, 1));
    expect(gesture.commit()).toBe(false);
    expect(matIn(store.getState().doc, A).x).toBe(0);
    expect(matIn(store.getState().doc, B).x).toBe(11);
  });

  it('chooses the mat that was added', () => {
    const { store } = openTab();
    store.getState().run({ id: 'mats.add', args: { page: 'right', x: 2, y: 2, w: 3, h: 3 } });
    expect(store.getState().selection).toEqual(store.getState().doc.mats.map((mat) => mat.id));
  });
});

describe('edits by others', () => {
  it('come in under the hand during a drag, which goes on', async () => {
    const { store, server, clock } = openTab({ doc: twoMats() });
    store.getState().run({ id: 'pages.setColor', args: { pages: ['left'], color: '#d8c3a5' } });
    const gesture = store.getState().beginGesture();
    gesture.preview(move(A, 2));
    const before = matIn(server.doc, B);
    server.otherEdit({ [`mat/${B}`]: { before, after: { ...before, y: 9 } } });
    await clock.pass(1000);
    expect(matIn(store.getState().doc, A).x).toBe(2);
    expect(matIn(store.getState().doc, B).y).toBe(9);
    expect(gesture.commit()).toBe(true);
    await store.getState().flush();
    expect(store.getState().doc).toEqual(server.doc);
  });

  it('are not taken back by undo, and what they touched is no longer ours to undo', async () => {
    const { store, server, clock } = openTab({ doc: twoMats() });
    store.getState().run(move(A, 1));
    store.getState().run(move(B, 1));
    await clock.pass(1000);
    const before = matIn(server.doc, B);
    server.otherEdit({ [`mat/${B}`]: { before, after: { ...before, y: 5 } } });
    store.getState().run({ id: 'pages.setColor', args: { pages: ['left'], color: '#d8c3a5' } });
    await clock.pass(1000);
    while (store.getState().canUndo) store.getState().undo();
    expect(matIn(store.getState().doc, B)).toMatchObject({ x: 11, y: 5 });
    expect(matIn(store.getState().doc, A).x).toBe(0);
    await store.getState().flush();
    expect(store.getState().save.status).toBe('saved');
    expect(server.doc).toEqual(store.getState().doc);
  });

  it('let a step fall out of undo where taking it back would no longer fit', async () => {
    const { store, server, clock } = openTab({ doc: twoMats() });
    store.getState().run(move(A, 0, 10));
    await clock.pass(1000);
    const before = matIn(server.doc, B);
    server.otherEdit({ [`mat/${B}`]: { before, after: { ...before, x: 0 } } });
    store.getState().run({ id: 'pages.setColor', args: { pages: ['left'], color: '#d8c3a5' } });
    await clock.pass(1000);
    store.getState().undo();
    expect(store.getState().undo()).toBe(false);
    expect(matIn(store.getState().doc, A).y).toBe(10);
  });
});
