import { randomUUID } from 'node:crypto';
import { beforeAll, describe, expect, it } from 'vitest';
import { PAGE_FORMATS } from '#shared/model/page-format';
import { beginSpread, withApp, type Person } from '../../support/app';

describe('a studio’s things', () => {
  const app = withApp();
  let owner: Person;
  const inStudio = (path: string) => `/api/studios/${owner.studioId}/${path}`;

  beforeAll(async () => {
    owner = await app().signUp();
  });

  it('settings: what is left out stays', async () => {
    const trim = { tolerance: 240, finestMark: 160 };
    await owner.agent.patch(`/api/studios/${owner.studioId}`).send({ unit: 'mm', trim }).expect(200);
    const { body } = await owner.agent.patch(`/api/studios/${owner.studioId}`).send({ name: 'Salt & Card' }).expect(200);
    expect(body).toMatchObject({ name: 'Salt & Card', unit: 'mm', trim, role: 'owner' });
  });

  it('settings: a trimmer that nobody has set follows the unit', async () => {
    const person = await app().signUp();
    const patch = (body: object) => person.agent.patch(`/api/studios/${person.studioId}`).send(body).expect(200);
    expect((await patch({ unit: 'mm' })).body).toMatchObject({ unit: 'mm', trim: { tolerance: 240, finestMark: 160 } });
    await patch({ trim: { tolerance: 320, finestMark: 160 } });
    expect((await patch({ unit: 'in' })).body).toMatchObject({ unit: 'in', trim: { tolerance: 320, finestMark: 160 } });
  });

  it('members: everybody with name and role, owners first', async () => {
    const reviewer = await app().join(owner.studioId, 'reviewer');
    const { body } = await owner.agent.get(inStudio('members')).expect(200);
    expect(body.members).toEqual([
      { userId: owner.userId, name: 'Maud Ferrier', role: 'owner' },
      { userId: reviewer.userId, name: 'Maud Ferrier', role: 'reviewer' },
    ]);
  });

  it('albums: a repeat is the same album, another studio’s id is refused', async () => {
    const body = { id: randomUUID(), title: 'Winter', formatId: 'a4' };
    await owner.agent.post(inStudio('albums')).send(body).expect(201);
    const again = await owner.agent.post(inStudio('albums')).send(body).expect(201);
    expect(again.body).toMatchObject({ id: body.id, title: 'Winter', spreadCount: 0, format: { id: 'a4' } });
    const other = await app().signUp();
    await other.agent.post(`/api/studios/${other.studioId}/albums`).send(body).expect(409);
  });

  it('albums: an unknown page format is named', async () => {
    const answer = await owner.agent.post(inStudio('albums')).send({ id: randomUUID(), title: 'X', formatId: 'a0' }).expect(400);
    expect(answer.body.fields).toEqual([{ path: 'formatId', message: 'the studio has no such page format' }]);
  });

  it('page formats: the shipped ones, then one’s own, on which an album can be begun', async () => {
    const format = { ...PAGE_FORMATS[0]!, id: 'ours', name: 'Square of ours', width: 32_512, height: 32_512 };
    await owner.agent.post(inStudio('formats')).send(format).expect(201);
    await owner.agent.post(inStudio('formats')).send(format).expect(201);
    await owner.agent.post(inStudio('formats')).send({ ...format, width: 40_640 }).expect(409);
    await owner.agent.post(inStudio('formats')).send({ ...format, id: PAGE_FORMATS[0]!.id }).expect(409);
    await owner.agent.post(inStudio('formats')).send({ ...format, id: 'tiny', width: 2000 }).expect(400);
    const short = { ...format, id: 'short', edge: 'bleed', minMargin: 0, height: format.height + 1 };
    expect((await owner.agent.post(inStudio('formats')).send(short).expect(400)).body.fields).toMatchObject([{ path: 'edge' }]);
    const { body } = await owner.agent.get(inStudio('formats')).expect(200);
    expect(body.formats).toEqual([...PAGE_FORMATS, format]);
    await owner.agent.post(inStudio('albums')).send({ id: randomUUID(), title: 'Ours', formatId: 'ours' }).expect(201);
  });

  it('spreads: keep their order when one is moved, and leave it for the bin', async () => {
    const albumId = randomUUID();
    await owner.agent.post(inStudio('albums')).send({ id: albumId, title: 'Order', formatId: '12x12in' }).expect(201);
    const ids = [randomUUID(), randomUUID(), randomUUID()];
    for (const [n, id] of ids.entries()) {
      await owner.agent.post(`/api/albums/${albumId}/spreads`).send({ id, title: `S${n}`, pages: n === 0 ? 'right' : 'both' }).expect(201);
    }
    const titles = async (query = '') =>
      ((await owner.agent.get(`/api/albums/${albumId}/spreads${query}`).expect(200)).body.spreads as { title: string }[]).map(({ title }) => title);
    await owner.agent.patch(`/api/spreads/${ids[2]}`).send({ position: 0 }).expect(200);
    expect(await titles()).toEqual(['S2', 'S0', 'S1']);
    await owner.agent.patch(`/api/spreads/${ids[2]}`).send({ position: 99 }).expect(200);
    expect(await titles()).toEqual(['S0', 'S1', 'S2']);
    await owner.agent.patch(`/api/spreads/${ids[1]}`).send({ binned: true }).expect(200);
    expect([await titles(), await titles('?binned=true')]).toEqual([['S0', 'S2'], ['S1']]);
    const { body } = await owner.agent.get(`/api/albums/${albumId}`).expect(200);
    expect(body.spreadCount).toBe(2);
    const first = (await owner.agent.get(`/api/spreads/${ids[0]}`).expect(200)).body;
    expect(first.document.pages).toEqual({ left: null, right: { color: '#ffffff' } });
    expect(first).toMatchObject({ albumTitle: 'Order', studioName: 'Salt & Card', may: { edit: true, comment: true, export: true } });
  });

  it('albums: leave their list for the bin, and come back out of it', async () => {
    const body = { id: randomUUID(), title: 'Put away', formatId: 'a4' };
    await owner.agent.post(inStudio('albums')).send(body).expect(201);
    const designer = await app().join(owner.studioId, 'designer');
    const titles = async (query = '') =>
      ((await owner.agent.get(inStudio(`albums${query}`)).expect(200)).body.albums as { title: string }[]).map(({ title }) => title);
    await designer.agent.patch(`/api/albums/${body.id}`).send({ binned: true }).expect(200).expect(({ body: album }) => expect(album.binned).toBe(true));
    expect(await titles()).not.toContain('Put away');
    expect(await titles('?binned=true')).toEqual(['Put away']);
    await designer.agent.delete(`/api/albums/${body.id}`).expect(403);
    await designer.agent.patch(`/api/albums/${body.id}`).send({ binned: false }).expect(200);
    expect(await titles()).toContain('Put away');
  });

  it('spreads: deleting an album takes them along', async () => {
    const spread = await beginSpread(owner);
    await owner.agent.delete(`/api/albums/${spread.albumId}`).expect(204);
    await owner.agent.get(`/api/spreads/${spread.id}`).expect(404);
  });

  it('piles and cut sizes: made, changed and deleted', async () => {
    const pile = { id: randomUUID(), name: 'Beach' };
    await owner.agent.post(inStudio('piles')).send(pile).expect(201);
    await owner.agent.patch(`/api/piles/${pile.id}`).send({ name: 'Pier', position: 3 }).expect(200);
    expect((await owner.agent.get(inStudio('piles'))).body.piles).toMatchObject([{ name: 'Pier', position: 3, sharedWithContributors: false }]);
    await owner.agent.delete(`/api/piles/${pile.id}`).expect(204);
    expect((await owner.agent.get(inStudio('piles'))).body.piles).toEqual([]);

    const size = { id: randomUUID(), name: 'Round corner', width: 8128, height: 12_192, stock: 'both', kind: 'die', sets: ['Table'] };
    await owner.agent.post(inStudio('cut-sizes')).send(size).expect(201, size);
    await owner.agent.patch(`/api/cut-sizes/${size.id}`).send({ sets: [] }).expect(200, { ...size, sets: [] });
    await owner.agent.delete(`/api/cut-sizes/${size.id}`).expect(204);
    expect((await owner.agent.get(inStudio('cut-sizes'))).body.cutSizes).toEqual([]);
  });

  it('ids that are no ids, and things that are not there', async () => {
    await owner.agent.get('/api/albums/seven').expect(400).expect(({ body }) => expect(body.fields).toMatchObject([{ path: 'albumId' }]));
    await owner.agent.get(`/api/albums/${randomUUID()}`).expect(404);
  });
});
