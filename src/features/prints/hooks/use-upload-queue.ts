import { useQueryClient, type QueryClient } from '@tanstack/react-query';
import { useStore, type StoreApi } from 'zustand';
import { uploadedPrintSchema } from '#shared/contracts/prints';
import { ApiError } from '@/lib/api';
import { sentenceOf } from '@/lib/form-errors';
import { newId } from '@/lib/ids';
import { useSession } from '@/lib/session';
import { upload } from '@/lib/upload';
import { printsQuery } from '../api/print-queries';
import { createUploadQueue, type UploadQueueState } from '../model/upload-queue';

/** Queues outlive the screen, so that files go on arriving while one looks at something else. */
const queues = new Map<string, StoreApi<UploadQueueState>>();

function queueFor(userId: string, studioId: string, client: QueryClient): StoreApi<UploadQueueState> {
  const key = `${userId} ${studioId}`;
  const existing = queues.get(key);
  if (existing !== undefined) return existing;
  const queue = createUploadQueue({
    makeId: newId,
    send: (file, id, pileId, onProgress) => {
      const form = new FormData();
      form.append('id', id);
      if (pileId !== null) form.append('pileId', pileId);
      form.append('file', file);
      return upload(`/studios/${studioId}/prints`, form, uploadedPrintSchema, { onProgress });
    },
    onArrived: () => void client.invalidateQueries(printsQuery(studioId)),
    explain: (error) => ({
      reason: sentenceOf(error),
      mayRetry: error instanceof ApiError && (error.code === 'unavailable' || error.code === 'too-many-requests' || error.code === 'bug'),
    }),
  });
  queues.set(key, queue);
  return queue;
}

/** The files on their way into a studio. */
export function useUploadQueue(studioId: string): UploadQueueState {
  const client = useQueryClient();
  const { user } = useSession();
  return useStore(queueFor(user.id, studioId, client));
}
