import { useMutation, useQueryClient, type QueryClient } from '@tanstack/react-query';
import { pileSchema, printSchema, type UpdatePrint } from '#shared/contracts/prints';
import { changePrint } from '#shared/model/change-print';
import type { Print } from '#shared/model/print';
import { api } from '@/lib/api';
import { newId } from '@/lib/ids';
import { pilesQuery, printsQuery } from './print-queries';

export type PrintChange = Omit<UpdatePrint, 'baseRevision' | 'binned'>;

const putPrint = (client: QueryClient, studioId: string, id: string, change: (print: Print) => Print): void => {
  client.setQueryData(printsQuery(studioId).queryKey, (prints) => prints?.map((print) => (print.id === id ? change(print) : print)));
};

/**
 * Changes what is known of a print. The table shows the guess at once; a refusal takes it back by asking
 * the server again, so that a print changed by someone else shows as it is now.
 */
export function useUpdatePrint(studioId: string) {
  const client = useQueryClient();
  const { queryKey } = printsQuery(studioId);
  const mutationKey = ['prints', 'update', studioId];
  return useMutation({
    mutationKey,
    // Saves queue up, so that each reads the revision that the one before it got.
    scope: { id: `prints:${studioId}` },
    mutationFn: ({ id, ...change }: PrintChange & { readonly id: string }) => {
      const baseRevision = client.getQueryData(queryKey)?.find((print) => print.id === id)?.revision ?? 0;
      return api.patch(`/prints/${id}`, printSchema, { ...change, baseRevision } satisfies UpdatePrint);
    },
    onMutate: async ({ id, ...change }) => {
      const cancelled = client.cancelQueries({ queryKey });
      putPrint(client, studioId, id, (print) => changePrint(print, change));
      await cancelled;
    },
    onSuccess: (saved) => {
      // While later changes wait for their turn, their guesses stand: only the revision is news.
      const isLast = client.isMutating({ mutationKey }) === 1;
      putPrint(client, studioId, saved.id, (print) => (isLast ? saved : { ...print, revision: saved.revision }));
      // An album's pictures carry their prints along: they must not keep the old size.
      return client.invalidateQueries({ queryKey: ['albums'] });
    },
    onError: () => client.invalidateQueries({ queryKey }),
  });
}

/** Throws a print away for good. The server refuses while a spread shows it. */
export function useDeletePrint(studioId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (id: string) => api.delete(`/prints/${id}`),
    onSuccess: () => client.invalidateQueries(printsQuery(studioId)),
  });
}

export function useCreatePile(studioId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (name: string) => api.post(`/studios/${studioId}/piles`, pileSchema, { id: newId(), name }),
    onSuccess: () => client.invalidateQueries(pilesQuery(studioId)),
  });
}

export function useUpdatePile(studioId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: ({ id, ...change }: { readonly id: string; readonly name?: string; readonly sharedWithContributors?: boolean }) =>
      api.patch(`/piles/${id}`, pileSchema, change),
    onSuccess: () => client.invalidateQueries(pilesQuery(studioId)),
  });
}

/** Takes a pile's name away; its prints lie loose afterwards. */
export function useDeletePile(studioId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (id: string) => api.delete(`/piles/${id}`),
    onSuccess: () => Promise.all([client.invalidateQueries(pilesQuery(studioId)), client.invalidateQueries(printsQuery(studioId))]),
  });
}
