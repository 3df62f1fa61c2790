import { mkdtemp, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { pino } from 'pino';
import supertest from 'supertest';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { readConfig, type Mode } from '#server/config';
import { openApp, type OpenedApp } from '#server/index';
import { withDatabase } from '../support/database';
import { TEST_PASSWORD } from '../support/app';

const DEMO = { role: 'owner' as const, email: 'hesper@quernlane.example', password: 'steel-ruler-4064' };
const OWN = { email: 'somebody@example.org', password: TEST_PASSWORD };

describe('the demo’s accounts', () => {
  const database = withDatabase();
  let dataDir: string;
  let open: OpenedApp | null = null;

  beforeEach(async () => {
    dataDir = await mkdtemp(join(tmpdir(), 'pairleaf-demo-'));
  });
  const close = async (): Promise<void> => {
    await open?.close();
    open = null;
  };
  afterEach(async () => {
    await close();
    await rm(dataDir, { recursive: true, force: true });
  });

  async function start(mode: Mode): Promise<string> {
    const config = readConfig({ DATABASE_URL: database().url, DATA_DIR: dataDir, PORT: '0', SESSION_SECRET: 'test'.repeat(10), PAIRLEAF_MODE: mode });
    open = await openApp(config, { pagesDir: null, log: pino({ level: 'silent' }), demoAccounts: [DEMO] });
    return open.listen();
  }

  it('let nobody in once the same data is no demo any more, by password or by an old session; others stay', async () => {
    const demoUrl = await start('demo');
    const visitor = supertest.agent(demoUrl);
    for (const { email, password } of [DEMO, OWN]) {
      await visitor.post('/api/accounts').send({ email, password, name: 'Hesper Dowd', studioName: 'Quern Lane' }).expect(201);
    }
    const signedIn = await supertest(demoUrl).post('/api/session').send({ email: DEMO.email, password: DEMO.password }).expect(200);
    const [cookie = ''] = signedIn.headers['set-cookie'] as unknown as string[];
    expect((await supertest(demoUrl).get('/api/health')).body.demoAccounts).toEqual([DEMO]);
    await close();

    const url = await start('production');
    expect((await supertest(url).get('/api/health').expect(200)).body).toEqual({ status: 'ok', mode: 'production' });
    const refused = await supertest(url).post('/api/session').send({ email: DEMO.email, password: DEMO.password }).expect(401);
    expect(refused.body.code).toBe('sign-in-failed');
    await supertest(url).get('/api/session').set('Cookie', cookie.split(';')[0]!).expect(401);
    await supertest(url).post('/api/session').send(OWN).expect(200);
  });
});
