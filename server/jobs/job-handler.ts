import type { JobEntity } from '../entities/job-entity';

export interface JobContext {
  /** Tells how far the work is, 0 to 1, and holds the claim; throws when the claim was lost to another runner. */
  progress(share: number): Promise<void>;
  /** Aborted when the server stops: end soon, the job will be taken up again. */
  readonly signal: AbortSignal;
}

/**
 * Does one job. What it returns is stored as the job's result. An AppError fails the job for good and its sentence
 * is shown; any other error is tried again, up to `MAX_ATTEMPTS`. A handler must bear being run twice.
 */
export type JobHandler = (job: JobEntity, context: JobContext) => Promise<object | null>;

/** By the job's kind. */
export type JobHandlers = Readonly<Record<string, JobHandler>>;
