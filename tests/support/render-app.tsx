import { QueryClientProvider } from '@tanstack/react-query';
import { render } from '@testing-library/react';
import { Suspense, type ReactNode } from 'react';
import { MemoryRouter } from 'react-router-dom';
import type { Session } from '#shared/contracts/accounts';
import type { Role } from '#shared/model/people';
import { TRIM_SETTINGS_INCH } from '#shared/model/trim-settings';
import { LiveRegion } from '@/components/live-region';
import { createQueryClient } from '@/lib/query-client';
import { SessionContext } from '@/lib/session';
import { idOf } from './builders';

export const STUDIO_ID = idOf(1, 9);

/** Somebody signed in, with one studio. */
export const buildSession = (role: Role = 'owner'): Session => ({
  user: { id: idOf(1, 7), name: 'Marit', email: 'marit@milllane.example' },
  studios: [{ id: STUDIO_ID, name: 'Mill Lane Studio', role, unit: 'in', trim: TRIM_SETTINGS_INCH }],
  mode: 'demo',
});

/** Renders part of a screen as it stands in the app: signed in, with a cache, an address and a live region. */
export function renderInApp(children: ReactNode, { role = 'owner', at = '/' }: { readonly role?: Role; readonly at?: string } = {}) {
  return render(
    <QueryClientProvider client={createQueryClient()}>
      <MemoryRouter initialEntries={[at]}>
        <SessionContext value={buildSession(role)}>
          <LiveRegion>
            <Suspense fallback="Laying out…">{children}</Suspense>
          </LiveRegion>
        </SessionContext>
      </MemoryRouter>
    </QueryClientProvider>,
  );
}
