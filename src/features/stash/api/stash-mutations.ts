import { useMutation, useQueryClient, type QueryClient } from '@tanstack/react-query';
import {
  colorReadingSchema,
  importedStashSchema,
  stashListSchema,
  stashSheetSchema,
  type BulkStash,
  type CreateStashSheet,
  type Mark,
  type UpdateStashSheet,
} from '#shared/contracts/stash';
import type { Reference } from '#shared/colour/white-balance';
import type { StashFacts, StashSheet } from '#shared/model/stash';
import { api } from '@/lib/api';
import { newId } from '@/lib/ids';
import { upload } from '@/lib/upload';
import { stashQuery } from './stash-queries';

const putSheet = (client: QueryClient, studioId: string, id: string, change: (sheet: StashSheet) => StashSheet): void => {
  client.setQueryData(stashQuery(studioId).queryKey, (sheets) => sheets?.map((sheet) => (sheet.id === id ? change(sheet) : sheet)));
};

export function useAddSheet(studioId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (facts: StashFacts) => api.post(`/studios/${studioId}/stash`, stashSheetSchema, { ...facts, id: newId() } satisfies CreateStashSheet),
    onSuccess: () => client.invalidateQueries(stashQuery(studioId)),
  });
}

/** Changes what is known of sheets. The table shows the guess at once; a refusal takes it back by asking the server again. */
export function useUpdateSheet(studioId: string) {
  const client = useQueryClient();
  const { queryKey } = stashQuery(studioId);
  return useMutation({
    // Saves queue up, so that each reads the revision that the one before it got.
    scope: { id: `stash:${studioId}` },
    mutationFn: ({ id, ...change }: Partial<StashFacts> & { readonly id: string }) => {
      const baseRevision = client.getQueryData(queryKey)?.find((sheet) => sheet.id === id)?.revision ?? 0;
      return api.patch(`/stash-sheets/${id}`, stashSheetSchema, { ...change, baseRevision } satisfies UpdateStashSheet);
    },
    onMutate: async ({ id, ...change }) => {
      await client.cancelQueries({ queryKey });
      putSheet(client, studioId, id, (sheet) => ({ ...sheet, ...change }));
    },
    onSuccess: (saved) => putSheet(client, studioId, saved.id, () => saved),
    onError: () => client.invalidateQueries({ queryKey }),
  });
}

export function useBulkStash(studioId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (bulk: BulkStash) => api.post(`/studios/${studioId}/stash/bulk`, stashListSchema, bulk),
    onSuccess: ({ sheets }) => client.setQueryData(stashQuery(studioId).queryKey, sheets),
  });
}

export function useRemoveSheet(studioId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (id: string) => api.delete(`/stash-sheets/${id}`),
    onSuccess: () => client.invalidateQueries(stashQuery(studioId)),
  });
}

export function useImportStash(studioId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (file: { readonly id: string; readonly csv: string }) => api.post(`/studios/${studioId}/stash/import`, importedStashSchema, file),
    onSuccess: () => client.invalidateQueries(stashQuery(studioId)),
  });
}

interface ReadingRequest {
  readonly file: File;
  readonly sheet: Mark;
  readonly patch: Mark;
  readonly reference: Reference;
}

/** Reads a sheet's colour from a photo; nothing is stored. */
export function useReadColor(studioId: string) {
  return useMutation({
    mutationFn: ({ file, sheet, patch, reference }: ReadingRequest) => {
      const query = new URLSearchParams({
        sheetX: String(sheet.x),
        sheetY: String(sheet.y),
        patchX: String(patch.x),
        patchY: String(patch.y),
        reference,
      });
      const form = new FormData();
      form.set('file', file);
      return upload(`/studios/${studioId}/stash/readings?${query.toString()}`, form, colorReadingSchema);
    },
  });
}
