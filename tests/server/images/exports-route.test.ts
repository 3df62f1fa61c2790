import { randomUUID } from 'node:crypto';
import { readdir } from 'node:fs/promises';
import { join } from 'node:path';
import { setTimeout as sleep } from 'node:timers/promises';
import sharp from 'sharp';
import { beforeAll, describe, expect, it } from 'vitest';
import { JobEntity } from '#server/entities/job-entity';
import { EXPORT_LIMITS, type ExportPool } from '#server/images/pools';
import { WorkerPool } from '#server/images/worker-pool';
import { ExportService } from '#server/services/export-service';
import { problemSchema } from '#shared/contracts/common';
import { jobSchema, KEEP_EXPORTS_DAYS, type CreateExport, type Job } from '#shared/contracts/exports';
import { uploadedPrintSchema } from '#shared/contracts/prints';
import { errorSentence } from '#shared/words/en/errors';
import { EXPORT_TOO_HEAVY } from '#shared/words/en/exports';
import { buildMat, printContent } from '../../support/builders';
import { withPictureApp, type Person } from '../../support/picture-app';
import { patches, sharpOf } from '../../support/pictures';

const app = withPictureApp();
let owner: Person;
let spreadId: string;

const json = (body: unknown): RequestInit => ({ method: 'POST', headers: { 'content-type': 'application/json' }, body: JSON.stringify(body) });
const begin = (values: Partial<CreateExport> = {}, person: Person | null = owner) =>
  app().ask(person, `/spreads/${spreadId}/exports`, json({ id: randomUUID(), format: 'png', size: 'screen', revision: 1, ...values }));

beforeAll(async () => {
  owner = await app().signUp();
  const red = await sharpOf(patches([[[200, 40, 30]]], 300)).png().toBuffer();
  const upload = await app().upload(owner, owner.studioId, new Blob([new Uint8Array(red)]));
  const { print } = uploadedPrintSchema.parse(await upload.json());
  const albumId = randomUUID();
  spreadId = randomUUID();
  await app().ask(owner, `/studios/${owner.studioId}/albums`, json({ id: albumId, title: 'Skerrow', formatId: '12x12in' }));
  await app().ask(owner, `/albums/${albumId}/spreads`, json({ id: spreadId, title: 'Tide: “out” / Ærø' }));
  const mat = buildMat({ id: randomUUID(), x: 0, y: 0, w: 8, h: 8, color: '#1f4f5f', content: printContent(print, { x: 0, y: 0 }) });
  const edit = { id: randomUUID(), command: 'mats.add', patch: { [`mat/${mat.id}`]: { before: null, after: mat } } };
  const edits = await app().ask(owner, `/spreads/${spreadId}/edits`, json({ baseRevision: 0, edits: [edit] }));
  expect(edits.status).toBe(200);
});

async function ended(job: Job): Promise<Job> {
  for (let i = 0; i < 600; i += 1) {
    const now = jobSchema.parse(await (await app().ask(owner, `/jobs/${job.id}`)).json());
    if (now.state === 'done' || now.state === 'failed') return now;
    await sleep(100);
  }
  throw new Error('The export did not end within a minute');
}

async function exported(values: Partial<CreateExport> = {}): Promise<Job> {
  const response = await begin(values);
  expect(response.status).toBe(202);
  return ended(jobSchema.parse(await response.json()));
}

const fileOf = (job: Job, person: Person | null = owner) => app().ask(person, `/jobs/${job.id}/file`);

/** Colour in the middle of the mat, whose photo is red once it is there. */
async function colorOnMat(file: Buffer): Promise<number[]> {
  const { data, info } = await sharp(file).raw().toBuffer({ resolveWithObject: true });
  const at = (Math.round(info.width * 0.1) * info.width + Math.round(info.width * 0.1)) * info.channels;
  return [...data.subarray(at, at + 3)];
}

describe('POST /spreads/:spreadId/exports', () => {
  it('draws the spread as a job and gives the file under the spread’s name', async () => {
    const job = await exported();
    expect(job).toMatchObject({ state: 'done', progress: 1, failure: null, resultUrl: `/api/jobs/${job.id}/file` });
    const response = await fileOf(job);
    expect(Object.fromEntries(response.headers)).toMatchObject({
      'content-type': 'image/png',
      'cache-control': 'private, max-age=3600',
      'x-content-type-options': 'nosniff',
    });
    // RFC 6266: a plain name for old clients and the true one in UTF-8.
    expect(response.headers.get('content-disposition')).toMatch(/^attachment; filename="[ -~]+\.png"; filename\*=UTF-8''Tide%20%E2%80%9Cout%E2%80%9D%20%C3%86r%C3%B8\.png$/);
    const file = Buffer.from(await response.arrayBuffer());
    expect(await sharp(file).metadata()).toMatchObject({ width: 2400, height: 1200 });
    const [r, g, b] = await colorOnMat(file);
    expect([r! > 180, g! < 60, b! < 60]).toEqual([true, true, true]);
  });

  it('draws the revision that was asked for, not the newest', async () => {
    const file = Buffer.from(await (await fileOf(await exported({ revision: 0 }))).arrayBuffer());
    const [r, g, b] = await colorOnMat(file);
    expect(Math.min(r!, g!, b!)).toBeGreaterThan(150);
  });

  it('makes a JPEG at 300 ppi', async () => {
    const response = await fileOf(await exported({ format: 'jpeg', size: 'print' }));
    expect(response.headers.get('content-type')).toBe('image/jpeg');
    const file = Buffer.from(await response.arrayBuffer());
    expect(await sharp(file).metadata()).toMatchObject({ format: 'jpeg', width: 7200, height: 3600, density: 300 });
  });

  it('answers a repeated request with the same job', async () => {
    const id = randomUUID();
    const [first, second] = [await begin({ id }), await begin({ id })];
    const jobs = [jobSchema.parse(await first.json()), jobSchema.parse(await second.json())];
    expect(jobs.map((job) => job.id)).toEqual([id, id]);
    await ended(jobs[0]!);
  });

  it('refuses a revision that is not reached, and fields that do not fit', async () => {
    const unknown = problemSchema.parse(await (await begin({ revision: 99 })).json());
    expect([unknown.status, unknown.fields?.[0]?.path]).toEqual([400, 'revision']);
    const wrong = problemSchema.parse(await (await begin({ size: 'huge' as 'print', format: 'gif' as 'png' })).json());
    expect(wrong.fields?.map(({ path }) => path).sort()).toEqual(['format', 'size']);
  });

  it('is for members who may see the spread, and so is its file', async () => {
    const [reviewer, contributor, outsider] = [await app().signUp(), await app().signUp(), await app().signUp()];
    await app().join(reviewer, owner.studioId, 'reviewer');
    await app().join(contributor, owner.studioId, 'contributor');
    const statuses = [];
    for (const person of [reviewer, contributor, outsider, null]) statuses.push((await begin({}, person)).status);
    expect(statuses).toEqual([202, 404, 404, 401]);
    const job = await exported();
    const files = [];
    for (const person of [reviewer, contributor, outsider, null]) files.push((await fileOf(job, person)).status);
    expect(files).toEqual([200, 404, 404, 401]);
  });

  it('keeps a file for a week, and says nothing of one after that', async () => {
    const job = await exported({ format: 'jpeg' });
    const { manager } = app().app.deps.dataSource;
    await manager.update(JobEntity, { id: job.id }, { finishedAt: new Date(Date.now() - KEEP_EXPORTS_DAYS * 86_400_000 - 1000) });
    const folder = join(app().dataDir, 'files', owner.studioId, 'exports');
    expect(await readdir(folder)).toContain(`${job.id}.jpg`);
    await app().app.deps.services.exports.dropExpired();
    expect(await readdir(folder)).not.toContain(`${job.id}.jpg`);
    expect((await fileOf(job)).status).toBe(404);
    expect(jobSchema.parse(await (await app().ask(owner, `/jobs/${job.id}`)).json()).resultUrl).toBeNull();
  });

  it.each([
    ['memory', { maxRssBytes: 60 * 1024 * 1024 }],
    ['time', { timeLimitMs: 300 }],
  ] as const)('fails with a sentence when drawing takes too much %s, and leaves nothing', async (_what, limits) => {
    const { deps } = app().app;
    const pool: ExportPool = new WorkerPool({
      script: new URL('../../../server/images/export-worker.ts', import.meta.url),
      size: 1,
      maxWaiting: 1,
      idleMs: 1000,
      ...EXPORT_LIMITS,
      ...limits,
    });
    const exports = new ExportService({ ...deps, jobs: deps.services.jobs, pool, freeDiskBytes: 0 });
    const job = await deps.services.jobs.get((await exported({ revision: 0 })).id);
    const context = { progress: async () => undefined, signal: new AbortController().signal };
    const error: unknown = await exports.run(job, context).catch((thrown: unknown) => thrown);
    await pool.close();
    expect(error).toMatchObject({ code: 'unavailable', data: { reason: 'export-too-heavy' } });
    expect(errorSentence('unavailable', { reason: 'export-too-heavy' })).toBe(EXPORT_TOO_HEAVY);
  });

  it('leaves nothing on its way', async () => {
    expect(await app().incomingFiles()).toEqual([]);
  });
});
