import { queryOptions } from '@tanstack/react-query';
import { pileListSchema, printListSchema } from '#shared/contracts/prints';
import type { Print } from '#shared/model/print';
import { api } from '@/lib/api';

/** A studio's piles, in their order. A contributor is told only of the shared ones. */
export const pilesQuery = (studioId: string) =>
  queryOptions({
    queryKey: ['piles', studioId],
    queryFn: async ({ signal }) => (await api.get(`/studios/${studioId}/piles`, pileListSchema, { signal })).piles,
  });

/** Every print of a studio, page after page. */
export const printsQuery = (studioId: string) =>
  queryOptions({
    queryKey: ['prints', studioId],
    queryFn: async ({ signal }) => {
      const all: Print[] = [];
      let cursor: string | null = null;
      do {
        const query: string = cursor === null ? '?limit=200' : `?limit=200&cursor=${encodeURIComponent(cursor)}`;
        const page = await api.get(`/studios/${studioId}/prints${query}`, printListSchema, { signal });
        all.push(...page.prints);
        cursor = page.nextCursor;
      } while (cursor !== null);
      return all;
    },
  });
