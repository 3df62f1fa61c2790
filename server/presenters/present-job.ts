import type { Job } from '../../shared/contracts/exports';
import { errorSentence } from '../../shared/words/en/errors';
import type { JobEntity } from '../entities/job-entity';

export const presentJob = (job: JobEntity): Job => ({
  id: job.id,
  kind: job.kind,
  state: job.state,
  progress: job.progress,
  failure: job.failure ? errorSentence(job.failure.code, job.failure.data) : null,
  resultUrl: job.state === 'done' && job.result !== null ? `/api/jobs/${job.id}/file` : null,
  createdAt: job.createdAt.toISOString(),
});
