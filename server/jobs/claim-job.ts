import type { DataSource } from 'typeorm';
import { JobEntity } from '../entities/job-entity';

/**
 * Claims the oldest job that waits or whose claim has lapsed, unless one is running: one job at a time over all
 * processes. A row that another runner is just claiming is skipped, not waited for.
 */
export function claimNextJob(dataSource: DataSource, now: Date, claimMs: number): Promise<JobEntity | null> {
  return dataSource.transaction(async (manager) => {
    const job = await manager
      .createQueryBuilder(JobEntity, 'job')
      .where("job.state = 'waiting' OR (job.state = 'running' AND job.lockedUntil <= :now)", { now })
      .orderBy('job.createdAt', 'ASC')
      .addOrderBy('job.id', 'ASC')
      .limit(1)
      .setLock('pessimistic_write')
      .setOnLocked('skip_locked')
      .getOne();
    if (!job) return null;
    const isBusy = await manager
      .createQueryBuilder(JobEntity, 'job')
      .where("job.state = 'running' AND job.lockedUntil > :now", { now })
      .getExists();
    if (isBusy) return null;
    const claimed = { state: 'running' as const, attempts: job.attempts + 1, lockedUntil: new Date(now.getTime() + claimMs) };
    await manager.update(JobEntity, { id: job.id }, claimed);
    return Object.assign(job, claimed);
  });
}
