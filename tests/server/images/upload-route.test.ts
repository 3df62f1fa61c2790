import { randomUUID } from 'node:crypto';
import { request } from 'node:http';
import { beforeAll, describe, expect, it } from 'vitest';
import { problemSchema } from '#shared/contracts/common';
import { MAX_UPLOAD_BYTES, uploadedPrintSchema } from '#shared/contracts/prints';
import { withPictureApp, type Person } from '../../support/picture-app';
import { hugePng, noisy, sharpOf } from '../../support/pictures';

const app = withPictureApp();
let owner: Person;
beforeAll(async () => {
  owner = await app().signUp();
});

const blob = (bytes: Uint8Array | string): Blob => new Blob([typeof bytes === 'string' ? bytes : new Uint8Array(bytes)]);
const jpeg = async (seed: number): Promise<Blob> => blob(await sharpOf(noisy(300, 200, seed)).jpeg().toBuffer());
const problem = async (response: Response) => {
  expect(response.headers.get('content-type')).toContain('application/problem+json');
  return problemSchema.parse(await response.json());
};
const uploaded = async (response: Response) => {
  expect(response.status).toBe(201);
  return uploadedPrintSchema.parse(await response.json());
};

describe('POST /studios/:studioId/prints', () => {
  it('makes a print, and recognises the same file', async () => {
    const first = await uploaded(await app().upload(owner, owner.studioId, await jpeg(1), {}, 'Harbour_day.jpg'));
    expect(first).toMatchObject({ known: false, print: { title: 'Harbour day', studioId: owner.studioId } });
    const second = await uploaded(await app().upload(owner, owner.studioId, await jpeg(1), {}, 'again.jpg'));
    expect(second).toMatchObject({ known: true, print: { id: first.print.id } });
  });

  it('takes the id and the pile that the client names, before or after the file', async () => {
    const pileId = randomUUID();
    const headers = { 'content-type': 'application/json' };
    await app().ask(owner, `/studios/${owner.studioId}/piles`, { method: 'POST', headers, body: JSON.stringify({ id: pileId, name: 'Us' }) });
    const id = randomUUID();
    const form = new FormData();
    form.append('file', await jpeg(2), 'later.jpg');
    form.append('id', id);
    form.append('pileId', pileId);
    const { print } = await uploaded(await app().ask(owner, `/studios/${owner.studioId}/prints`, { method: 'POST', body: form }));
    expect(print).toMatchObject({ id, pileId });
    const repeat = await uploaded(await app().upload(owner, owner.studioId, await jpeg(2), { id, pileId }));
    expect(repeat).toMatchObject({ known: false, print: { id } });
  });

  it.each([
    ['../../etc/cron.d/evil.jpg', 'evil'],
    [`${'n'.repeat(500)}.jpg`, 'n'.repeat(120)],
    ['photo\u202Egpj.jpg', 'photogpj'],
    ['Größe, 東京 🌊.jpg', 'Größe, 東京 🌊'],
  ])('titles a file named %j', async (name, title) => {
    const { print } = await uploaded(await app().upload(owner, owner.studioId, await jpeg(name.length + 100), {}, name));
    expect(print.title).toBe(title);
  });

  it.each<[string, () => Blob | Promise<Blob>, number, string, RegExp]>([
    ['text named .jpg', () => blob('no picture'), 422, 'picture-refused', /not a picture/],
    ['an empty file', () => blob(''), 422, 'picture-refused', /empty/],
    ['a 30000 × 30000 PNG', () => blob(hugePng(30_000, 30_000)), 422, 'picture-refused', /100 megapixels/],
    ['a file of 60 MB', () => blob(Buffer.alloc(60 * 1024 * 1024)), 413, 'too-large', /larger than 50 MB/],
    ['a file one byte too large', () => blob(Buffer.alloc(MAX_UPLOAD_BYTES + 1)), 413, 'too-large', /larger than 50 MB/],
    ['a file of exactly the limit that is no picture', () => blob(Buffer.alloc(MAX_UPLOAD_BYTES)), 422, 'picture-refused', /not a picture/],
  ])('refuses %s', async (_name, make, status, code, words) => {
    const response = await app().upload(owner, owner.studioId, await make());
    expect(response.status).toBe(status);
    const { code: told, detail } = await problem(response);
    expect(told).toBe(code);
    expect(detail).toMatch(words);
    expect(await app().incomingFiles()).toEqual([]);
  });

  it('refuses a form without a file, with an unknown field, with two files, or with an id that is none', async () => {
    const refusals = [
      await app().upload(owner, owner.studioId, null, {}),
      await app().upload(owner, owner.studioId, await jpeg(3), { colour: 'red' }),
      await app().upload(owner, owner.studioId, await jpeg(3), { id: '../x' }),
      await app().upload(owner, owner.studioId, await jpeg(3), { pileId: randomUUID() }),
      await app().ask(owner, `/studios/${owner.studioId}/prints`, { method: 'POST', headers: { 'content-type': 'application/json' }, body: '{}' }),
    ];
    const two = new FormData();
    two.append('file', await jpeg(3), 'a.jpg');
    two.append('file', await jpeg(4), 'b.jpg');
    refusals.push(await app().ask(owner, `/studios/${owner.studioId}/prints`, { method: 'POST', body: two }));
    const told = await Promise.all(refusals.map(problem));
    expect(told.map(({ status, code, fields }) => [status, code, fields?.[0]?.path])).toEqual([
      [422, 'picture-refused', undefined],
      [400, 'invalid-input', 'colour'],
      [400, 'invalid-input', 'id'],
      [400, 'invalid-input', 'pileId'],
      [422, 'picture-refused', undefined],
      [400, 'invalid-input', 'file'],
    ]);
    expect(await app().incomingFiles()).toEqual([]);
  });

  it('leaves nothing of an upload that breaks off', async () => {
    const { hostname, port } = new URL(app().url);
    await new Promise<void>((resolve) => {
      const upload = request({
        hostname,
        port,
        method: 'POST',
        path: `/api/studios/${owner.studioId}/prints`,
        headers: { cookie: owner.cookie, 'content-type': 'multipart/form-data; boundary=edge', 'content-length': 1_000_000 },
      });
      upload.on('error', () => resolve());
      upload.on('close', () => resolve());
      upload.write('--edge\r\ncontent-disposition: form-data; name="file"; filename="half.jpg"\r\n\r\n');
      upload.write(Buffer.alloc(200_000));
      setTimeout(() => upload.destroy(), 300);
    });
    for (let i = 0; i < 100 && (await app().incomingFiles()).length > 0; i += 1) await new Promise((resolve) => setTimeout(resolve, 50));
    expect(await app().incomingFiles()).toEqual([]);
  });

  it('takes what is good of 200 files at once and says of each other what is wrong, in bounded memory', async () => {
    const person = await app().signUp();
    const good = await Promise.all(Array.from({ length: 20 }, (_, i) => jpeg(1000 + i)));
    const before = process.memoryUsage().rss;
    let peak = 0;
    const watch = setInterval(() => (peak = Math.max(peak, process.memoryUsage().rss)), 50);
    const answers = await Promise.all(
      Array.from({ length: 200 }, async (_, i) => {
        const response = await app().upload(person, person.studioId, i % 10 === 0 ? good[i / 10]! : blob(`not picture ${i}`), {}, `${i}.jpg`);
        return { status: response.status, body: (await response.json()) as { detail?: string } };
      }),
    );
    clearInterval(watch);
    expect(answers.filter(({ status }) => status === 201)).toHaveLength(20);
    const refused = answers.filter(({ status }) => status === 422);
    expect(refused).toHaveLength(180);
    for (const { body } of refused) expect(body.detail).toMatch(/not a picture/);
    expect(peak - before).toBeLessThan(300 * 1024 * 1024);
    expect(await app().incomingFiles()).toEqual([]);
  });
});

describe('who may add prints', () => {
  it('nobody who is signed out, no outsider, no reviewer', async () => {
    const [outsider, reviewer] = [await app().signUp(), await app().signUp()];
    await app().join(reviewer, owner.studioId, 'reviewer');
    const statuses = [];
    for (const person of [null, outsider, reviewer]) statuses.push((await app().upload(person, owner.studioId, await jpeg(5))).status);
    expect(statuses).toEqual([401, 404, 403]);
    expect((await app().upload(owner, randomUUID(), await jpeg(5))).status).toBe(404);
  });

  it('a contributor to shared piles only, and learns nothing of other people’s prints', async () => {
    const contributor = await app().signUp();
    await app().join(contributor, owner.studioId, 'contributor');
    const headers = { 'content-type': 'application/json' };
    const piles = [randomUUID(), randomUUID()] as const;
    for (const id of piles) {
      await app().ask(owner, `/studios/${owner.studioId}/piles`, { method: 'POST', headers, body: JSON.stringify({ id, name: 'Pile' }) });
    }
    await app().ask(owner, `/piles/${piles[0]}`, { method: 'PATCH', headers, body: JSON.stringify({ sharedWithContributors: true }) });

    const mine = await uploaded(await app().upload(contributor, owner.studioId, await jpeg(6), { pileId: piles[0] }));
    expect(mine).toMatchObject({ known: false, print: { pileId: piles[0] } });
    const unshared = await app().upload(contributor, owner.studioId, await jpeg(7), { pileId: piles[1] });
    expect(unshared.status).toBe(404);
    const none = await app().upload(contributor, owner.studioId, await jpeg(7));
    expect(none.status).toBe(403);

    const secret = await uploaded(await app().upload(owner, owner.studioId, await jpeg(8), {}, 'Secret party.jpg'));
    const same = await uploaded(await app().upload(contributor, owner.studioId, await jpeg(8), { pileId: piles[0] }, 'x.jpg'));
    expect(same.known).toBe(false);
    expect(same.print.id).not.toBe(secret.print.id);
    expect(same.print.title).toBe('x');
    expect((await app().ask(contributor, `/pictures/${secret.print.id}/small`)).status).toBe(404);
    expect((await app().ask(contributor, `/pictures/${same.print.id}/small`)).status).toBe(200);
  });
});
