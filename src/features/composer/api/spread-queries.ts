import { queryOptions } from '@tanstack/react-query';
import { spreadDetailSchema } from '#shared/contracts/albums';
import { jobSchema, type CreateExport, type Job } from '#shared/contracts/exports';
import { postEditsResponseSchema, type PostEdits, type PostEditsResponse } from '#shared/contracts/edits';
import { api, type RequestOptions } from '@/lib/api';

/** All that Compose needs of one spread. Never refetched by itself: while open, the editor's store is the truth. */
export const spreadQuery = (spreadId: string) =>
  queryOptions({
    queryKey: ['spreads', 'detail', spreadId],
    queryFn: ({ signal }) => api.get(`/spreads/${spreadId}`, spreadDetailSchema, { signal }),
    staleTime: Infinity,
    gcTime: 0,
    refetchOnWindowFocus: false,
    refetchOnReconnect: false,
  });

export const postEdits = (spreadId: string, body: PostEdits, options: RequestOptions = {}): Promise<PostEditsResponse> =>
  api.post(`/spreads/${spreadId}/edits`, postEditsResponseSchema, body, options);

export const startExport = (spreadId: string, body: CreateExport): Promise<Job> => api.post(`/spreads/${spreadId}/exports`, jobSchema, body);

/** A job's state, asked again until it has ended. */
export const jobQuery = (jobId: string | null) =>
  queryOptions({
    queryKey: ['jobs', jobId],
    queryFn: ({ signal }) => api.get(`/jobs/${jobId}`, jobSchema, { signal }),
    enabled: jobId !== null,
    refetchInterval: ({ state }) => (state.data?.state === 'done' || state.data?.state === 'failed' ? false : 400),
  });
