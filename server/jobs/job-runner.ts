import { randomUUID } from 'node:crypto';
import type { Logger } from 'pino';
import type { DataSource } from 'typeorm';
import { AppError, type ErrorCode, type ErrorData } from '../../shared/errors';
import { JobEntity } from '../entities/job-entity';
import { claimNextJob } from './claim-job';
import type { JobHandlers } from './job-handler';

/** A claim lapses after this long without a word from its runner, and another may take the job up. */
const CLAIM_MS = 20_000;
const RENEW_MS = 5_000;
const DEFAULT_POLL_MS = 1_000;
export const MAX_ATTEMPTS = 3;

interface RunnerDeps {
  readonly dataSource: DataSource;
  readonly handlers: JobHandlers;
  readonly log: Logger;
  readonly now: () => Date;
  readonly pollMs?: number;
  readonly claimMs?: number;
}

export interface JobRunner {
  /** Looks for a job now. */
  wake(): void;
  /** Waits for the running job to end or give up; what did not end is waiting again. */
  close(): Promise<void>;
}

/** Takes the jobs one at a time, oldest first, and takes up again what a crashed runner left. */
export function startJobRunner(deps: RunnerDeps): JobRunner {
  const { log, pollMs = DEFAULT_POLL_MS } = deps;
  const stop = new AbortController();
  let wakeUp: () => void = () => undefined;
  let isWoken = false;

  const pause = (): Promise<void> =>
    new Promise((resolve) => {
      const timer = setTimeout(resolve, isWoken ? 0 : pollMs);
      isWoken = false;
      wakeUp = () => {
        clearTimeout(timer);
        resolve();
      };
    });

  const loop = async (): Promise<void> => {
    while (!stop.signal.aborted) {
      const worked = await runNextJob(deps, stop.signal).catch((error: unknown) => {
        log.error({ err: error }, 'the job runner could not take a job');
        return false;
      });
      if (!worked && !stop.signal.aborted) await pause();
    }
  };

  const ended = loop();
  const wake = (): void => {
    isWoken = true;
    wakeUp();
  };
  return {
    wake,
    close: async () => {
      stop.abort();
      wake();
      await ended;
    },
  };
}

/** @returns whether there was a job to do. */
export async function runNextJob(deps: RunnerDeps, signal: AbortSignal): Promise<boolean> {
  const { dataSource, log, now, claimMs = CLAIM_MS } = deps;
  const job = await claimNextJob(dataSource, now(), claimMs);
  if (!job) return false;
  const claim = claimOn(dataSource, job, now, claimMs);
  const renew = (): void => void claim.renew().catch((error: unknown) => log.warn({ err: error }, 'could not renew a job'));
  const renewal = setInterval(renew, RENEW_MS).unref();
  try {
    await doJob(deps, job, claim, signal);
  } catch (error) {
    if (!(error instanceof ClaimLost)) throw error;
    log.warn({ jobId: job.id, kind: job.kind }, 'a job was deleted, or taken up by another runner, while it was done');
  } finally {
    clearInterval(renewal);
  }
  return true;
}

async function doJob({ handlers, log }: RunnerDeps, job: JobEntity, claim: Claim, signal: AbortSignal): Promise<void> {
  try {
    if (job.attempts > MAX_ATTEMPTS) throw new AppError('unavailable', { reason: 'tried-too-often' });
    const handler = handlers[job.kind];
    if (!handler) throw new Error(`no handler for jobs of kind ${job.kind}`);
    const result = await handler(job, { signal, progress: (share) => claim.renew(share) });
    await claim.end({ state: 'done', progress: 1, result });
  } catch (error) {
    if (error instanceof ClaimLost) throw error;
    if (signal.aborted) await claim.end({ state: 'waiting', attempts: job.attempts - 1 });
    else if (error instanceof AppError) await claim.fail(error.code, error.data);
    else {
      log.error({ err: error, jobId: job.id, kind: job.kind, attempt: job.attempts }, 'a job failed');
      if (job.attempts >= MAX_ATTEMPTS) await claim.fail('bug', { reference: randomUUID() });
      else await claim.end({ state: 'waiting' });
    }
  }
}

/** The job is gone, or another runner has it: what this one made of it is of no use any more. */
class ClaimLost extends Error {}

type Claim = ReturnType<typeof claimOn>;
type Ending = Partial<Pick<JobEntity, 'state' | 'progress' | 'attempts'>> & { result?: object | null; failure?: JobEntity['failure'] };

/** What a runner may do to the job that it holds; every statement checks that it still holds it. */
function claimOn(dataSource: DataSource, job: JobEntity, now: () => Date, claimMs: number) {
  const held = { id: job.id, state: 'running' as const, attempts: job.attempts };
  const change = async (changes: object): Promise<void> => {
    const { affected } = await dataSource.manager.update(JobEntity, held, changes);
    if (affected !== 1) throw new ClaimLost(`the claim on job ${job.id} was lost`);
  };
  const end = (ending: Ending): Promise<void> => {
    const isOver = ending.state !== 'waiting';
    return change({ ...ending, lockedUntil: null, ...(isOver && { dedupeKey: null, finishedAt: now() }) });
  };
  return {
    renew: (share?: number) =>
      change({ lockedUntil: new Date(now().getTime() + claimMs), ...(share !== undefined && { progress: Math.min(1, Math.max(0, share)) }) }),
    end,
    fail: (code: ErrorCode, data: ErrorData) => end({ state: 'failed', failure: { code, data } }),
  };
}
