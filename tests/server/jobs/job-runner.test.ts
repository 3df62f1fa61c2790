import { randomUUID } from 'node:crypto';
import { pino } from 'pino';
import { beforeEach, describe, expect, it } from 'vitest';
import { JobEntity } from '#server/entities/job-entity';
import { StudioEntity } from '#server/entities/studio-entity';
import type { JobHandlers } from '#server/jobs/job-handler';
import { MAX_ATTEMPTS, runNextJob, startJobRunner } from '#server/jobs/job-runner';
import { presentJob } from '#server/presenters/present-job';
import { JobService } from '#server/services/job-service';
import { AppError } from '#shared/errors';
import { withDatabase } from '../../support/database';

const MINUTE_MS = 60_000;

describe('the job runner', () => {
  const database = withDatabase();
  const studioId = randomUUID();
  let clock = new Date('2026-12-01T10:00:00Z');
  const now = (): Date => clock;

  beforeEach(async () => {
    const { manager } = database().dataSource;
    await manager.createQueryBuilder().delete().from(JobEntity).execute();
    const row = { id: studioId, name: 'S', unit: 'in' as const, tolerance: 0, finestMark: 1, hidden: false, bytesUsed: 0, bytesQuota: 1, createdAt: clock };
    await manager.upsert(StudioEntity, row, ['id']);
  });

  const jobs = (): JobService => new JobService(database().dataSource, now);
  const enqueue = (parts: { id?: string; kind?: string; dedupeKey?: string | null } = {}) =>
    jobs().enqueue({ id: randomUUID(), studioId, spreadId: null, kind: 'test.work', payload: { n: 1 }, dedupeKey: null, createdBy: null, ...parts });
  const deps = (handlers: JobHandlers) => ({ dataSource: database().dataSource, handlers, log: pino({ level: 'silent' }), now });
  const run = (handlers: JobHandlers, signal = new AbortController().signal) => runNextJob(deps(handlers), signal);

  it('does the oldest job first and keeps its result', async () => {
    const first = await enqueue();
    clock = new Date(clock.getTime() + 1);
    const second = await enqueue();
    const order: string[] = [];
    const handlers: JobHandlers = {
      'test.work': async (job, { progress }) => {
        order.push(job.id);
        await progress(0.5);
        expect((await jobs().get(job.id)).progress).toBe(0.5);
        return { pages: 2 };
      },
    };
    expect([await run(handlers), await run(handlers), await run(handlers)]).toEqual([true, true, false]);
    expect(order).toEqual([first.id, second.id]);
    expect(await jobs().get(first.id)).toMatchObject({ state: 'done', progress: 1, result: { pages: 2 }, attempts: 1, lockedUntil: null });
  });

  it('does one job at a time, whoever asks', async () => {
    await enqueue();
    await enqueue();
    let [running, most] = [0, 0];
    const handlers: JobHandlers = {
      'test.work': async () => {
        running += 1;
        most = Math.max(most, running);
        await new Promise((resolve) => setTimeout(resolve, 100));
        running -= 1;
        return null;
      },
    };
    const slow = run(handlers);
    await new Promise((resolve) => setTimeout(resolve, 50));
    expect(await run(handlers)).toBe(false);
    await slow;
    expect(most).toBe(1);
  });

  it('fails a job for good with a sentence when the reason is known', async () => {
    const { id } = await enqueue();
    await run({ 'test.work': async () => Promise.reject(new AppError('disk-full')) });
    const job = await jobs().get(id);
    expect(job.state).toBe('failed');
    expect(presentJob(job)).toMatchObject({ state: 'failed', resultUrl: null, failure: expect.stringMatching(/no room left.*\.$/) });
  });

  it('tries a job that a bug broke again, but not for ever', async () => {
    const { id } = await enqueue();
    let tries = 0;
    const handlers: JobHandlers = {
      'test.work': async () => {
        tries += 1;
        throw new Error('secret detail');
      },
    };
    while (await run(handlers));
    expect(tries).toBe(MAX_ATTEMPTS);
    const job = await jobs().get(id);
    expect(presentJob(job).failure).toMatch(/our side/);
    expect(JSON.stringify(presentJob(job))).not.toContain('secret');
  });

  it('takes a job up again whose runner died, and not before its claim has lapsed', async () => {
    const { id } = await enqueue();
    const dies = new Promise<null>(() => undefined);
    void run({ 'test.work': () => dies }).catch(() => undefined);
    await expect.poll(async () => (await jobs().get(id)).state).toBe('running');
    const handlers: JobHandlers = { 'test.work': async () => ({ again: true }) };
    expect(await run(handlers)).toBe(false);
    clock = new Date(clock.getTime() + 2 * MINUTE_MS);
    expect(await run(handlers)).toBe(true);
    expect(await jobs().get(id)).toMatchObject({ state: 'done', attempts: 2, result: { again: true } });
  });

  it('goes on to the next where a job was deleted while it was done, and calls nobody for that', async () => {
    const errors: string[] = [];
    const log = pino({ level: 'error' }, { write: (line: string) => void errors.push(line) });
    await enqueue();
    const deleteItself: JobHandlers = {
      'test.work': async (job) => {
        await database().dataSource.manager.delete(JobEntity, { id: job.id });
        return {};
      },
    };
    const runner = { ...deps(deleteItself), log };
    const { signal } = new AbortController();
    expect([await runNextJob(runner, signal), await runNextJob(runner, signal)]).toEqual([true, false]);
    expect(errors).toEqual([]);
  });

  it('gives a job back when the server stops', async () => {
    const { id } = await enqueue();
    const runner = startJobRunner({
      ...deps({
        'test.work': (_job, { signal }) =>
          new Promise((_resolve, reject) => signal.addEventListener('abort', () => reject(new Error('stopped')), { once: true })),
      }),
      pollMs: 20,
    });
    await expect.poll(async () => (await jobs().get(id)).state).toBe('running');
    await runner.close();
    expect(await jobs().get(id)).toMatchObject({ state: 'waiting', attempts: 0, lockedUntil: null });
  });

  it('starts at once when a job is put in the queue', async () => {
    const runner = startJobRunner({ ...deps({ 'test.work': async () => null }), pollMs: 60 * MINUTE_MS });
    const service = jobs();
    service.whenEnqueued(runner.wake);
    await new Promise((resolve) => setTimeout(resolve, 50));
    const { id } = await service.enqueue({ id: randomUUID(), studioId, spreadId: null, kind: 'test.work', payload: {}, dedupeKey: null, createdBy: null });
    await expect.poll(async () => (await jobs().get(id)).state, { timeout: 5_000 }).toBe('done');
    await runner.close();
  });

  it('takes the same job once: by id, and by key while it waits', async () => {
    const first = await enqueue({ dedupeKey: 'spread-1:png' });
    expect((await enqueue({ id: first.id, dedupeKey: 'spread-1:png' })).id).toBe(first.id);
    expect((await enqueue({ dedupeKey: 'spread-1:png' })).id).toBe(first.id);
    await expect(enqueue({ id: first.id, kind: 'test.other' })).rejects.toMatchObject({ code: 'already-exists' });
    await run({ 'test.work': async () => null });
    expect((await enqueue({ dedupeKey: 'spread-1:png' })).id).not.toBe(first.id);
  });
});
