import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import { healthSchema, sessionSchema, type Session, type SignIn, type SignUp } from '#shared/contracts/accounts';
import { api, ApiError } from '@/lib/api';
import { SESSION_KEY } from '@/lib/query-client';

/** Who is signed in; null when nobody is. */
export const sessionQuery = queryOptions({
  queryKey: SESSION_KEY,
  queryFn: async ({ signal }): Promise<Session | null> => {
    try {
      return await api.get('/session', sessionSchema, { signal });
    } catch (error) {
      if (error instanceof ApiError && error.code === 'unauthenticated') return null;
      throw error;
    }
  },
  staleTime: 60_000,
});

/** What the sign-in page may know of the server: in demo mode, the accounts to try. */
export const healthQuery = queryOptions({
  queryKey: ['health'],
  queryFn: ({ signal }) => api.get('/health', healthSchema, { signal }),
  staleTime: Infinity,
  retry: false,
});

/** Enters: the session's data replaces whatever an earlier person left in the cache. */
function useEnter<Input>(path: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (input: Input) => api.post(path, sessionSchema, input),
    onSuccess: (session) => {
      client.removeQueries({ predicate: ({ queryKey }) => queryKey[0] !== SESSION_KEY[0] && queryKey[0] !== 'health' });
      client.setQueryData(SESSION_KEY, session);
    },
  });
}

export const useSignIn = () => useEnter<SignIn>('/session');
export const useSignUp = () => useEnter<SignUp>('/accounts');

export function useSignOut() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: () => api.delete('/session'),
    onSuccess: () => {
      client.clear();
      client.setQueryData(SESSION_KEY, null);
    },
  });
}
