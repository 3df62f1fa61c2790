import { randomUUID } from 'node:crypto';
import { beforeAll, describe, expect, it } from 'vitest';
import { FileEntity } from '#server/entities/file-entity';
import { StudioEntity } from '#server/entities/studio-entity';
import { UserEntity } from '#server/entities/user-entity';
import { inches } from '#shared/model/length';
import type { Print } from '#shared/model/print';
import { beginSpread, insertPrint, withApp, type Person } from '../../support/app';
import { buildMat, printContent } from '../../support/builders';
import { PatchBuilder } from '../../support/patches';

describe('prints', () => {
  const app = withApp();
  let owner: Person;

  beforeAll(async () => {
    owner = await app().signUp();
  });

  const insert = (parts: Parameters<typeof insertPrint>[2] = {}) => insertPrint(app().deps, owner.studioId, parts);
  const patch = (print: Print, body: object) => owner.agent.patch(`/api/prints/${print.id}`).send(body);
  const get = async (print: Print) => (await owner.agent.get(`/api/prints/${print.id}`).expect(200)).body as Print;

  it('come in pages that miss none and repeat none', async () => {
    const person = await app().signUp();
    const ids = [];
    for (let n = 0; n < 7; n += 1) ids.push((await insertPrint(app().deps, person.studioId)).id);
    const seen: string[] = [];
    let cursor: string | null = null;
    do {
      const query: string = cursor ? `&cursor=${encodeURIComponent(cursor)}` : '';
      const { body } = await person.agent.get(`/api/studios/${person.studioId}/prints?limit=3${query}`).expect(200);
      seen.push(...(body.prints as Print[]).map(({ id }) => id));
      cursor = body.nextCursor as string | null;
    } while (cursor);
    expect(seen).toHaveLength(7);
    expect(new Set(seen)).toEqual(new Set(ids));
  });

  it('refuse a cursor that is none', async () => {
    const answer = await owner.agent.get(`/api/studios/${owner.studioId}/prints?cursor=eHh4`).expect(400);
    expect(answer.body.fields).toMatchObject([{ path: 'cursor' }]);
    await owner.agent.get(`/api/studios/${owner.studioId}/prints?limit=0&sort=no`).expect(400);
  });

  it('change by what was sent and by nothing else', async () => {
    const print = await insert({ keepZone: { x: 100, y: 100, width: 50, height: 50 } });
    const changed = await patch(print, { baseRevision: 0, title: '  Gulls ', copies: 3, marks: { noUp: true, borrowedUntil: '2026-12-24' } }).expect(200);
    const expected = { ...print, title: 'Gulls', copies: 3, revision: 1, marks: { ...print.marks, noUp: true, borrowedUntil: '2026-12-24' } };
    expect(changed.body).toEqual(expected);
    expect(await get(print)).toEqual(expected);
    await patch(print, { baseRevision: 1, keepZone: null }).expect(200).expect(({ body }) => expect(body.keepZone).toBeNull());
  });

  it('tell how they stand when a change is late, and one of two late changes wins', async () => {
    const print = await insert();
    const answers = await Promise.all(['A', 'B', 'C'].map((title) => patch(print, { baseRevision: 0, title })));
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 409, 409]);
    const won = answers.find(({ status }) => status === 200)?.body as Print;
    const late = await patch(print, { baseRevision: 0, title: 'D' }).expect(409);
    expect(late.body).toMatchObject({ code: 'stale-revision', data: { print: won } });
    expect((await get(print)).title).toBe(won.title);
  });

  it('keep the keep zone on the picture when the paper is corrected', async () => {
    const keepZone = { x: 10, y: 10, width: 80, height: 60 };
    const print = await insert({ keepZone });
    const changed = await patch(print, { baseRevision: 0, paperWidth: inches(4), paperHeight: inches(4) }).expect(200);
    expect(changed.body).toMatchObject({ keepZone, paperRect: { x: 100, y: 0, width: 400, height: 400 } });
  });

  it('name each zone that lies where nothing is', async () => {
    const print = await insert();
    const rect = { x: 550, y: 0, width: 100, height: 50 };
    const id = randomUUID();
    const answer = await patch(print, {
      baseRevision: 0,
      keepZone: rect,
      details: [{ id, name: 'Hand', rect }, { id, name: 'Hat', rect: { ...rect, x: 0 } }],
      faces: [{ rect }],
      horizon: { x1: 0, y1: 9000, x2: 10, y2: 10 },
    }).expect(400);
    const paths = (answer.body.fields as { path: string }[]).map(({ path }) => path).sort();
    expect(paths).toEqual(['details', 'details.0.rect', 'faces.0.rect', 'horizon', 'keepZone']);
    expect(await get(print)).toEqual(print);
  });

  it('refuse a pile of another studio', async () => {
    const other = await app().signUp();
    const pileId = randomUUID();
    await other.agent.post(`/api/studios/${other.studioId}/piles`).send({ id: pileId, name: 'Theirs' }).expect(201);
    const answer = await patch(await insert(), { baseRevision: 0, pileId }).expect(400);
    expect(answer.body.fields).toMatchObject([{ path: 'pileId' }]);
  });

  it('refuse a pile that goes away while they are put on it', async () => {
    const [print, pileId] = [await insert(), randomUUID()];
    await owner.agent.post(`/api/studios/${owner.studioId}/piles`).send({ id: pileId, name: 'Going' }).expect(201);
    const deletion = app().deps.dataSource.createQueryRunner();
    await deletion.startTransaction();
    await deletion.query('DELETE FROM piles WHERE id = ?', [pileId]);
    const moved = patch(print, { baseRevision: 0, pileId }).then((answer) => answer);
    await new Promise((resolve) => setTimeout(resolve, 200));
    await deletion.commitTransaction();
    await deletion.release();
    expect(await moved).toMatchObject({ status: 400, body: { fields: [{ path: 'pileId' }] } });
  });

  it('go into the bin and come out again', async () => {
    const print = await insert();
    const listed = async (binned: boolean) =>
      ((await owner.agent.get(`/api/studios/${owner.studioId}/prints?binned=${binned}&limit=200`).expect(200)).body.prints as Print[]).some(({ id }) => id === print.id);
    await patch(print, { baseRevision: 0, binned: true }).expect(200);
    expect([await listed(false), await listed(true)]).toEqual([false, true]);
    await patch(print, { baseRevision: 1, binned: false }).expect(200);
    expect([await listed(false), await listed(true)]).toEqual([true, false]);
  });

  it('stay while a spread uses them, and the refusal names it', async () => {
    const print = await insert();
    const spread = await beginSpread(owner);
    const edits = new PatchBuilder();
    const mat = buildMat({ id: randomUUID(), content: printContent(print) });
    await owner.agent.post(`/api/spreads/${spread.id}/edits`).send({ baseRevision: 0, edits: [edits.add(mat)] }).expect(200);
    const refusal = { code: 'in-use', data: { spreads: [{ id: spread.id, title: 'The pier' }] }, detail: expect.stringContaining('“The pier”') };
    expect((await owner.agent.delete(`/api/prints/${print.id}`).expect(409)).body).toMatchObject(refusal);
    expect((await patch(print, { baseRevision: 0, binned: true }).expect(409)).body).toMatchObject(refusal);
    const bare = edits.change({ ...mat, content: { kind: 'bare' } }, mat);
    await owner.agent.post(`/api/spreads/${spread.id}/edits`).send({ baseRevision: 1, edits: [bare] }).expect(200);
    await owner.agent.delete(`/api/prints/${print.id}`).expect(204);
    await owner.agent.get(`/api/prints/${print.id}`).expect(404);
  });

  it('give their bytes back when the last print of a file goes', async () => {
    const { manager } = app().deps.dataSource;
    const person = await app().signUp();
    const print = await insertPrint(app().deps, person.studioId);
    await manager.update(StudioEntity, { id: person.studioId }, { bytesUsed: 1500 });
    await manager.update(UserEntity, { id: person.userId }, { bytesUsed: 1700 });
    await manager.update(FileEntity, { studioId: person.studioId }, { addedBy: person.userId });
    await person.agent.delete(`/api/prints/${print.id}`).expect(204);
    expect(await manager.countBy(FileEntity, { studioId: person.studioId })).toBe(0);
    expect((await manager.findOneByOrFail(StudioEntity, { id: person.studioId })).bytesUsed).toBe(500);
    expect((await manager.findOneByOrFail(UserEntity, { id: person.userId })).bytesUsed).toBe(700);
  });
});
