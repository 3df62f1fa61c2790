import { randomUUID } from 'node:crypto';
import { beforeAll, describe, expect, it } from 'vitest';
import { SpreadEditEntity } from '#server/entities/spread-edit-entity';
import { SpreadPrintEntity } from '#server/entities/spread-print-entity';
import { SpreadSnapshotEntity } from '#server/entities/spread-snapshot-entity';
import { documentAt } from '#server/services/history';
import type { SpreadDetail } from '#shared/contracts/albums';
import { inches } from '#shared/model/length';
import { PatchBuilder } from '../../support/patches';
import { beginSpread, insertPrint, withApp, type Person } from '../../support/app';
import { buildMat, printContent } from '../../support/builders';

describe('saving edits', () => {
  const app = withApp();
  let owner: Person;
  let spread: SpreadDetail;
  let edits: PatchBuilder;

  beforeAll(async () => {
    owner = await app().signUp();
  });

  const begin = async (): Promise<void> => {
    spread = await beginSpread(owner);
    edits = new PatchBuilder();
  };
  const post = (body: object) => owner.agent.post(`/api/spreads/${spread.id}/edits`).send(body);
  const current = async () => (await owner.agent.get(`/api/spreads/${spread.id}`).expect(200)).body as SpreadDetail;

  it('applies them in order, one revision each, and appends them to the log', async () => {
    await begin();
    const mat = buildMat({ id: randomUUID() });
    const [add, paint] = [edits.add(mat), edits.change({ ...mat, color: '#aa3322' }, mat)];
    await post({ baseRevision: 0, edits: [add, paint] }).expect(200, { revision: 2, missed: [] });
    const now = await current();
    expect(now.revision).toBe(2);
    expect(now.document.mats).toEqual([{ ...mat, color: '#aa3322' }]);
    const log = (await owner.agent.get(`/api/spreads/${spread.id}/edits?after=1`).expect(200)).body;
    expect(log).toMatchObject({ revision: 2, edits: [{ id: paint.id, revision: 2, userName: 'Maud Ferrier', command: 'mats.change' }] });
  });

  it('answers a repeat the same and applies it once', async () => {
    await begin();
    const body = { baseRevision: 0, edits: [edits.add(buildMat({ id: randomUUID() }))] };
    const first = await post(body).expect(200);
    await post({ baseRevision: 1, edits: [edits.add(buildMat({ id: randomUUID(), x: 8 }))] }).expect(200);
    const again = await post(body).expect(200);
    expect(again.body).toEqual(first.body);
    expect((await current()).document.mats).toHaveLength(2);
  });

  it('takes no other edit for a repeat because it has the same id', async () => {
    await begin();
    const [first, other] = [edits.add(buildMat({ id: randomUUID() })), edits.add(buildMat({ id: randomUUID(), x: 8 }))];
    await post({ baseRevision: 0, edits: [first] }).expect(200);
    const answer = await post({ baseRevision: 1, edits: [{ ...other, id: first.id }] }).expect(409);
    expect(answer.body).toMatchObject({ code: 'already-exists', data: { id: first.id } });
    expect((await current()).revision).toBe(1);
  });

  it('names the edit whose id another of the list has', async () => {
    await begin();
    const [first, second] = [edits.add(buildMat({ id: randomUUID() })), edits.add(buildMat({ id: randomUUID(), x: 8 }))];
    const answer = await post({ baseRevision: 0, edits: [first, { ...second, id: first.id }] }).expect(400);
    expect(answer.body.fields).toEqual([{ path: 'edits.1.id', message: 'each edit needs an id of its own' }]);
    expect((await current()).revision).toBe(0);
  });

  it('takes text with half a character in it, which the database does not, and can change it again', async () => {
    await begin();
    const typed = buildMat({ id: randomUUID(), content: { kind: 'lettering', text: 'low\ud83d tide', color: '#000000', letterHeight: 4064 } });
    await post({ baseRevision: 0, edits: [edits.add(typed)] }).expect(200);
    await post({ baseRevision: 1, edits: [edits.change({ ...typed, color: '#aa3322' }, typed)] }).expect(200);
    const [stored] = (await current()).document.mats;
    expect(stored!.content).toMatchObject({ text: 'low tide' });
    await post({ baseRevision: 2, edits: [edits.change({ ...stored!, color: '#00aa22' }, stored!)] }).expect(200);
  });

  it('goes on where a repeat brings new edits along', async () => {
    await begin();
    const first = edits.add(buildMat({ id: randomUUID() }));
    await post({ baseRevision: 0, edits: [first] }).expect(200);
    await post({ baseRevision: 0, edits: [first, edits.add(buildMat({ id: randomUUID(), x: 8 }))] }).expect(200, { revision: 2, missed: [] });
  });

  it('merges edits of different mats and tells what was missed', async () => {
    await begin();
    const [a, b] = [buildMat({ id: randomUUID() }), buildMat({ id: randomUUID(), x: 8 })];
    await post({ baseRevision: 0, edits: [edits.add(a), edits.add(b)] }).expect(200);
    const designer = await app().join(owner.studioId, 'designer');
    const theirs = edits.change({ ...a, color: '#112233' }, a);
    await designer.agent.post(`/api/spreads/${spread.id}/edits`).send({ baseRevision: 2, edits: [theirs] }).expect(200);
    const mine = await post({ baseRevision: 2, edits: [edits.change({ ...b, color: '#445566' }, b)] }).expect(200);
    expect(mine.body).toMatchObject({ revision: 4, missed: [{ id: theirs.id, revision: 3, userId: designer.userId }] });
    expect((await current()).document.mats.map(({ color }) => color).sort()).toEqual(['#112233', '#445566']);
  });

  it('refuses an edit of what changed since, says what differs and keeps the first', async () => {
    await begin();
    const mat = buildMat({ id: randomUUID() });
    await post({ baseRevision: 0, edits: [edits.add(mat)] }).expect(200);
    const first = edits.change({ ...mat, color: '#112233' }, mat);
    await post({ baseRevision: 1, edits: [first] }).expect(200);
    const stale = await post({ baseRevision: 1, edits: [edits.change({ ...mat, color: '#445566' }, mat)] }).expect(409);
    expect(stale.body).toMatchObject({
      code: 'stale-revision',
      data: { revision: 2, keys: [`mat/${mat.id}`], missed: [{ id: first.id, patch: first.patch }] },
    });
    expect((await current()).document.mats[0]?.color).toBe('#112233');
  });

  it('refuses an edit of what changed since even where it was changed back', async () => {
    await begin();
    const mat = buildMat({ id: randomUUID() });
    const other = { ...mat, color: '#112233' };
    await post({ baseRevision: 0, edits: [edits.add(mat)] }).expect(200);
    await post({ baseRevision: 1, edits: [edits.change(other, mat), edits.change(mat, other)] }).expect(200);
    const stale = await post({ baseRevision: 1, edits: [edits.change({ ...mat, color: '#445566' }, mat)] }).expect(409);
    expect(stale.body.data).toMatchObject({ revision: 3, keys: [`mat/${mat.id}`], missed: [{ revision: 2 }, { revision: 3 }] });
  });

  it('refuses an edit that starts from what never was', async () => {
    await begin();
    const mat = buildMat({ id: randomUUID() });
    await post({ baseRevision: 0, edits: [edits.add(mat)] }).expect(200);
    const impossible = edits.change({ ...mat, w: 6 }, { ...mat, w: 5 });
    const answer = await post({ baseRevision: 1, edits: [impossible] }).expect(409);
    expect(answer.body.data).toMatchObject({ keys: [`mat/${mat.id}`], missed: [] });
  });

  it('lets exactly one of many edits of the same thing win, and keeps the revisions without a gap', async () => {
    await begin();
    const mat = buildMat({ id: randomUUID() });
    await post({ baseRevision: 0, edits: [edits.add(mat)] }).expect(200);
    const colors = Array.from({ length: 8 }, (_, n) => `#00000${n}`);
    const answers = await Promise.all(colors.map((color) => post({ baseRevision: 1, edits: [edits.change({ ...mat, color }, mat)] })));
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 409, 409, 409, 409, 409, 409, 409]);
    const won = colors[answers.findIndex(({ status }) => status === 200)];
    const now = await current();
    expect(now).toMatchObject({ revision: 2, document: { mats: [{ color: won }] } });
  });

  it('lets all of many edits of different things in', async () => {
    await begin();
    const adds = Array.from({ length: 6 }, (_, n) => edits.add(buildMat({ id: randomUUID(), w: 2, h: 2, x: 3 * n })));
    const answers = await Promise.all(adds.map((edit) => post({ baseRevision: 0, edits: [edit] })));
    expect(answers.map(({ status }) => status)).toEqual([200, 200, 200, 200, 200, 200]);
    const log = await app().deps.dataSource.manager.findBy(SpreadEditEntity, { spreadId: spread.id });
    expect(log.map(({ revision }) => revision).sort()).toEqual([1, 2, 3, 4, 5, 6]);
    expect((await current()).document.mats).toHaveLength(6);
  });

  it('stores nothing of a list of which one edit is refused', async () => {
    await begin();
    const good = edits.add(buildMat({ id: randomUUID() }));
    await post({ baseRevision: 0, edits: [good, edits.add(buildMat({ id: randomUUID(), x: 21 }))] }).expect(422);
    expect(await current()).toMatchObject({ revision: 0, document: { mats: [] } });
  });

  it('refuses a base that the spread has not reached', async () => {
    await begin();
    const answer = await post({ baseRevision: 3, edits: [edits.add(buildMat({ id: randomUUID() }))] }).expect(400);
    expect(answer.body.fields).toEqual([{ path: 'baseRevision', message: expect.stringContaining('revision 0') }]);
  });

  it('counts the copies that a spread uses, and forgets them with it', async () => {
    await begin();
    const print = await insertPrint(app().deps, owner.studioId, { copies: 3 });
    // Two windows that overlap need a copy each; a third beside them comes out of the same paper.
    const mats = [0, 0, inches(3)].map((x, i) => buildMat({ id: randomUUID(), x: 6 * i, content: printContent(print, { x }) }));
    await post({ baseRevision: 0, edits: [...mats.map((mat) => edits.add(mat)), edits.table([print.id])] }).expect(200);
    const use = () => app().deps.dataSource.manager.findBy(SpreadPrintEntity, { spreadId: spread.id });
    expect(await use()).toMatchObject([{ printId: print.id, copies: 2 }]);

    const other = await beginSpread(owner);
    const elsewhere = async () => ((await owner.agent.get(`/api/spreads/${other.id}`)).body as SpreadDetail).usedElsewhere;
    // Also before the print is chosen for this spread.
    expect(await elsewhere()).toEqual({ [print.id]: 2 });
    await owner.agent.patch(`/api/spreads/${spread.id}`).send({ binned: true }).expect(200);
    expect(await elsewhere()).toEqual({});
    await owner.agent.patch(`/api/spreads/${spread.id}`).send({ binned: false }).expect(200);
    expect(await elsewhere()).toEqual({ [print.id]: 2 });
    await owner.agent.patch(`/api/albums/${spread.albumId}`).send({ binned: true }).expect(200);
    expect(await elsewhere()).toEqual({});
  });

  it('keeps a snapshot every fifty edits, from which any revision can be read again', async () => {
    await begin();
    const mat = buildMat({ id: randomUUID() });
    const colorAt = (revision: number): string => `#0000${revision.toString(16).padStart(2, '0')}`;
    const list = [edits.add({ ...mat, color: colorAt(1) })];
    for (let n = 2; n <= 70; n += 1) list.push(edits.change({ ...mat, color: colorAt(n) }, { ...mat, color: colorAt(n - 1) }));
    await post({ baseRevision: 0, edits: list }).expect(200);
    const { manager } = app().deps.dataSource;
    const snapshots = await manager.findBy(SpreadSnapshotEntity, { spreadId: spread.id });
    expect(snapshots.map(({ revision }) => revision).sort((a, b) => a - b)).toEqual([0, 50]);
    const row = await app().deps.services.spreads.get(spread.id);
    for (const revision of [1, 49, 50, 51, 70]) {
      expect((await documentAt(manager, row, revision)).mats[0]?.color).toBe(colorAt(revision));
    }
    expect((await documentAt(manager, row, 0)).mats).toEqual([]);
    await expect(documentAt(manager, row, 71)).rejects.toMatchObject({ code: 'not-found' });
  });
});
