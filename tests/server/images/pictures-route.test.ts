import { randomUUID } from 'node:crypto';
import { rm } from 'node:fs/promises';
import { get } from 'node:http';
import { join } from 'node:path';
import sharp from 'sharp';
import { beforeAll, describe, expect, it } from 'vitest';
import { FileEntity } from '#server/entities/file-entity';
import { pictureKey } from '#server/storage/storage';
import { PICTURE_SIZES, pictureUrl, uploadedPrintSchema, type PictureSize } from '#shared/contracts/prints';
import { withPictureApp, type Person } from '../../support/picture-app';
import { noisy, sharpOf } from '../../support/pictures';

const app = withPictureApp();
let owner: Person;
let printId: string;
beforeAll(async () => {
  owner = await app().signUp();
  const file = new Blob([new Uint8Array(await sharpOf(noisy(2400, 1600)).jpeg().toBuffer())]);
  printId = uploadedPrintSchema.parse(await (await app().upload(owner, owner.studioId, file)).json()).print.id;
});

const picture = (person: Person | null, size: string, init?: RequestInit) => app().ask(person, `/pictures/${printId}/${size}`, init);

/** As a browser asks; `fetch` would add that it wants no cached answer. */
const revalidate = (cookie: string, etag: string): Promise<{ status: number | undefined; bytes: number }> =>
  new Promise((resolve, reject) => {
    const headers = { cookie, 'if-none-match': etag };
    get(`${app().url}${pictureUrl(printId, 'small')}`, { headers }, (response) => {
      let bytes = 0;
      response.on('data', (chunk: Buffer) => (bytes += chunk.length));
      response.on('end', () => resolve({ status: response.statusCode, bytes }));
    }).on('error', reject);
  });

describe('GET /pictures/:printId/:size', () => {
  it.each(Object.entries(PICTURE_SIZES) as [PictureSize, number][])('serves the %s size, %d px wide, to keep for good but privately', async (size, width) => {
    const response = await app().ask(owner, pictureUrl(printId, size).replace('/api', ''));
    expect(response.status).toBe(200);
    expect(Object.fromEntries(response.headers)).toMatchObject({
      'content-type': 'image/webp',
      'cache-control': 'private, max-age=31536000, immutable',
      'x-content-type-options': 'nosniff',
      etag: expect.stringMatching(new RegExp(`^"[0-9a-f]{64}-${size}"$`)),
    });
    const body = Buffer.from(await response.arrayBuffer());
    expect(body.length).toBe(Number(response.headers.get('content-length')));
    expect(await sharp(body).metadata()).toMatchObject({ format: 'webp', width });
  });

  it('answers that nothing has changed to whoever has it, and still asks who that is', async () => {
    const etag = (await picture(owner, 'small')).headers.get('etag')!;
    expect(await revalidate(owner.cookie, etag)).toEqual({ status: 304, bytes: 0 });
    expect(await revalidate('', etag)).toMatchObject({ status: 401 });
    expect(await revalidate(owner.cookie, '"another"')).toMatchObject({ status: 200 });
  });

  it('is for members only', async () => {
    const statuses = [];
    for (const role of ['reviewer', 'designer'] as const) {
      const member = await app().signUp();
      await app().join(member, owner.studioId, role);
      statuses.push((await picture(member, 'small')).status);
    }
    const contributor = await app().signUp();
    await app().join(contributor, owner.studioId, 'contributor');
    statuses.push((await picture(contributor, 'small')).status, (await picture(await app().signUp(), 'small')).status, (await picture(null, 'small')).status);
    expect(statuses).toEqual([200, 200, 404, 404, 401]);
  });

  it('knows no other size and no other print', async () => {
    expect((await picture(owner, 'original')).status).toBe(400);
    expect((await app().ask(owner, `/pictures/${randomUUID()}/small`)).status).toBe(404);
    expect((await app().ask(owner, '/pictures/..%2F..%2Fetc/small')).status).toBe(400);
  });

  it('answers HEAD without a body', async () => {
    const response = await picture(owner, 'small', { method: 'HEAD' });
    expect(response.status).toBe(200);
    expect(Number(response.headers.get('content-length'))).toBeGreaterThan(100);
    expect(await response.text()).toBe('');
  });

  it('says that it is our mistake when a stored file is gone', async () => {
    const { sha256 } = await app().app.deps.dataSource.manager.findOneByOrFail(FileEntity, { studioId: owner.studioId });
    await rm(join(app().dataDir, 'files', pictureKey(owner.studioId, sha256, 'medium')));
    expect((await picture(owner, 'medium')).status).toBe(500);
  });
});
