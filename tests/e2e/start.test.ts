import { spawn } from 'node:child_process';
import { once } from 'node:events';
import { mkdtemp, rm, writeFile } from 'node:fs/promises';
import { createServer } from 'node:net';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterEach, describe, expect, it } from 'vitest';
import { DEMO_ACCOUNTS } from '#server/setup/demo/accounts';
import { findFreePort } from '#server/setup/mariadb/ports';
import type { AppProcess } from '../support/app-process';
import { startApp } from '../support/app-process';

const owner = DEMO_ACCOUNTS.find(({ role }) => role === 'owner')!;

const signIn = (url: string, account: { email: string; password: string }): Promise<Response> =>
  fetch(`${url}/api/session`, {
    method: 'POST',
    headers: { 'content-type': 'application/json' },
    body: JSON.stringify({ email: account.email, password: account.password }),
  });

/** Without the demo, which takes its time to load. */
const BARE = { PAIRLEAF_MODE: 'production' };

describe('npm start', () => {
  const apps: AppProcess[] = [];
  const folders: string[] = [];
  const start = async (...args: Parameters<typeof startApp>): Promise<AppProcess> => {
    const app = await startApp(...args);
    apps.push(app);
    return app;
  };
  const emptyFolder = async (): Promise<string> => {
    const folder = await mkdtemp(join(tmpdir(), 'pairleaf-start-'));
    folders.push(folder);
    return folder;
  };
  afterEach(async () => {
    for (const app of apps.splice(0).reverse()) await app.remove();
    for (const folder of folders.splice(0)) await rm(folder, { recursive: true, force: true });
  });

  it('prints the address and the demo accounts, lets each of them in, and ends cleanly on Ctrl-C', async () => {
    const app = await start();
    expect(app.output()).toContain(app.url);
    for (const account of DEMO_ACCOUNTS) {
      expect(app.output()).toContain(account.password);
      expect((await signIn(app.url, account)).status).toBe(200);
    }
    expect((await fetch(`${app.url}/api/health`)).status).toBe(200);
    expect(await app.interrupt()).toBe(0);
    await expect(fetch(app.url)).rejects.toThrow();
  });

  it('keeps everything when app and database are killed at once', async () => {
    const first = await start({ env: BARE });
    const person = { email: 'lore@mill.example', password: 'a-long-enough-password' };
    const signUp = await fetch(`${first.url}/api/accounts`, {
      method: 'POST',
      headers: { 'content-type': 'application/json' },
      body: JSON.stringify({ ...person, name: 'Lore Millward', studioName: 'Mill Studio' }),
    });
    expect(signUp.ok).toBe(true);
    await first.kill();
    const second = await start({ dataDir: first.dataDir }); // a demo now, but the demo is for empty databases only
    expect((await signIn(second.url, person)).status).toBe(200);
    expect(second.output()).not.toContain('Loading the demo');
  });

  it('refuses a second start over the same data, and leaves the first one alone', async () => {
    const first = await start({ env: BARE });
    await expect(startApp({ dataDir: first.dataDir, env: BARE })).rejects.toThrow(/already running/);
    expect((await fetch(`${first.url}/api/health`)).status).toBe(200);
  });

  it('says which port is taken and how to choose another', async () => {
    const port = await findFreePort();
    const squatter = createServer().listen(port, '127.0.0.1');
    await once(squatter, 'listening');
    try {
      await expect(startApp({ dataDir: await emptyFolder(), env: { PORT: String(port) } })).rejects.toThrow(
        new RegExp(`Port ${port} .* taken[^]*PORT=\\d+ npm start`),
      );
    } finally {
      squatter.close();
    }
  });

  it('refuses a public address in demo mode', async () => {
    await expect(startApp({ dataDir: await emptyFolder(), env: { HOST: '0.0.0.0' } })).rejects.toThrow(/PAIRLEAF_MODE=production/);
  });

  it('has no demo accounts in production', async () => {
    const app = await start({ env: BARE });
    expect((await signIn(app.url, owner)).status).toBe(401);
    expect(app.output()).not.toContain(owner.password);
  });

  it('loads the demo anew when the first load was cut short', async () => {
    const app = await start();
    await app.interrupt();
    await writeFile(join(app.dataDir, 'demo-half-loaded'), '');
    const again = await start({ dataDir: app.dataDir });
    expect(again.output()).toContain('Loading the demo');
    expect((await signIn(again.url, owner)).status).toBe(200);
  });

  it('ends cleanly when it is stopped while starting', async () => {
    const folder = await emptyFolder();
    const env = { ...process.env, ...BARE, PORT: String(await findFreePort()), DATA_DIR: folder };
    const child = spawn(process.execPath, ['--import', 'tsx', 'server/setup/start.ts'], {
      env,
      stdio: ['ignore', 'pipe', 'inherit'],
    });
    await once(child.stdout, 'data'); // its first step
    child.kill('SIGTERM');
    expect(await once(child, 'exit')).toEqual([0, null]);
    await start({ dataDir: folder, env: BARE });
  });
});
