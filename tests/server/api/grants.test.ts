import { randomUUID } from 'node:crypto';
import { beforeAll, describe, expect, it } from 'vitest';
import { GrantEntity } from '#server/entities/grant-entity';
import type { SpreadDetail } from '#shared/contracts/albums';
import { GRANT_HEADER } from '#shared/contracts/grants';
import { beginSpread, insertPrint, withApp, type Person } from '../../support/app';
import { PatchBuilder } from '../../support/patches';

describe('a link to a spread', () => {
  let clock = new Date('2026-12-01T10:00:00Z');
  const app = withApp({ now: () => clock });
  let owner: Person;
  let spread: SpreadDetail;

  beforeAll(async () => {
    owner = await app().signUp();
    spread = await beginSpread(owner);
  });

  async function link(parts: object = {}) {
    const scope = { kind: 'spread-link', spreadId: spread.id, mayComment: false };
    const body = { id: randomUUID(), scope, expiresAt: null, ...parts };
    const answer = await owner.agent.post(`/api/studios/${owner.studioId}/grants`).send(body).expect(201);
    return { id: body.id, token: answer.body.token as string };
  }
  const holder = (token: string, path: string) => app().stranger().get(path).set(GRANT_HEADER, token);

  it('shows that one spread and nothing else', async () => {
    const { token } = await link();
    const other = await beginSpread(owner);
    const { body } = await holder(token, `/api/spreads/${spread.id}`).expect(200);
    expect(body).toMatchObject({ id: spread.id, usedElsewhere: {}, may: { edit: false, comment: false, export: false } });
    await holder(token, `/api/spreads/${other.id}`).expect(404);
    await holder(token, `/api/studios/${owner.studioId}`).expect(404);
    await holder(token, `/api/albums/${spread.albumId}`).expect(404);
    await app().stranger().patch(`/api/spreads/${spread.id}`).set(GRANT_HEADER, token).send({ title: 'x' }).expect(403);
  });

  it('tells nothing of what was there before, nor who changed it', async () => {
    const { token } = await link();
    const refused = await holder(token, `/api/spreads/${spread.id}/edits`).expect(403);
    expect(JSON.stringify(refused.body)).not.toContain('Maud Ferrier');
  });

  it('shows the pictures of that spread’s prints', async () => {
    const { token } = await link();
    const [shown, hidden] = [await insertPrint(app().deps, owner.studioId), await insertPrint(app().deps, owner.studioId)];
    await owner.agent.post(`/api/spreads/${spread.id}/edits`).send({ baseRevision: 0, edits: [new PatchBuilder().table([shown.id])] }).expect(200);
    // 500: let in, and then the test's print has no file.
    await holder(token, `/api/pictures/${shown.id}/small`).expect(500);
    await holder(token, `/api/pictures/${hidden.id}/small`).expect(404);
  });

  it('may allow comments', async () => {
    const { token } = await link({ scope: { kind: 'spread-link', spreadId: spread.id, mayComment: true } });
    const { body } = await holder(token, `/api/spreads/${spread.id}`).expect(200);
    expect(body.may).toEqual({ edit: false, comment: true, export: false });
  });

  it('ends when it is withdrawn, and at its end', async () => {
    const withdrawn = await link();
    await owner.agent.delete(`/api/grants/${withdrawn.id}`).expect(204);
    await holder(withdrawn.token, `/api/spreads/${spread.id}`).expect(401);
    const short = await link({ expiresAt: '2026-12-01T11:00:00Z' });
    await holder(short.token, `/api/spreads/${spread.id}`).expect(200);
    clock = new Date('2026-12-01T11:00:00Z');
    await holder(short.token, `/api/spreads/${spread.id}`).expect(401);
    await holder('made-up', `/api/spreads/${spread.id}`).expect(401);
  });

  it('has a token that is told once and kept nowhere', async () => {
    const { id, token } = await link();
    expect(token.length).toBeGreaterThanOrEqual(43);
    const row = await app().deps.dataSource.manager.findOneByOrFail(GrantEntity, { id });
    expect(JSON.stringify(row)).not.toContain(token);
    const listed = await owner.agent.get(`/api/studios/${owner.studioId}/grants`).expect(200);
    expect(JSON.stringify(listed.body)).not.toContain(token);
    expect(JSON.stringify(listed.body)).toContain(id);
  });

  it('is refused for what is not in the studio, and for an end that is over', async () => {
    const other = await app().signUp();
    const theirs = await beginSpread(other);
    const post = (body: object) => owner.agent.post(`/api/studios/${owner.studioId}/grants`).send({ id: randomUUID(), expiresAt: null, ...body });
    const scope = { kind: 'worktable', spreadId: theirs.id };
    expect((await post({ scope }).expect(400)).body.fields).toMatchObject([{ path: 'scope.spreadId' }]);
    const over = { scope: { kind: 'worktable', spreadId: spread.id }, expiresAt: '2026-11-30T00:00:00Z' };
    expect((await post(over).expect(400)).body.fields).toMatchObject([{ path: 'expiresAt' }]);
  });
});
