import { Suspense } from 'react';
import { useParams } from 'react-router-dom';
import { PAGE_FORMATS } from '#shared/model/page-format';
import { DEFAULT_REVEAL } from '#shared/model/trim-settings';
import { TopBar } from '@/components/top-bar';
import { SortView } from '@/features/prints/components/sort-view';
import { AccountMenu } from '@/features/session/components/account-menu';
import { useMay, useStudio } from '@/lib/session';
import { NotFound } from './not-found';

/** All prints of a studio, in their piles. Tags are for the first shipped format of the studio's unit. */
export function Component() {
  const { studioId } = useParams();
  const studio = useStudio(studioId);
  const may = useMay();
  if (studio === undefined || !may('print:see', { studioId: studio.id })) return <NotFound />;
  const format = PAGE_FORMATS.find(({ unit }) => unit === studio.unit) ?? PAGE_FORMATS[0]!;
  return (
    <>
      <title>{`Prints · ${studio.name} · Pairleaf`}</title>
      <TopBar crumbs={[{ label: studio.name, to: `/studios/${studio.id}` }]} title="Prints">
        <AccountMenu />
      </TopBar>
      <main>
        <h1 className="sr-only">Prints of {studio.name}</h1>
        <Suspense fallback={<p className="p-6 text-ink-2">Laying out…</p>}>
          <SortView
            studioId={studio.id}
            sizing={{ format, reveal: DEFAULT_REVEAL, trim: studio.trim, unit: studio.unit }}
            mayEdit={may('print:edit', { studioId: studio.id })}
            mayDelete={may('print:delete', { studioId: studio.id })}
          />
        </Suspense>
      </main>
    </>
  );
}
