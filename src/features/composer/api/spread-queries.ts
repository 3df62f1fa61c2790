import { queryOptions } from '@tanstack/react-query';
import { spreadDetailSchema } from '#shared/contracts/albums';
import { jobSchema, type CreateExport, type Job } from '#shared/contracts/exports';
import { editListSchema, postEditsResponseSchema, type LoggedEdit, type PostEdits, type PostEditsResponse } from '#shared/contracts/edits';
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

const LOG_PAGE = 500;

/** The whole log after a revision, in order. */
export async function getEdits(spreadId: string, afterRevision: number): Promise<readonly LoggedEdit[]> {
  const { edits } = await api.get(`/spreads/${spreadId}/edits?after=${afterRevision}&limit=${LOG_PAGE}`, editListSchema);
  const last = edits.at(-1);
  return last && edits.length === LOG_PAGE ? [...edits, ...(await getEdits(spreadId, last.revision))] : edits;
}
