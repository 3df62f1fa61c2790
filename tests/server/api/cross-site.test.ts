import { mkdir, mkdtemp, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import supertest from 'supertest';
import { EntityNotFoundError } from 'typeorm';
import { createApp } from '#server/app';
import { withApp } from '../../support/app';

describe('requests from elsewhere', () => {
  const app = withApp();
  const own = (): string => new URL(app().url).origin;

  it.each([
    ['another site by Sec-Fetch-Site', { 'Sec-Fetch-Site': 'cross-site' }],
    ['a sibling site by Sec-Fetch-Site', { 'Sec-Fetch-Site': 'same-site' }],
    ['another origin', { Origin: 'https://elsewhere.example' }],
    ['another port of this machine', { Origin: 'http://127.0.0.1:1' }],
    ['a page without an origin', { Origin: 'null' }],
  ])('are refused: %s', async (_name, headers) => {
    const { agent, studioId } = await app().signUp();
    const answer = await agent.patch(`/api/studios/${studioId}`).set(headers).send({ name: 'Taken over' }).expect(403);
    expect(answer.body.code).toBe('cross-site');
    await agent.get(`/api/studios/${studioId}`).expect(({ body }) => expect(body.name).not.toBe('Taken over'));
  });

  it('are let through from the own pages and from scripts', async () => {
    const { agent, studioId } = await app().signUp();
    const rename = (headers: Record<string, string>) => agent.patch(`/api/studios/${studioId}`).set(headers).send({ name: 'Renamed' }).expect(200);
    await rename({ Origin: own(), 'Sec-Fetch-Site': 'same-origin' });
    await rename({});
  });

  it('may read what is public', async () => {
    await app().stranger().get('/api/health').set({ Origin: 'https://elsewhere.example', 'Sec-Fetch-Site': 'cross-site' }).expect(200);
  });
});

describe('every answer', () => {
  const app = withApp();
  let pagesDir = '';
  let served: ReturnType<typeof supertest> | null = null;

  beforeAll(async () => {
    pagesDir = await mkdtemp(join(tmpdir(), 'pairleaf-pages-'));
    await mkdir(join(pagesDir, 'assets'));
    await writeFile(join(pagesDir, 'index.html'), '<!doctype html><title>Pairleaf</title>');
    await writeFile(join(pagesDir, 'assets', 'main-4f2a.js'), 'export {};');
  });
  afterAll(() => rm(pagesDir, { recursive: true, force: true }));
  const pages = () => (served ??= supertest(createApp(app().deps, { pagesDir, checkAnswers: true })));

  it('forbids inline code and foreign sources', async () => {
    for (const path of ['/', '/api/health', '/api/nothing-here', '/assets/main-4f2a.js']) {
      const { headers } = await pages().get(path);
      const policy = String(headers['content-security-policy']);
      expect(policy, path).toContain("default-src 'self'");
      expect(policy, path).toContain("img-src 'self' blob: data:");
      expect(policy, path).not.toMatch(/unsafe|upgrade-insecure-requests|\*|https?:/);
      expect(headers['x-content-type-options'], path).toBe('nosniff');
      expect(headers['x-powered-by'], path).toBeUndefined();
    }
  });

  it('keeps hashed files for good, pages and data not at all', async () => {
    const cacheOf = async (path: string) => String((await pages().get(path)).headers['cache-control']);
    expect(await cacheOf('/assets/main-4f2a.js')).toMatch(/max-age=31536000.*immutable/);
    expect(await cacheOf('/')).toBe('no-cache');
    expect(await cacheOf('/api/health')).toBe('no-store');
  });

  it('is the app for its own addresses, and a problem for what is not there', async () => {
    await pages().get('/albums/1/spreads/2').expect(200).expect('Content-Type', /text\/html/);
    await pages().get('/robots.txt').expect(200, 'User-agent: *\nDisallow: /\n');
    const missing = await pages().get('/assets/gone.js').expect(404);
    expect(missing.body).toMatchObject({ code: 'not-found', status: 404 });
    const nothing = await pages().get('/api/nothing-here').expect(404);
    expect(nothing.body).toMatchObject({ code: 'not-found', instance: '/api/nothing-here' });
  });

  const failingWith = (error: Error) => {
    const { deps } = app();
    const broken = { ...deps, services: { ...deps.services, grants: { ...deps.services.grants, findLive: () => Promise.reject(error) } } };
    return supertest(createApp(broken as unknown as typeof deps, { pagesDir, checkAnswers: true })).get('/api/session').set('X-Pairleaf-Grant', 'x');
  };

  it('tells no detail of a bug', async () => {
    const answer = await failingWith(new Error('secret')).expect(500);
    expect(answer.body.code).toBe('bug');
    expect(JSON.stringify(answer.body)).not.toContain('secret');
  });

  it('finds nothing where a thing was deleted while it was read', async () => {
    const answer = await failingWith(new EntityNotFoundError('AlbumEntity', { id: 'secret' })).expect(404);
    expect(answer.body.code).toBe('not-found');
    expect(JSON.stringify(answer.body)).not.toContain('secret');
  });

  it('asks to try again, and tells no detail, where the database is away', async () => {
    const answer = await failingWith(Object.assign(new Error('connect ECONNREFUSED secret:3306'), { code: 'ECONNREFUSED' })).expect(503);
    expect(answer.body.code).toBe('unavailable');
    expect(answer.headers['retry-after']).toMatch(/^\d+$/);
    expect(JSON.stringify(answer.body)).not.toContain('secret');
  });
});
