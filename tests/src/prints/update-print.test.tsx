import { QueryClientProvider } from '@tanstack/react-query';
import { act, renderHook, waitFor } from '@testing-library/react';
import { expect, it } from 'vitest';
import type { Print } from '#shared/model/print';
import { useUpdatePrint } from '@/features/prints/api/print-mutations';
import { printsQuery } from '@/features/prints/api/print-queries';
import { createQueryClient } from '@/lib/query-client';
import { buildPrint, idOf } from '../../support/builders';
import { fakeApi } from '../../support/fake-api';

const STUDIO_ID = idOf(1, 9);

it('keeps the guess of a change that waits, when the one before it is answered', async () => {
  const client = createQueryClient();
  const { queryKey } = printsQuery(STUDIO_ID);
  let stored: Print = buildPrint({ studioId: STUDIO_ID, copies: 1, title: 'Pim', revision: 4 });
  const seen: Pick<Print, 'title' | 'copies'>[] = [];
  const calls = fakeApi({
    'PATCH /prints/:printId': ({ body }) => {
      const { baseRevision, ...change } = body as { baseRevision: number; copies?: number; title?: string };
      stored = { ...stored, ...change, revision: baseRevision + 1 };
      return [200, stored];
    },
  });
  client.setQueryData(queryKey, [stored]);
  client.getQueryCache().subscribe(() => {
    const [print] = client.getQueryData(queryKey) ?? [];
    if (print) seen.push({ title: print.title, copies: print.copies });
  });
  const { result } = renderHook(() => useUpdatePrint(STUDIO_ID), {
    wrapper: ({ children }) => <QueryClientProvider client={client}>{children}</QueryClientProvider>,
  });
  act(() => {
    result.current.mutate({ id: stored.id, title: 'Pim on the grass' });
    result.current.mutate({ id: stored.id, copies: 2 });
  });
  await waitFor(() => expect(client.getQueryData(queryKey)?.[0]?.revision).toBe(6));
  expect(calls.map(({ body }) => body)).toEqual([
    { title: 'Pim on the grass', baseRevision: 4 },
    { copies: 2, baseRevision: 5 },
  ]);
  const firstGuessed = seen.findIndex(({ copies }) => copies === 2);
  expect(seen.slice(firstGuessed).every(({ title, copies }) => title === 'Pim on the grass' && copies === 2)).toBe(true);
});
