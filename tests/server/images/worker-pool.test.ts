import { afterEach, describe, expect, it } from 'vitest';
import { Refusal } from '#server/images/worker-messages';
import { WorkerPool, type PoolOptions } from '#server/images/worker-pool';
import type { Trial } from '../../support/trial-worker';

const MEBIBYTE = 1024 * 1024;
const pools: WorkerPool<Trial, number>[] = [];
afterEach(async () => {
  await Promise.all(pools.splice(0).map((pool) => pool.close()));
});

function poolWith(options: Partial<PoolOptions> = {}): WorkerPool<Trial, number> {
  const pool = new WorkerPool<Trial, number>({
    script: new URL('../../support/trial-worker.ts', import.meta.url),
    size: 1,
    maxWaiting: 10,
    idleMs: 10_000,
    maxRssBytes: 400 * MEBIBYTE,
    timeLimitMs: 20_000,
    ...options,
  });
  pools.push(pool);
  return pool;
}

const isRunning = (pid: number): boolean => {
  try {
    return process.kill(pid, 0);
  } catch {
    return false;
  }
};

async function until(isMet: () => boolean): Promise<void> {
  for (let i = 0; i < 400 && !isMet(); i += 1) await new Promise((resolve) => setTimeout(resolve, 25));
  if (!isMet()) throw new Error('It did not come about within ten seconds');
}

describe('WorkerPool', () => {
  it('does tasks in another process, and the next ones in the same', async () => {
    const pool = poolWith();
    const first = await pool.run({ kind: 'pid', delayMs: 0 });
    expect(first).not.toBe(process.pid);
    expect(await pool.run({ kind: 'pid', delayMs: 0 })).toBe(first);
  });

  it('hands on a refusal with its data, and keeps the process', async () => {
    const pool = poolWith();
    const before = await pool.run({ kind: 'pid', delayMs: 0 });
    const error: unknown = await pool.run({ kind: 'refuse' }).catch((thrown: unknown) => thrown);
    expect(error).toBeInstanceOf(Refusal);
    expect(error).toMatchObject({ reason: 'gif', data: { kind: 'GIF' } });
    await expect(pool.run({ kind: 'fail' })).rejects.toThrow('a bug');
    expect(await pool.run({ kind: 'pid', delayMs: 0 })).toBe(before);
  });

  it('ends a process that grows past its memory, and does the next task in a new one', async () => {
    const pool = poolWith();
    const before = await pool.run({ kind: 'pid', delayMs: 0 });
    await expect(pool.run({ kind: 'grow', mebibytes: 4096 })).rejects.toMatchObject({ end: 'memory' });
    const after = await pool.run({ kind: 'pid', delayMs: 0 });
    expect(after).not.toBe(before);
    expect(isRunning(before)).toBe(false);
  });

  it('ends a process that takes too long', async () => {
    const pool = poolWith({ timeLimitMs: 1500 });
    await expect(pool.run({ kind: 'hang' })).rejects.toMatchObject({ end: 'time' });
    expect(await pool.run({ kind: 'answer', value: 7 })).toBe(7);
  });

  it('tries a task once more when its process is killed from outside, and then gives up', async () => {
    const pool = poolWith();
    const answer = pool.run({ kind: 'pid', delayMs: 1500 });
    await until(() => pool.busyPids.length === 1);
    const first = pool.busyPids[0]!;
    process.kill(first, 'SIGKILL');
    expect(await answer).not.toBe(first);

    const lost = pool.run({ kind: 'hang' }).catch((thrown: unknown) => thrown);
    for (let i = 0; i < 2; i += 1) {
      await until(() => pool.busyPids.length === 1 && isRunning(pool.busyPids[0]!));
      const pid = pool.busyPids[0]!;
      process.kill(pid, 'SIGKILL');
      await until(() => pool.busyPids[0] !== pid);
    }
    expect(await lost).toMatchObject({ end: 'crash' });
  });

  it('refuses a task when too many wait', async () => {
    const pool = poolWith({ maxWaiting: 2 });
    const accepted = [1, 2, 3].map(() => pool.run({ kind: 'pid', delayMs: 200 }));
    await expect(pool.run({ kind: 'answer', value: 1 })).rejects.toMatchObject({ code: 'unavailable' });
    expect(new Set(await Promise.all(accepted)).size).toBe(1);
  });

  it('uses no more processes than it has, and ends idle ones', async () => {
    const pool = poolWith({ size: 2, idleMs: 300 });
    const pids = new Set(await Promise.all([1, 2, 3, 4, 5].map(() => pool.run({ kind: 'pid', delayMs: 300 }))));
    expect(pids.size).toBe(2);
    await until(() => [...pids].every((pid) => !isRunning(pid)));
  });

  it('ends its processes when it closes', async () => {
    const pool = poolWith();
    const running = pool.run({ kind: 'hang' }).catch((thrown: unknown) => thrown);
    await until(() => pool.busyPids.length === 1);
    const pid = pool.busyPids[0]!;
    await pool.close();
    expect(await running).toMatchObject({ end: 'stopped' });
    expect(isRunning(pid)).toBe(false);
  });
});
