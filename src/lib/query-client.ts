import { MutationCache, QueryCache, QueryClient } from '@tanstack/react-query';
import { ApiError } from './api';

/** Where the answer of GET /session is kept; null means signed out. */
export const SESSION_KEY = ['session'] as const;

/** The app's one cache. An answer of `unauthenticated` from anywhere ends the session on screen too. */
export function createQueryClient(): QueryClient {
  const signOutOn = (error: unknown): void => {
    if (error instanceof ApiError && error.code === 'unauthenticated') client.setQueryData(SESSION_KEY, null);
  };
  const client: QueryClient = new QueryClient({
    queryCache: new QueryCache({ onError: signOutOn }),
    mutationCache: new MutationCache({ onError: signOutOn }),
    defaultOptions: {
      queries: {
        staleTime: 30_000,
        retry: (failures, error) => error instanceof ApiError && error.code === 'unavailable' && failures < 2,
      },
      mutations: { retry: false },
    },
  });
  return client;
}
