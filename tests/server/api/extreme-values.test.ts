import { randomUUID } from 'node:crypto';
import { beforeAll, describe, expect, it } from 'vitest';
import { PAGE_FORMATS } from '#shared/model/page-format';
import { insertPrint, withApp, type Person } from '../../support/app';

describe('values that fit their type and nothing that exists', () => {
  const app = withApp();
  let owner: Person;
  beforeAll(async () => {
    owner = await app().signUp();
  });
  const inStudio = (rest: string): string => `/api/studios/${owner.studioId}/${rest}`;
  const fieldsOf = (answer: { readonly body: { readonly fields?: readonly { readonly path: string }[] } }) => answer.body.fields?.map(({ path }) => path);

  it.each([1_000_001, 2 ** 32, Number.MAX_SAFE_INTEGER])('a pile and a print at place %d are refused by field', async (position) => {
    const pile = randomUUID();
    await owner.agent.post(inStudio('piles')).send({ id: pile, name: 'Pier' }).expect(201);
    const print = await insertPrint(app().deps, owner.studioId);
    expect(fieldsOf(await owner.agent.patch(`/api/piles/${pile}`).send({ position }).expect(400))).toEqual(['position']);
    expect(fieldsOf(await owner.agent.patch(`/api/prints/${print.id}`).send({ baseRevision: 0, position }).expect(400))).toEqual(['position']);
  });

  it.each([
    ['a step so small that no mat could be placed on most of the page', { step: 160 }],
    ['a margin larger than the page', { minMargin: Number.MAX_SAFE_INTEGER }],
  ])('a page format with %s is refused', async (_name, parts) => {
    const format = { ...PAGE_FORMATS[0]!, id: randomUUID(), width: 160_000, height: 160_000, gap: 2, ...parts };
    expect(fieldsOf(await owner.agent.post(inStudio('formats')).send(format).expect(400))).toEqual(['step']);
  });

  it('a page format with 400 steps along each side is taken, and its id is as legible as any text', async () => {
    const format = { ...PAGE_FORMATS[0]!, id: 'wall\ud800\u202e', width: 160_000, height: 160_000, gap: 2, step: 400, minMargin: 0 };
    const { body } = await owner.agent.post(inStudio('formats')).send(format).expect(201);
    expect(body).toEqual({ ...format, id: 'wall' });
    expect((await owner.agent.get(inStudio('formats')).expect(200)).body.formats).toContainEqual(body);
  });
});
