import { Suspense, type ReactNode } from 'react';
import type { Studio } from '#shared/contracts/accounts';
import { StudioRail } from './studio-rail';

/** The rail and, beside it, one of a studio's screens. */
export function StudioScreen({ studio, children }: { readonly studio: Studio; readonly children: ReactNode }) {
  return (
    <div className="studio-screen">
      <StudioRail studio={studio} />
      <main className="min-w-0 px-6 max-sm:px-4">
        <Suspense fallback={<p className="pt-6 text-ink-2">Laying out…</p>}>{children}</Suspense>
      </main>
    </div>
  );
}
