import { randomUUID } from 'node:crypto';
import { beforeEach, describe, expect, it } from 'vitest';
import type { StashSheet } from '#shared/model/stash';
import { beginSpread, withApp, type Person } from '../../support/app';
import { buildFacts, buildSide } from '../../support/stash';

describe('the stash', () => {
  const app = withApp();
  let owner: Person;

  beforeEach(async () => {
    owner = await app().signUp();
  });

  const inStash = (path = '') => `/api/studios/${owner.studioId}/stash${path}`;
  const add = async (parts: Parameters<typeof buildFacts>[0] = {}): Promise<StashSheet> =>
    (await owner.agent.post(inStash()).send({ id: randomUUID(), ...buildFacts(parts) }).expect(201)).body as StashSheet;
  const list = async (): Promise<StashSheet[]> => (await owner.agent.get(inStash()).expect(200)).body.sheets as StashSheet[];
  const reserve = (spreadId: string, sheetId: string, sheets: number) =>
    owner.agent.post(`/api/spreads/${spreadId}/reservations`).send({ sheets: [{ sheetId, sheets }] });

  it('keeps patterned paper with two sides, and answers a repeat with the same sheet', async () => {
    const sheet = { id: randomUUID(), ...buildFacts({ sides: [buildSide({ pattern: 'stripe', palette: ['#1d4f5c'] }), buildSide({ hex: '#dc9f33', source: 'photographed', uncertainty: 4.2 })] }) };
    const first = await owner.agent.post(inStash()).send(sheet).expect(201);
    const again = await owner.agent.post(inStash()).send(sheet).expect(201);
    expect(first.body).toMatchObject({ ...sheet, reserved: 0, revision: 0 });
    expect(again.body).toEqual(first.body);
    const other = await app().signUp();
    await other.agent.post(`/api/studios/${other.studioId}/stash`).send(sheet).expect(409);
  });

  it('changes what is sent and nothing else, and refuses a stale change with the sheet as it stands', async () => {
    const sheet = await add({ maker: 'Mill Lane' });
    const path = `/api/stash-sheets/${sheet.id}`;
    await owner.agent.patch(path).send({ baseRevision: 0, quantity: 2, sides: [buildSide({ hex: '#5d6845' })] }).expect(200);
    expect(await list()).toMatchObject([{ quantity: 2, maker: 'Mill Lane', revision: 1, sides: [{ hex: '#5d6845' }] }]);
    const { body } = await owner.agent.patch(path).send({ baseRevision: 0, quantity: 9 }).expect(409);
    expect(body).toMatchObject({ code: 'stale-revision', data: { sheet: { quantity: 2 } }, detail: expect.stringContaining('these sheets') });
  });

  it('gives many sheets the same values, all or none', async () => {
    const sheets = [await add({ quantity: 1 }), await add({ quantity: 5 })];
    const sheetIds = sheets.map(({ id }) => id);
    await owner.agent.post(inStash('/bulk')).send({ sheetIds, change: { place: 'Drawer 2', quantityBy: 2 } }).expect(200);
    expect(await list()).toMatchObject([{ place: 'Drawer 2', quantity: 3 }, { place: 'Drawer 2', quantity: 7 }]);
    await owner.agent.post(inStash('/bulk')).send({ sheetIds, change: { quantityBy: -5 } }).expect(409);
    await owner.agent.post(inStash('/bulk')).send({ sheetIds: [...sheetIds, randomUUID()], change: { lowAt: 1 } }).expect(400);
    expect((await list()).map(({ quantity, lowAt }) => [quantity, lowAt])).toEqual([[3, null], [7, null]]);
  });

  it('says who is asked for what is not theirs: not found', async () => {
    const sheet = await add();
    const other = await app().signUp();
    await other.agent.patch(`/api/stash-sheets/${sheet.id}`).send({ baseRevision: 0, quantity: 0 }).expect(404);
    await other.agent.post(`/api/studios/${other.studioId}/stash/bulk`).send({ sheetIds: [sheet.id], change: { place: 'Mine' } }).expect(400);
  });

  describe('reservations', () => {
    it('two spreads cannot count the same last sheet, not even at the same moment', async () => {
      const sheet = await add({ quantity: 1 });
      const spreads = [await beginSpread(owner), await beginSpread(owner)];
      const answers = await Promise.all(spreads.map(({ id }) => reserve(id, sheet.id, 1)));
      expect(answers.map(({ status }) => status).sort()).toEqual([200, 409]);
      expect(answers.find(({ status }) => status === 409)?.body).toMatchObject({
        code: 'stash-short',
        detail: 'There are not enough free sheets of “Harbour” (1 wanted, 0 free): other spreads have reserved the rest.',
      });
      expect(await list()).toMatchObject([{ quantity: 1, reserved: 1 }]);
    });

    it('are replaced as a whole, given back, and survive a refusal', async () => {
      const [oat, lamp] = [await add({ name: 'Oat', quantity: 3 }), await add({ name: 'Lamp', quantity: 1 })];
      const [first, second] = [await beginSpread(owner), await beginSpread(owner)];
      await reserve(first.id, oat.id, 2).expect(200);
      await reserve(first.id, oat.id, 3).expect(200);
      await owner.agent.post(`/api/spreads/${second.id}/reservations`).send({ sheets: [{ sheetId: lamp.id, sheets: 1 }, { sheetId: oat.id, sheets: 1 }] }).expect(409);
      expect((await owner.agent.get(`/api/spreads/${second.id}/reservations`).expect(200)).body).toEqual({ reservations: [] });
      await owner.agent.post(`/api/spreads/${first.id}/reservations`).send({ sheets: [] }).expect(200, { reservations: [] });
      await reserve(second.id, oat.id, 3).expect(200);
    });

    it('hold their sheets: no smaller quantity, no deletion, until the spread is deleted', async () => {
      const sheet = await add({ quantity: 3 });
      const spread = await beginSpread(owner);
      await reserve(spread.id, sheet.id, 2).expect(200);
      await owner.agent.patch(`/api/stash-sheets/${sheet.id}`).send({ baseRevision: 0, quantity: 1 }).expect(409);
      await owner.agent.delete(`/api/stash-sheets/${sheet.id}`).expect(409);
      await owner.agent.delete(`/api/spreads/${spread.id}`).expect(204);
      await owner.agent.delete(`/api/stash-sheets/${sheet.id}`).expect(204);
      expect(await list()).toEqual([]);
    });

    it('never reach into another studio’s stash', async () => {
      const sheet = await add();
      const other = await app().signUp();
      const spread = await beginSpread(other);
      await other.agent.post(`/api/spreads/${spread.id}/reservations`).send({ sheets: [{ sheetId: sheet.id, sheets: 1 }] }).expect(400);
    });
  });

  describe('as CSV', () => {
    const bringIn = (csv: string, id = randomUUID()) => owner.agent.post(inStash('/import')).send({ id, csv });

    it('goes out harmless and comes back as the same sheets', async () => {
      await add({ name: '=cmd', place: '@shelf' });
      await add({ sides: [buildSide({ pattern: 'dot', palette: ['#ffffff'] }), buildSide({ hex: '#b9cfc4' })] });
      const before = await list();
      const { text, headers } = await owner.agent.get(inStash('/file')).expect(200);
      expect(headers['content-type']).toBe('text/csv; charset=utf-8');
      expect(text).toContain("'=cmd");
      await bringIn(text).expect(200, { added: 0, changed: 2, faults: [], heading: text.split('\r\n')[0] });
      expect(await list()).toEqual(before.map((sheet) => ({ ...sheet, revision: 1 })));
    });

    it('takes what fits, says of every other line why not, and adds nothing twice', async () => {
      const id = randomUUID();
      const csv = 'name,colour,quantity\nOat,#efe6d2,4\nFog,greyish,1\nLamp,#dc9f33,1';
      const { body } = await bringIn(csv, id).expect(200);
      expect(body).toMatchObject({ added: 2, changed: 0, faults: [{ line: 3, text: 'Fog,greyish,1' }] });
      await bringIn(csv, id).expect(200);
      expect((await list()).map(({ name, quantity }) => [name, quantity]).sort()).toEqual([['Lamp', 1], ['Oat', 4]]);
    });

    it('a short file leaves the other columns as they are', async () => {
      const sheet = await add({ maker: 'Mill Lane', sides: [buildSide({ source: 'photographed', uncertainty: 4.4 })] });
      await bringIn(`id,name,colour,quantity\n${sheet.id},Deep harbour,#1d4f5c,9`).expect(200);
      expect(await list()).toEqual([{ ...sheet, name: 'Deep harbour', quantity: 9, revision: 1 }]);
    });

    it('refuses rows that name another studio’s sheet or fewer sheets than are reserved', async () => {
      const sheet = await add({ quantity: 2 });
      await reserve((await beginSpread(owner)).id, sheet.id, 2).expect(200);
      const other = await app().signUp();
      const foreign = randomUUID();
      await other.agent.post(`/api/studios/${other.studioId}/stash`).send({ id: foreign, ...buildFacts() }).expect(201);
      const { body } = await bringIn(`id,name,colour,quantity\n${sheet.id},Oat,#efe6d2,1\n${foreign},Oat,#efe6d2,1`).expect(200);
      expect((body.faults as { message: string }[]).map(({ message }) => message)).toEqual([
        '“quantity” is 1, and spreads have reserved 2.',
        '“id” is not one of this stash: leave it empty for a new sheet.',
      ]);
    });
  });
});
