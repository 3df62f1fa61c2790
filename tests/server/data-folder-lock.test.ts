import { spawn, type ChildProcess } from 'node:child_process';
import { once } from 'node:events';
import { mkdtemp, readFile, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { takeLock } from '#server/setup/mariadb/lock';

describe('the lock of a data folder', () => {
  let folder: string;
  let child: ChildProcess | null;
  beforeEach(async () => {
    folder = await mkdtemp(join(tmpdir(), 'pairleaf-lock-'));
    child = null;
  });
  afterEach(async () => {
    child?.kill('SIGKILL');
    await rm(folder, { recursive: true, force: true });
  });

  const holder = async () => JSON.parse(await readFile(join(folder, 'in-use.json'), 'utf8')) as { pid: number };
  const startedAt = async (pid: number): Promise<string | undefined> => (await readFile(`/proc/${pid}/stat`, 'utf8')).split(') ')[1]?.split(' ')[19];
  const heldBy = async (pid: number): Promise<void> => {
    await writeFile(join(folder, 'in-use.json'), JSON.stringify({ pid, started: await startedAt(pid), databasePid: null }));
  };

  it('is refused while the process that holds it lives', async () => {
    child = spawn('sleep', ['60']);
    await once(child, 'spawn');
    await heldBy(child.pid!);
    await expect(takeLock(folder)).rejects.toThrow(/already running/);
    expect((await holder()).pid).toBe(child.pid);
  });

  it('is free once that process has ended, even while nobody has asked how', async () => {
    // The shell becomes a program that never asks after the child that it started before.
    child = spawn('sh', ['-c', 'sleep 0 & echo $!; exec sleep 60'], { stdio: ['ignore', 'pipe', 'ignore'] });
    const pid = Number(String((await once(child.stdout!, 'data'))[0]));
    await expect.poll(async () => (await readFile(`/proc/${pid}/stat`, 'utf8')).split(') ')[1]?.[0]).toBe('Z');
    await heldBy(pid);
    await takeLock(folder);
    expect((await holder()).pid).toBe(process.pid);
  });
});
