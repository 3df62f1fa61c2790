import { randomUUID } from 'node:crypto';
import { beforeAll, describe, expect, it } from 'vitest';
import { PileEntity } from '#server/entities/pile-entity';
import { createRoutes } from '#server/routes/table';
import type { Role } from '#shared/model/people';
import type { SpreadDetail } from '#shared/contracts/albums';
import { beginSpread, insertPrint, withApp, type Person } from '../../support/app';
import { buildFacts } from '../../support/stash';

/**
 * Who gets what, for every route of the table: the answer's status for a member of each role, for the owner of
 * another studio, and for somebody who is not signed in. `200` stands for any success.
 */
interface Row {
  readonly method: 'get' | 'post' | 'patch' | 'delete';
  readonly path: string;
  readonly owner: number;
  readonly designer: number;
  readonly reviewer: number;
  readonly contributor: number;
  readonly outsider: number;
  readonly signedOut: number;
}

const row = (route: string, owner: number, designer: number, reviewer: number, contributor: number, outsider = 404, signedOut = 401): Row => {
  const [method, path] = route.split(' ') as [Row['method'], string];
  return { method, path, owner, designer, reviewer, contributor, outsider, signedOut };
};

/** PRODUCT.md section 8. A body that does not fit gives 400, which only those get who may do it. */
const MATRIX: readonly Row[] = [
  row('get /health', 200, 200, 200, 200, 200, 200),
  row('get /openapi.json', 200, 200, 200, 200, 200, 200),
  row('post /accounts', 400, 400, 400, 400, 400, 400),
  row('post /session', 400, 400, 400, 400, 400, 400),
  row('get /session', 200, 200, 200, 200, 200, 401),
  row('get /studios/:studioId', 200, 200, 200, 200),
  row('patch /studios/:studioId', 400, 403, 403, 403),
  row('get /studios/:studioId/members', 200, 200, 200, 404),
  row('get /studios/:studioId/grants', 200, 200, 404, 404),
  row('post /studios/:studioId/grants', 400, 400, 404, 404),
  row('get /studios/:studioId/albums', 200, 200, 200, 404),
  row('post /studios/:studioId/albums', 400, 400, 403, 404),
  row('get /albums/:albumId', 200, 200, 200, 404),
  row('patch /albums/:albumId', 400, 400, 403, 404),
  row('get /albums/:albumId/spreads', 200, 200, 200, 404),
  row('post /albums/:albumId/spreads', 400, 400, 403, 404),
  row('get /spreads/:spreadId', 200, 200, 200, 404),
  row('patch /spreads/:spreadId', 400, 400, 403, 404),
  row('get /spreads/:spreadId/edits', 200, 200, 200, 404),
  row('post /spreads/:spreadId/edits', 400, 400, 403, 404),
  row('post /spreads/:spreadId/exports', 400, 400, 400, 404),
  row('get /jobs/:jobId', 200, 200, 200, 404),
  // The job is not done, so even those who may fetch its file find none.
  row('get /jobs/:jobId/file', 404, 404, 404, 404),
  row('get /studios/:studioId/prints', 200, 200, 200, 404),
  // No file comes along. A contributor may add to shared piles, so the body is read first.
  row('post /studios/:studioId/prints', 422, 422, 403, 422),
  row('get /prints/:printId', 200, 200, 200, 404),
  row('patch /prints/:printId', 400, 400, 403, 404),
  // Its bytes are not in the storage: whoever may see it runs into that, the others into 404. 500 is the test's sign for "let in".
  row('get /pictures/:printId/:size', 500, 500, 500, 404),
  row('get /studios/:studioId/piles', 200, 200, 200, 200),
  row('post /studios/:studioId/piles', 400, 400, 403, 404),
  row('patch /piles/:pileId', 400, 400, 403, 404),
  row('get /studios/:studioId/cut-sizes', 200, 200, 200, 404),
  row('post /studios/:studioId/cut-sizes', 400, 400, 403, 404),
  row('patch /cut-sizes/:cutSizeId', 400, 400, 403, 404),
  row('get /studios/:studioId/formats', 200, 200, 200, 404),
  row('post /studios/:studioId/formats', 400, 400, 403, 404),
  row('get /studios/:studioId/stash', 200, 200, 200, 404),
  row('post /studios/:studioId/stash', 400, 400, 403, 404),
  row('patch /stash-sheets/:sheetId', 400, 400, 403, 404),
  row('delete /stash-sheets/:sheetId', 200, 200, 403, 404),
  row('post /studios/:studioId/stash/bulk', 400, 400, 403, 404),
  row('get /studios/:studioId/stash/file', 200, 200, 200, 404),
  row('post /studios/:studioId/stash/import', 400, 400, 403, 404),
  row('post /studios/:studioId/stash/readings', 422, 422, 403, 404),
  row('get /spreads/:spreadId/reservations', 200, 200, 200, 404),
  row('post /spreads/:spreadId/reservations', 400, 400, 403, 404),
  row('get /studios/:studioId/checks', 200, 200, 200, 404),
  row('patch /studios/:studioId/checks/:checkId', 400, 400, 403, 404),
  row('patch /spreads/:spreadId/checks/:checkId', 400, 400, 403, 404),
  row('delete /piles/:pileId', 200, 200, 403, 404),
  row('delete /cut-sizes/:cutSizeId', 200, 200, 403, 404),
  row('delete /grants/:grantId', 200, 200, 404, 404),
  row('delete /prints/:printId', 200, 403, 403, 404),
  row('delete /spreads/:spreadId', 200, 403, 403, 404),
  row('delete /albums/:albumId', 200, 403, 403, 404),
  row('delete /session', 200, 200, 200, 200, 200, 401),
];

const MEMBERS: readonly Role[] = ['owner', 'designer', 'reviewer', 'contributor'];

describe('access', () => {
  const app = withApp();
  let owner: Person;
  let outsider: Person;
  /** For rows that delete nothing. */
  let kept: Record<string, string>;
  const people = new Map<Role, Person>();

  beforeAll(async () => {
    owner = await app().signUp();
    outsider = await app().signUp();
    people.set('owner', owner);
    for (const role of MEMBERS.slice(1)) people.set(role, await app().join(owner.studioId, role));
    kept = await things();
  });

  /** A fresh set of things in the owner's studio. */
  async function things(): Promise<Record<string, string>> {
    const { deps } = app();
    const { studioId } = owner;
    const spread: SpreadDetail = await beginSpread(owner);
    const print = await insertPrint(deps, studioId);
    const [pileId, cutSizeId, grantId, jobId] = [randomUUID(), randomUUID(), randomUUID(), randomUUID()];
    await owner.agent.post(`/api/studios/${studioId}/piles`).send({ id: pileId, name: 'Pier' }).expect(201);
    const cutSize = { id: cutSizeId, name: 'Square', width: 4064, height: 4064, stock: 'card', kind: 'hand', sets: [] };
    await owner.agent.post(`/api/studios/${studioId}/cut-sizes`).send(cutSize).expect(201);
    const sheetId = randomUUID();
    await owner.agent.post(`/api/studios/${studioId}/stash`).send({ id: sheetId, ...buildFacts() }).expect(201);
    const scope = { kind: 'spread-link', spreadId: spread.id, mayComment: false };
    await owner.agent.post(`/api/studios/${studioId}/grants`).send({ id: grantId, scope, expiresAt: null }).expect(201);
    await deps.services.jobs.enqueue({ id: jobId, studioId, spreadId: spread.id, kind: 'test.none', payload: {}, dedupeKey: null, createdBy: null });
    return { studioId, albumId: spread.albumId, spreadId: spread.id, printId: print.id, pileId, cutSizeId, sheetId, grantId, jobId, size: 'small', checkId: 'no-title' };
  }

  const shown = (status: number): number => (status >= 200 && status < 300 ? 200 : status);

  /** A body with a field that no schema knows: refused as 400 exactly where the request got that far. */
  async function ask(person: Person | null, { method, path }: Row, ids: Record<string, string>): Promise<number> {
    const address = `/api${path.replace(/:(\w+)/g, (_all, name: string) => ids[name] ?? `no-${name}`)}`;
    const agent = person?.agent ?? app().stranger();
    const request = agent[method](address);
    const answer = await (method === 'post' || method === 'patch' ? request.send({ unheardOf: true }) : request);
    return shown(answer.status);
  }

  it('is said here for every route of the table, and for no other', () => {
    const routes = createRoutes(app().deps).map(({ method, path }) => `${method} ${path}`);
    expect(MATRIX.map(({ method, path }) => `${method} ${path}`).sort()).toEqual(routes.sort());
  });

  it.each(MATRIX)('$method $path', async (entry) => {
    const endsSession = entry.path === '/session' && entry.method === 'delete';
    const got: Record<string, number> = {};
    got.signedOut = await ask(null, entry, kept);
    if (!endsSession) got.outsider = await ask(outsider, entry, kept);
    for (const role of MEMBERS) {
      const person = endsSession ? await app().join(owner.studioId, role) : people.get(role)!;
      got[role] = await ask(person, entry, entry.method === 'delete' ? await things() : kept);
    }
    if (endsSession) got.outsider = await ask(await app().signUp(), entry, kept);
    const { method: _method, path: _path, ...expected } = entry;
    expect(got).toEqual(expected);
  });

  it('a contributor sees the pictures that they sent, the shared piles, and no others', async () => {
    const contributor = people.get('contributor')!;
    const own = await insertPrint(app().deps, owner.studioId, { contributedBy: contributor.userId });
    const other = await insertPrint(app().deps, owner.studioId);
    // 500: let in, and then the test's print has no file.
    await contributor.agent.get(`/api/pictures/${own.id}/small`).expect(500);
    await contributor.agent.get(`/api/pictures/${other.id}/small`).expect(404);

    const pileId = randomUUID();
    const seen = async () => ((await contributor.agent.get(`/api/studios/${owner.studioId}/piles`).expect(200)).body.piles as { id: string }[]).map(({ id }) => id);
    await owner.agent.post(`/api/studios/${owner.studioId}/piles`).send({ id: pileId, name: 'From the aunts' }).expect(201);
    expect(await seen()).toEqual([]);
    await owner.agent.patch(`/api/piles/${pileId}`).send({ sharedWithContributors: true }).expect(200);
    expect(await seen()).toEqual([pileId]);
    expect(await app().deps.dataSource.manager.countBy(PileEntity, { studioId: owner.studioId })).toBeGreaterThan(1);
  });
});
