import { z } from 'zod';
import { idSchema } from '../../shared/contracts/common';
import { jobSchema } from '../../shared/contracts/exports';
import { presentJob } from '../presenters/present-job';
import type { Services } from '../services/services';
import { guardedRoute, type Route } from './define-route';

export const jobParamsSchema = z.strictObject({ jobId: idSchema });

export const jobRoutes = ({ jobs }: Services): Route[] => [
  guardedRoute({
    method: 'get',
    path: '/jobs/:jobId',
    summary: 'How far a job is',
    params: jobParamsSchema,
    needs: 'export:make',
    on: ({ jobId }) => jobs.locate(jobId),
    answer: { status: 200, schema: jobSchema },
    handle: async ({ subject }) => presentJob(subject),
  }),
];
