import { randomUUID } from 'node:crypto';
import { beforeAll, beforeEach, describe, expect, it } from 'vitest';
import type { SpreadDetail } from '#shared/contracts/albums';
import type { DocumentFault } from '#shared/model/document-faults';
import type { Mat } from '#shared/model/spread';
import { beginSpread, insertPrint, withApp, type Person } from '../../support/app';
import { buildMat, buildPanes, printContent } from '../../support/builders';
import { PatchBuilder } from '../../support/patches';

describe('a document that would not fit together', () => {
  const app = withApp();
  let owner: Person;
  let spread: SpreadDetail;
  const edits = new PatchBuilder();

  beforeAll(async () => {
    owner = await app().signUp();
  });
  beforeEach(async () => {
    spread = await beginSpread(owner);
  });

  const post = (list: readonly object[]) => owner.agent.post(`/api/spreads/${spread.id}/edits`).send({ baseRevision: 0, edits: list });
  const mat = (parts: Partial<Mat> = {}): Mat => buildMat({ id: randomUUID(), ...parts });

  async function refused(...mats: Mat[]): Promise<DocumentFault[]> {
    const answer = await post(mats.map((each) => edits.add(each))).expect(422);
    expect(answer.body).toMatchObject({ code: 'document-refused', status: 422 });
    expect(answer.body.detail).toMatch(/: .*\./);
    const { revision } = (await owner.agent.get(`/api/spreads/${spread.id}`)).body as SpreadDetail;
    expect(revision).toBe(0);
    return answer.body.data.faults as DocumentFault[];
  }

  it('is refused with a mat off the page', async () => {
    const off = mat({ x: 19 });
    expect(await refused(off)).toMatchObject([{ code: 'off-grid', matIds: [off.id] }]);
  });

  it('is refused with a mat over another, unless it is laid over', async () => {
    const [under, over] = [mat(), mat({ x: 2 })];
    expect(await refused(under, over)).toMatchObject([{ code: 'overlap' }]);
    await post([edits.add(under), edits.add({ ...over, laidOver: true })]).expect(200);
  });

  it('is refused naming every fault, not the first only', async () => {
    const faults = await refused(mat({ x: 19 }), mat({ y: 10 }), mat({ y: 11 }));
    expect(faults.map(({ code }) => code).sort()).toEqual(['off-grid', 'overlap']);
  });

  it('is refused with a print that the studio does not have', async () => {
    const stranger = await app().signUp();
    const foreign = await insertPrint(app().deps, stranger.studioId);
    const carrying = mat({ content: printContent(foreign) });
    expect(await refused(carrying)).toMatchObject([{ code: 'unknown-print', data: { printId: foreign.id } }]);
    expect(await refused(mat({ content: printContent(randomUUID()) }))).toMatchObject([{ code: 'unknown-print' }]);
  });

  it('is refused with panes that no group holds', async () => {
    const { mats } = buildPanes(null, [mat(), mat({ x: 6 })], { id: randomUUID() });
    expect((await refused(...mats)).map(({ code }) => code)).toContain('pane-without-group');
  });

  it.each([
    ['a size that is not whole steps', { w: 3.5 }, 'after.w'],
    ['a place that is not whole steps', { x: 0.25 }, 'after.x'],
    ['a size of nothing', { h: 0 }, 'after.h'],
    ['a colour in words', { color: 'teal' }, 'after.color'],
    ['a page that no spread has', { page: 'middle' }, 'after.page'],
    ['a field that no mat has', { opacity: 1 }, 'after.opacity'],
  ])('is refused by its shape with %s', async (_name, parts, path) => {
    const odd = { ...mat(), ...parts };
    const answer = await post([{ id: randomUUID(), command: 'mats.add', patch: { [`mat/${odd.id}`]: { before: null, after: odd } } }]).expect(400);
    expect((answer.body.fields as { path: string }[]).map((field) => field.path)).toEqual([`edits.0.patch.mat/${odd.id}.${path}`]);
  });

  it.each([
    ['a key that no document has', 'mats/all', { before: null, after: null }],
    ['no reveal', 'reveal', { before: 508, after: null }],
    ['no table', 'table', { before: [], after: 7 }],
  ])('is refused by its shape with %s', async (_name, key, change) => {
    const answer = await post([{ id: randomUUID(), command: 'x', patch: { [key]: change } }]).expect(400);
    expect(JSON.stringify(answer.body.fields)).toContain(key);
  });

  it('is refused when a key names another mat than its value', async () => {
    const [named, inside] = [randomUUID(), mat()];
    const answer = await post([{ id: randomUUID(), command: 'x', patch: { [`mat/${named}`]: { before: null, after: inside } } }]).expect(400);
    expect(answer.body.fields).toEqual([{ path: `mat/${named}.after.id`, message: 'must be the id that the key names' }]);
  });

  it('is refused over 256 kB, by the rule for documents and not by the parser', async () => {
    const text = 'ß'.repeat(3_900);
    const big = Array.from({ length: 40 }, (_, n) =>
      mat({ w: 2, h: 2, x: 2 * (n % 10), y: 2 * Math.floor(n / 10), content: { kind: 'journaling', text, color: '#000000', lineHeight: 1000 } }),
    );
    expect(await refused(...big)).toMatchObject([{ code: 'document-too-large', data: { max: 262_144 } }]);
  });

  it('is refused unread when the body is beyond all measure', async () => {
    const answer = await post([{ id: randomUUID(), command: 'x'.repeat(2_000_000), patch: {} }]).expect(413);
    expect(answer.body.code).toBe('too-large');
  });

  it('is refused with more mats than a spread holds', async () => {
    const many = Array.from({ length: 161 }, (_, n) => mat({ w: 1, h: 1, x: n % 22, y: Math.floor(n / 22) }));
    const answer = await owner.agent
      .post(`/api/spreads/${spread.id}/edits`)
      .send({ baseRevision: 0, edits: [{ id: randomUUID(), command: 'x', patch: Object.fromEntries(many.map((each) => [`mat/${each.id}`, { before: null, after: each }])) }] });
    expect(answer.status).toBe(400);
    expect(answer.body.fields).toMatchObject([{ path: 'mats' }]);
  });
});
