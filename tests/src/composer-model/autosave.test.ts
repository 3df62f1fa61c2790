import { describe, expect, it } from 'vitest';
import type { CommandCall } from '#shared/commands/calls';
import { applyPatch } from '#shared/model/patch';
import type { SpreadDocument } from '#shared/model/spread';
import { buildMat, buildSpread, matIdOf } from '../../support/builders';
import { FakeServer, memoryStorage, openTab, settled, SPREAD_ID } from '../../support/composer';

const A = matIdOf(1);
const B = matIdOf(2);
const twoMats = (): SpreadDocument => buildSpread({ mats: [buildMat({ id: A, x: 0, y: 0 }), buildMat({ id: B, x: 10, y: 0 })] });
const move = (matId: string, dx: number, dy = 0): CommandCall => ({ id: 'mats.move', args: { matIds: [matId], dx, dy } });
const matIn = (doc: SpreadDocument, id: string) => doc.mats.find((mat) => mat.id === id)!;
const changeMat = (doc: SpreadDocument, id: string, change: object) => ({ [`mat/${id}`]: { before: matIn(doc, id), after: { ...matIn(doc, id), ...change } } });
const statusOf = (tab: ReturnType<typeof openTab>) => tab.store.getState().save.status;

describe('autosave', () => {
  it('waits for a pause, then sends the edits in order with the revision that they are based on', async () => {
    const tab = openTab({ doc: twoMats() });
    tab.store.getState().run(move(A, 1));
    await tab.clock.pass(400);
    tab.store.getState().run(move(B, 1));
    await tab.clock.pass(400);
    expect(tab.server.posts).toHaveLength(0);
    expect(statusOf(tab)).toBe('dirty');
    await tab.clock.pass(400);
    expect(tab.server.posts.map(({ body }) => [body.baseRevision, body.edits.map(({ command }) => command)])).toEqual([[1, ['mats.move', 'mats.move']]]);
    expect(tab.store.getState().save).toMatchObject({ status: 'saved', at: '2026-03-01T09:00:01.000Z' });
    expect(tab.server.doc).toEqual(tab.store.getState().doc);
  });

  it('has one save in flight and sends what came meanwhile after it', async () => {
    const tab = openTab({ doc: twoMats() });
    tab.store.getState().run(move(A, 1));
    const saving = tab.store.getState().flush();
    expect(statusOf(tab)).toBe('saving');
    tab.store.getState().run(move(A, 1));
    tab.store.getState().run({ id: 'mats.setColor', args: { matIds: [B], color: '#7a1f2b' } });
    expect(tab.server.posts).toHaveLength(1);
    expect(await saving).toBe(true);
    expect(tab.server.posts.map(({ body }) => body.edits.length)).toEqual([1, 2]);
    expect(tab.server.doc).toEqual(tab.store.getState().doc);
  });

  it('says offline, keeps the edits in the browser and tries again at growing intervals', async () => {
    const tab = openTab({ doc: twoMats() });
    tab.server.next = ['no-answer', 'no-answer', 'no-answer'];
    tab.store.getState().run(move(A, 1));
    await tab.clock.pass(600);
    expect(statusOf(tab)).toBe('offline');
    expect(tab.drafts.list(SPREAD_ID)[0]?.edits).toHaveLength(1);
    await tab.clock.pass(999);
    expect(tab.server.posts).toHaveLength(1);
    await tab.clock.pass(1);
    expect(tab.server.posts).toHaveLength(2);
    await tab.clock.pass(2000);
    expect(tab.server.posts).toHaveLength(3);
    await tab.clock.pass(4000);
    expect(statusOf(tab)).toBe('saved');
    expect(tab.drafts.list(SPREAD_ID)).toEqual([]);
  });

  it('tries at once when the network comes back', async () => {
    const tab = openTab({ doc: twoMats() });
    tab.server.next = ['no-answer'];
    tab.store.getState().run(move(A, 1));
    await tab.clock.pass(600);
    tab.page.online();
    await settled();
    expect(statusOf(tab)).toBe('saved');
  });

  it('applies an edit once although the answer to its save was lost', async () => {
    const tab = openTab({ doc: twoMats() });
    tab.server.next = ['lost-answer'];
    tab.store.getState().run(move(A, 1));
    await tab.clock.pass(600);
    tab.store.getState().run(move(A, 1));
    await tab.clock.pass(5000);
    expect(statusOf(tab)).toBe('saved');
    expect(tab.server.log).toHaveLength(2);
    expect(matIn(tab.server.doc, A).x).toBe(2);
  });

  it('says why a save was refused, keeps the edits, and tries again on demand', async () => {
    const tab = openTab({ doc: twoMats() });
    tab.server.next = [{ refuse: 'unauthenticated' }];
    tab.store.getState().run(move(A, 1));
    await tab.clock.pass(60_000);
    expect(tab.store.getState().save).toMatchObject({ status: 'failed', failure: { code: 'unauthenticated' } });
    expect(tab.server.posts).toHaveLength(1);
    expect(await tab.store.getState().flush()).toBe(true);
    expect(matIn(tab.server.doc, A).x).toBe(1);
  });

  it('saves in a request that outlives the page when the tab is hidden', () => {
    const tab = openTab({ doc: twoMats() });
    tab.store.getState().run(move(A, 1));
    tab.page.hide();
    expect(tab.server.posts).toMatchObject([{ keepalive: true }]);
  });

  it('sends all again when the page goes while a save is on its way', async () => {
    const tab = openTab({ doc: twoMats() });
    tab.store.getState().run(move(A, 1));
    void tab.store.getState().flush();
    tab.store.getState().run(move(A, 1));
    tab.page.leave();
    expect(tab.server.posts.map(({ body, keepalive }) => [body.edits.length, keepalive])).toEqual([[1, false], [2, true]]);
    await tab.clock.pass(2000);
    expect(tab.server.log).toHaveLength(2);
    expect(statusOf(tab)).toBe('saved');
  });

  it('takes in what others changed elsewhere on the spread', async () => {
    const tab = openTab({ doc: twoMats() });
    tab.server.otherEdit(changeMat(tab.server.doc, B, { y: 9 }));
    tab.store.getState().run(move(A, 1));
    await tab.clock.pass(600);
    expect(matIn(tab.store.getState().doc, B).y).toBe(9);
    expect(statusOf(tab)).toBe('saved');
    expect(tab.store.getState().doc).toEqual(tab.server.doc);
  });

  it('says so where the browser cannot keep unsaved edits', () => {
    const full: Storage = { ...memoryStorage(), setItem: () => { throw new Error('full'); } };
    const tab = openTab({ doc: twoMats(), storage: full });
    tab.store.getState().run(move(A, 1));
    expect(tab.store.getState().save.isKept).toBe(false);
  });

  it('saves what is left when the spread is closed', async () => {
    const tab = openTab({ doc: twoMats() });
    tab.store.getState().run(move(A, 1));
    expect(await tab.store.getState().close()).toBe(true);
    expect(matIn(tab.server.doc, A).x).toBe(1);
  });
});

describe('a conflict', () => {
  async function conflict() {
    const tab = openTab({ doc: twoMats() });
    tab.server.otherEdit(changeMat(tab.server.doc, A, { y: 9 }), 'Ines');
    tab.server.otherEdit({ 'page/left': { before: { color: '#ffffff' }, after: { color: '#222222' } } }, 'Ines');
    tab.store.getState().run(move(A, 3));
    tab.store.getState().run({ id: 'mats.setColor', args: { matIds: [B], color: '#7a1f2b' } });
    await tab.clock.pass(600);
    return tab;
  }

  it('overwrites nothing and shows what differs, mine against theirs', async () => {
    const tab = await conflict();
    expect(statusOf(tab)).toBe('conflict');
    expect(matIn(tab.server.doc, A)).toMatchObject({ x: 0, y: 9 });
    const view = tab.store.getState().describeConflict();
    expect(view?.names).toEqual(['Ines']);
    expect(view?.differences).toMatchObject([{ kind: 'mat', matIds: [A], page: 'left', before: { x: 0, y: 0 }, mine: { x: 3, y: 0 }, theirs: { x: 0, y: 9 } }]);
    await tab.clock.pass(60_000);
    expect(tab.server.posts).toHaveLength(1);
  });

  it('keeps mine where both changed, theirs where only they did', async () => {
    const tab = await conflict();
    tab.store.getState().resolveConflict('mine');
    await tab.clock.pass(600);
    expect(statusOf(tab)).toBe('saved');
    expect(matIn(tab.server.doc, A)).toMatchObject({ x: 3, y: 0 });
    expect(matIn(tab.server.doc, B).color).toBe('#7a1f2b');
    expect(tab.server.doc.pages.left?.color).toBe('#222222');
    expect(tab.store.getState().doc).toEqual(tab.server.doc);
  });

  it('takes theirs where both changed, and keeps mine where only I did', async () => {
    const tab = await conflict();
    tab.store.getState().resolveConflict('theirs');
    await tab.clock.pass(600);
    expect(matIn(tab.server.doc, A)).toMatchObject({ x: 0, y: 9 });
    expect(matIn(tab.server.doc, B).color).toBe('#7a1f2b');
    expect(tab.store.getState().doc).toEqual(tab.server.doc);
    while (tab.store.getState().canUndo) tab.store.getState().undo();
    expect(matIn(tab.store.getState().doc, A)).toMatchObject({ x: 0, y: 9 });
    expect(matIn(tab.store.getState().doc, B).color).toBe('#1f4e5f');
  });

  it('keeps what is done meanwhile', async () => {
    const tab = await conflict();
    tab.store.getState().run(move(B, 0, 2));
    tab.store.getState().resolveConflict('mine');
    await tab.clock.pass(600);
    expect(matIn(tab.server.doc, B)).toMatchObject({ y: 2, color: '#7a1f2b' });
  });

  it('is found where both halves are sound and not together', async () => {
    const tab = openTab({ doc: twoMats() });
    tab.server.otherEdit(changeMat(tab.server.doc, B, { x: 0, y: 10 }), 'Ines');
    tab.store.getState().run(move(A, 0, 10));
    await tab.clock.pass(600);
    expect(statusOf(tab)).toBe('conflict');
    expect(tab.store.getState().describeConflict()?.differences).toMatchObject([{ matIds: [B], mine: { x: 10, y: 0 }, theirs: { x: 0, y: 10 } }]);
    tab.store.getState().resolveConflict('mine');
    await tab.clock.pass(600);
    expect(statusOf(tab)).toBe('saved');
    expect(matIn(tab.server.doc, A).y).toBe(10);
    expect(matIn(tab.server.doc, B)).toMatchObject({ x: 10, y: 0 });
  });

  it('is found when others touched what is not sent yet', async () => {
    const tab = openTab({ doc: twoMats() });
    tab.store.getState().run(move(A, 1));
    tab.server.otherEdit(changeMat(tab.server.doc, B, { y: 9 }), 'Ines');
    const saving = tab.store.getState().flush();
    tab.store.getState().run(move(B, 2));
    await saving;
    expect(statusOf(tab)).toBe('conflict');
    expect(tab.server.posts).toHaveLength(1);
    expect(matIn(tab.store.getState().doc, B)).toMatchObject({ x: 12, y: 0 });
    expect(matIn(tab.server.doc, B)).toMatchObject({ x: 10, y: 9 });
    tab.store.getState().resolveConflict('mine');
    await tab.clock.pass(600);
    expect(matIn(tab.server.doc, B)).toMatchObject({ x: 12, y: 0 });
    expect(matIn(tab.server.doc, A).x).toBe(1);
  });

  it('is none where both did the very same', async () => {
    const tab = openTab({ doc: twoMats() });
    tab.server.otherEdit(changeMat(tab.server.doc, A, { x: 3 }));
    tab.store.getState().run(move(A, 3));
    await tab.clock.pass(600);
    await tab.clock.pass(600);
    expect(statusOf(tab)).toBe('saved');
    expect(tab.server.log).toHaveLength(1);
  });
});

describe('a tab that crashed', () => {
  /** A tab without network that is gone without a word. */
  async function crashed(calls: readonly CommandCall[], fate: 'no-answer' | 'lost-answer' = 'no-answer') {
    const storage = memoryStorage();
    const server = new FakeServer(twoMats());
    const tab = openTab({ server, storage });
    server.next = [fate];
    for (const call of calls) tab.store.getState().run(call);
    await tab.clock.pass(600);
    return { storage, server };
  }

  it('is offered its unsaved edits on return, and they can be undone', async () => {
    const { storage, server } = await crashed([move(A, 2), move(B, 1)]);
    const tab = openTab({ server, storage });
    await settled();
    expect(tab.store.getState().draft?.edits).toHaveLength(2);
    expect(matIn(tab.store.getState().doc, A).x).toBe(0);
    expect(await tab.store.getState().applyDraft()).toBe(true);
    await tab.clock.pass(600);
    expect(matIn(server.doc, A).x).toBe(2);
    expect(tab.store.getState().draft).toBe(null);
    expect(tab.drafts.list(SPREAD_ID)).toEqual([]);
    tab.store.getState().undo();
    tab.store.getState().undo();
    expect(tab.store.getState().doc).toEqual(twoMats());
  });

  it('is offered nothing where the save had arrived after all', async () => {
    const { storage, server } = await crashed([move(A, 2)], 'lost-answer');
    const tab = openTab({ server, storage });
    await settled();
    expect(tab.store.getState().draft).toBe(null);
    expect(tab.drafts.list(SPREAD_ID)).toEqual([]);
  });

  it('loses its edits only when they are discarded', async () => {
    const { storage, server } = await crashed([move(A, 2)]);
    const tab = openTab({ server, storage });
    await settled();
    tab.store.getState().discardDraft();
    expect(tab.store.getState().draft).toBe(null);
    expect(tab.drafts.list(SPREAD_ID)).toEqual([]);
    expect(matIn(tab.store.getState().doc, A).x).toBe(0);
  });

  it('has its edits joined to what others did elsewhere since', async () => {
    const { storage, server } = await crashed([move(A, 2)]);
    server.otherEdit(changeMat(server.doc, B, { y: 9 }));
    const tab = openTab({ server, storage });
    await settled();
    await tab.store.getState().applyDraft();
    await tab.clock.pass(600);
    expect(statusOf(tab)).toBe('saved');
    expect([matIn(server.doc, A).x, matIn(server.doc, B).y]).toEqual([2, 9]);
  });

  it('is shown what differs where others changed the same since', async () => {
    const { storage, server } = await crashed([move(A, 2)]);
    server.otherEdit(changeMat(server.doc, A, { y: 9 }), 'Ines');
    const tab = openTab({ server, storage });
    await settled();
    await tab.store.getState().applyDraft();
    expect(statusOf(tab)).toBe('conflict');
    expect(tab.store.getState().describeConflict()?.differences).toMatchObject([{ mine: { x: 2, y: 0 }, theirs: { x: 0, y: 9 } }]);
    tab.store.getState().resolveConflict('mine');
    await tab.clock.pass(600);
    expect(matIn(server.doc, A)).toMatchObject({ x: 2, y: 0 });
  });

  it('is not hindered by a draft that cannot be read', async () => {
    const storage = memoryStorage();
    storage.setItem(`pairleaf.draft.${SPREAD_ID}.torn`, '{"edits":[');
    const tab = openTab({ doc: twoMats(), storage });
    await settled();
    expect(tab.store.getState().draft).toBe(null);
    tab.store.getState().run(move(A, 1));
    expect(await tab.store.getState().flush()).toBe(true);
    expect(tab.server.doc).toEqual(applyPatch(twoMats(), tab.server.log[0]!.patch));
  });
});
