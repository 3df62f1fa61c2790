import { spawn, type ChildProcess } from 'node:child_process';
import { once } from 'node:events';
import { readFile } from 'node:fs/promises';
import { afterEach, describe, expect, it } from 'vitest';
import { isRunning, startOf } from '#server/running-process';

describe('a process', () => {
  let child: ChildProcess | null = null;
  afterEach(() => {
    child?.kill('SIGKILL');
    child = null;
  });

  it('runs from its start to its end', async () => {
    child = spawn('sleep', ['60']);
    await once(child, 'spawn');
    const pid = child.pid!;
    expect(isRunning(pid)).toBe(true);
    child.kill('SIGKILL');
    await once(child, 'exit');
    expect(isRunning(pid)).toBe(false);
  });

  it('runs no more once it has ended, even while nobody has asked how', async () => {
    // The shell becomes a program that never asks after the child that it started before.
    child = spawn('sh', ['-c', 'sleep 0 & echo $!; exec sleep 60'], { stdio: ['ignore', 'pipe', 'ignore'] });
    const pid = Number(String((await once(child.stdout!, 'data'))[0]));
    await expect.poll(async () => (await readFile(`/proc/${pid}/stat`, 'utf8')).split(') ')[1]?.[0]).toBe('Z');
    expect(isRunning(pid)).toBe(false);
  });

  it('is told from a later one with its id by the time of its start', async () => {
    child = spawn('sleep', ['60']);
    await once(child, 'spawn');
    expect(startOf(child.pid!)).toMatch(/^\d+$/);
    expect(Number(startOf(child.pid!))).toBeGreaterThanOrEqual(Number(startOf(process.pid)));
    expect(startOf(2 ** 22 + 1)).toBeNull();
  });
});
