import { queryOptions } from '@tanstack/react-query';
import { memberListSchema } from '#shared/contracts/accounts';
import { albumListSchema, albumSchema, formatListSchema, spreadListSchema } from '#shared/contracts/albums';
import { api } from '@/lib/api';

/** Keys and reads of albums and what hangs on them. */
export const albumQueries = {
  list: (studioId: string) =>
    queryOptions({
      queryKey: ['albums', 'of', studioId],
      queryFn: async ({ signal }) => (await api.get(`/studios/${studioId}/albums`, albumListSchema, { signal })).albums,
    }),
  detail: (albumId: string) =>
    queryOptions({
      queryKey: ['albums', albumId],
      queryFn: ({ signal }) => api.get(`/albums/${albumId}`, albumSchema, { signal }),
    }),
  spreads: (albumId: string) =>
    queryOptions({
      queryKey: ['albums', albumId, 'spreads'],
      queryFn: ({ signal }) => api.get(`/albums/${albumId}/spreads`, spreadListSchema, { signal }),
      // A spread is changed on another screen; coming back must show it.
      staleTime: 0,
    }),
  members: (studioId: string) =>
    queryOptions({
      queryKey: ['members', studioId],
      queryFn: async ({ signal }) => (await api.get(`/studios/${studioId}/members`, memberListSchema, { signal })).members,
    }),
  formats: (studioId: string) =>
    queryOptions({
      queryKey: ['formats', studioId],
      queryFn: async ({ signal }) => (await api.get(`/studios/${studioId}/formats`, formatListSchema, { signal })).formats,
    }),
};
