import { In, type DataSource } from 'typeorm';
import { AppError } from '../../shared/errors';
import type { Target } from '../../shared/model/people';
import { JobEntity } from '../entities/job-entity';
import { isDangling, isDuplicateKey } from './database-errors';

export interface NewJob {
  readonly id: string;
  readonly studioId: string;
  readonly spreadId: string | null;
  readonly kind: string;
  /** Plain JSON. */
  readonly payload: object;
  /** A job with the same key that waits or runs is taken instead of a new one. */
  readonly dedupeKey: string | null;
  readonly createdBy: string | null;
}

export class JobService {
  private onEnqueued: () => void = () => undefined;

  constructor(
    private readonly dataSource: DataSource,
    private readonly now: () => Date,
  ) {}

  /** Lets the runner of this process know at once, rather than at its next look. */
  whenEnqueued(tell: () => void): void {
    this.onEnqueued = tell;
  }

  /** @throws AppError('not-found'). */
  async get(id: string): Promise<JobEntity> {
    const job = await this.dataSource.manager.findOneBy(JobEntity, { id });
    if (!job) throw new AppError('not-found');
    return job;
  }

  async locate(id: string): Promise<{ readonly target: Target; readonly subject: JobEntity }> {
    const subject = await this.get(id);
    return {
      target: { studioId: subject.studioId, ...(subject.spreadId !== null && { spreadId: subject.spreadId }) },
      subject,
    };
  }

  /**
   * Puts a job in the queue. The same job again (by id, or by key while it waits or runs) is answered with the
   * job that is there.
   *
   * @throws AppError `already-exists` when the id is another job's, `not-found` when its spread was deleted meanwhile.
   */
  async enqueue(job: NewJob): Promise<JobEntity> {
    const row = {
      ...job,
      state: 'waiting' as const,
      attempts: 0,
      progress: 0,
      lockedUntil: null,
      result: null,
      failure: null,
      createdAt: this.now(),
      finishedAt: null,
    };
    try {
      await this.dataSource.manager.insert(JobEntity, row);
      this.onEnqueued();
      return this.dataSource.manager.create(JobEntity, row);
    } catch (error) {
      if (isDangling(error)) throw new AppError('not-found');
      if (!isDuplicateKey(error)) throw error;
      return this.findSame(job);
    }
  }

  private async findSame({ id, studioId, spreadId, kind, dedupeKey }: NewJob): Promise<JobEntity> {
    const byId = await this.dataSource.manager.findOneBy(JobEntity, { id });
    if (byId && byId.studioId === studioId && byId.spreadId === spreadId && byId.kind === kind) return byId;
    const byKey = dedupeKey !== null && (await this.dataSource.manager.findOneBy(JobEntity, { studioId, dedupeKey, state: In(['waiting', 'running']) }));
    if (!byId && byKey) return byKey;
    throw new AppError('already-exists', { what: 'job', id });
  }
}
