import { useMutation, useQueryClient } from '@tanstack/react-query';
import {
  albumSchema,
  spreadSummarySchema,
  type CreateAlbum,
  type CreateSpread,
  type SpreadList,
  type UpdateSpread,
} from '#shared/contracts/albums';
import { api } from '@/lib/api';
import { newId } from '@/lib/ids';
import { albumQueries } from './album-queries';

export function useCreateAlbum(studioId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (album: Omit<CreateAlbum, 'id'>) =>
      api.post(`/studios/${studioId}/albums`, albumSchema, { ...album, id: newId() } satisfies CreateAlbum),
    onSuccess: () => client.invalidateQueries(albumQueries.list(studioId)),
  });
}

export function useRenameAlbum(albumId: string, studioId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (title: string) => api.patch(`/albums/${albumId}`, albumSchema, { title }),
    onSuccess: (album) => {
      client.setQueryData(albumQueries.detail(albumId).queryKey, album);
      return client.invalidateQueries(albumQueries.list(studioId));
    },
  });
}

export function useCreateSpread(albumId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (spread: Omit<CreateSpread, 'id'>) =>
      api.post(`/albums/${albumId}/spreads`, spreadSummarySchema, { ...spread, id: newId() } satisfies CreateSpread),
    onSuccess: () => client.invalidateQueries({ queryKey: ['albums'] }),
  });
}

/** Renames, moves or bins a spread. The list shows the guess at once and takes it back when the server refuses. */
export function useUpdateSpread(albumId: string) {
  const client = useQueryClient();
  const { queryKey } = albumQueries.spreads(albumId);
  return useMutation({
    scope: { id: `album:${albumId}:spreads` },
    mutationFn: ({ id, ...change }: UpdateSpread & { readonly id: string }) =>
      api.patch(`/spreads/${id}`, spreadSummarySchema, change satisfies UpdateSpread),
    onMutate: async ({ id, ...change }) => {
      await client.cancelQueries({ queryKey });
      const before = client.getQueryData(queryKey);
      client.setQueryData(queryKey, (list) => list && withChange(list, id, change));
      return { before };
    },
    onError: (_error, _change, guess) => client.setQueryData(queryKey, guess?.before),
    onSettled: () => client.invalidateQueries({ queryKey: ['albums'] }),
  });
}

/** The list as it will be: a moved spread takes the given place among the others, by their order. */
function withChange(list: SpreadList, id: string, { position, ...change }: UpdateSpread): SpreadList {
  const spreads = list.spreads.map((spread) => (spread.id === id ? { ...spread, ...change } : spread));
  const moved = spreads.find((spread) => spread.id === id);
  if (position === undefined || moved === undefined) return { ...list, spreads };
  const rest = spreads.filter((spread) => spread.id !== id);
  return { ...list, spreads: [...rest.slice(0, position), moved, ...rest.slice(position)] };
}
