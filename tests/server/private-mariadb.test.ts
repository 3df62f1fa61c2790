import { spawn } from 'node:child_process';
import { once } from 'node:events';
import { mkdir, mkdtemp, readFile, rm, stat } from 'node:fs/promises';
import { createServer } from 'node:net';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { createConnection } from 'mysql2/promise';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import type { PrivateMariadb } from '#server/setup/mariadb/private-mariadb';
import { startPrivateMariadb } from '#server/setup/mariadb/private-mariadb';

describe('the private database', () => {
  let folder: string;
  let running: PrivateMariadb | null;

  beforeEach(async () => {
    folder = await mkdtemp(join(tmpdir(), 'pairleaf-db-'));
    running = null;
  });
  afterEach(async () => {
    await running?.stop();
    await rm(folder, { recursive: true, force: true });
  });

  const start = async (): Promise<PrivateMariadb> => (running = await startPrivateMariadb({ folder, fast: true }));
  const stop = async (): Promise<void> => {
    await running?.stop();
    running = null;
  };

  it('keeps data, port and passwords over a stop and a start', async () => {
    const first = await start();
    await query(first.migrationUrl, 'CREATE TABLE note (words VARCHAR(40))');
    await query(first.appUrl, "INSERT INTO note VALUES ('née à l’été 🌊')");
    await stop();
    const second = await start();
    expect(second.appUrl).toBe(first.appUrl);
    expect(await query(second.appUrl, 'SELECT words FROM note')).toEqual([{ words: 'née à l’été 🌊' }]);
  });

  it('gives the app an account that cannot change tables or see other databases', async () => {
    const { appUrl } = await start();
    await expect(query(appUrl, 'CREATE TABLE mine (a INT)')).rejects.toThrow(/denied/);
    await expect(query(appUrl, 'SELECT * FROM mysql.global_priv')).rejects.toThrow(/denied/);
  });

  it('lets nobody in without a password', async () => {
    const { port } = await start();
    for (const user of ['root', 'pairleaf_app', 'pairleaf_migration', '']) {
      await expect(query(`mysql://${user}@127.0.0.1:${port}/`, 'SELECT 1')).rejects.toThrow(/denied/);
    }
  });

  it('keeps the passwords where only this account reads them', async () => {
    await start();
    expect((await stat(join(folder, 'database.json'))).mode & 0o777).toBe(0o600);
    await expect(stat(join(folder, 'db', 'accounts.sql'))).rejects.toThrow(/ENOENT/);
  });

  it('does not run as root where another account can', async () => {
    const { pid } = await start();
    const status = await readFile(`/proc/${pid}/status`, 'utf8');
    expect(/^Uid:\t(\d+)/m.exec(status)?.[1]).not.toBe('0');
  });

  it('recovers what was committed when the database was killed', async () => {
    const { migrationUrl, pid } = await start();
    await query(migrationUrl, 'CREATE TABLE note (words VARCHAR(40))');
    process.kill(pid, 'SIGKILL');
    await stop();
    const { appUrl } = await start();
    expect(await query(appUrl, 'SELECT COUNT(*) AS n FROM note')).toEqual([{ n: 0 }]);
  });

  it('tells its owner when the database is lost', async () => {
    let isLost = false;
    running = await startPrivateMariadb({ folder, fast: true, onLost: () => (isLost = true) });
    process.kill(running.pid, 'SIGKILL');
    await expect.poll(() => isLost, { timeout: 5_000 }).toBe(true);
  });

  it('moves to another port when its own is taken', async () => {
    const { port } = await start();
    await stop();
    const squatter = createServer().listen(port, '127.0.0.1');
    await once(squatter, 'listening');
    try {
      expect((await start()).port).not.toBe(port);
    } finally {
      squatter.close();
    }
  });

  it('refuses a folder that a running Pairleaf uses, at once', async () => {
    await start();
    const began = Date.now();
    await expect(startPrivateMariadb({ folder })).rejects.toThrow(/already running/);
    expect(Date.now() - began).toBeLessThan(2_000);
  });

  it('stops and replaces a database that a killed Pairleaf left running', async () => {
    const orphanPid = await startInProcessAndKillIt(folder);
    expect(await commandLineOf(orphanPid)).toContain(folder);
    const { pid } = await start();
    expect(pid).not.toBe(orphanPid);
    expect(await commandLineOf(orphanPid)).toBe('');
  });

  it('makes the database anew when the first making was interrupted', async () => {
    await start();
    await stop();
    // What an interrupted first start leaves: a half-made folder beside no finished one.
    await rm(join(folder, 'db', 'data'), { recursive: true });
    await mkdir(join(folder, 'db', 'data.new', 'mysql'), { recursive: true });
    const { appUrl } = await start();
    expect(await query(appUrl, 'SELECT 1 AS one')).toEqual([{ one: 1 }]);
  });
});

/** Empty once a process has ended, even where nobody has collected it yet. */
const commandLineOf = (pid: number): Promise<string> => readFile(`/proc/${pid}/cmdline`, 'utf8').catch(() => '');

/** Starts a database in a process of its own, kills that process, and returns the id of the orphaned database. */
async function startInProcessAndKillIt(folder: string): Promise<number> {
  const script = `
    import { startPrivateMariadb } from '#server/setup/mariadb/private-mariadb';
    startPrivateMariadb({ folder: ${JSON.stringify(folder)}, fast: true }).then(({ pid }) => console.log(pid));
    setInterval(() => {}, 1000);`;
  const owner = spawn(process.execPath, ['--import', 'tsx', '--input-type=module', '--eval', script], {
    stdio: ['ignore', 'pipe', 'inherit'],
  });
  const [line] = (await once(owner.stdout, 'data')) as [Buffer];
  owner.kill('SIGKILL');
  await once(owner, 'exit');
  return Number(line.toString());
}

async function query(url: string, sql: string): Promise<unknown> {
  const connection = await createConnection({ uri: url.replace(/^mariadb:/, 'mysql:') });
  try {
    const [rows] = await connection.query(sql);
    return rows;
  } finally {
    await connection.end();
  }
}
