import { queryOptions } from '@tanstack/react-query';
import { stashListSchema } from '#shared/contracts/stash';
import type { StashSheet } from '#shared/model/stash';
import { api } from '@/lib/api';

/** Every sheet of a studio, in the order in which it was entered. */
export const stashQuery = (studioId: string) =>
  queryOptions({
    queryKey: ['stash', studioId],
    queryFn: async ({ signal }): Promise<readonly StashSheet[]> => (await api.get(`/studios/${studioId}/stash`, stashListSchema, { signal })).sheets,
  });
