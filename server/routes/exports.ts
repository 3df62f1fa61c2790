import { create as contentDisposition } from 'content-disposition';
import { z } from 'zod';
import { idSchema } from '../../shared/contracts/common';
import { createExportSchema, jobSchema } from '../../shared/contracts/exports';
import { AppError } from '../../shared/errors';
import { fileNameFromTitle } from '../../shared/model/file-name-from-title';
import { presentJob } from '../presenters/present-job';
import type { ExportService } from '../services/export-service';
import type { JobService } from '../services/job-service';
import type { SpreadService } from '../services/spread-service';
import type { Storage } from '../storage/storage';
import { guardedRoute } from './define-route';
import { sendStored } from './send-stored';

interface Deps {
  readonly spreads: SpreadService;
  readonly jobs: JobService;
  readonly exports: ExportService;
  readonly storage: Storage;
}

const MEDIA_TYPES = { png: 'image/png', jpeg: 'image/jpeg' } as const;

export const exportRoutes = ({ spreads, jobs, exports, storage }: Deps) => [
  guardedRoute({
    method: 'post',
    path: '/spreads/:spreadId/exports',
    summary: 'Begins a preview picture of the spread, as a job.',
    params: z.strictObject({ spreadId: idSchema }),
    body: createExportSchema,
    answer: { status: 202, schema: jobSchema },
    errors: ['disk-full', 'already-exists'],
    needs: 'export:make',
    on: ({ spreadId }) => spreads.locate(spreadId),
    handle: async ({ actor, subject, body }) => presentJob(await exports.request(subject, body, actor.userId)),
  }),
  guardedRoute({
    method: 'get',
    path: '/jobs/:jobId/file',
    summary: 'The file that a job made, for as long as it is kept.',
    params: z.strictObject({ jobId: idSchema }),
    answer: { status: 200, streams: Object.values(MEDIA_TYPES) },
    needs: 'export:make',
    on: ({ jobId }) => jobs.locate(jobId),
    handle: async ({ subject, req, res }) => {
      const { key, result } = exports.fileOf(subject);
      const { title } = await spreads.get(subject.spreadId ?? '');
      const stored = await storage.get(key);
      if (!stored) throw new AppError('not-found');
      res.set({
        'Cache-Control': 'private, max-age=3600',
        'Content-Type': MEDIA_TYPES[result.format],
        'X-Content-Type-Options': 'nosniff',
        'Content-Disposition': contentDisposition(fileNameFromTitle(title, 'spread', result.extension)),
      });
      await sendStored(req, res, stored);
    },
  }),
];
