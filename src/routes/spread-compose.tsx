import { useQuery } from '@tanstack/react-query';
import { useMemo } from 'react';
import { useOutletContext } from 'react-router-dom';
import { indexStash } from '#shared/colour/snap';
import type { SpreadDetail } from '#shared/contracts/albums';
import { ComposeScreen } from '@/features/composer/components/compose-screen';
import { StashProvider } from '@/features/composer/hooks/stash-context';
import { pilesQuery } from '@/features/prints/api/print-queries';
import { stashQuery } from '@/features/stash/api/stash-queries';
import { useMay } from '@/lib/session';

/** The Compose stage of a spread. */
export function Component() {
  const detail = useOutletContext<SpreadDetail>();
  const piles = useQuery(pilesQuery(detail.studioId));
  const maySee = useMay()('stash:see', { studioId: detail.studioId });
  const { data: sheets } = useQuery({ ...stashQuery(detail.studioId), enabled: maySee });
  const stash = useMemo(() => sheets && indexStash(sheets), [sheets]);
  return (
    <StashProvider value={stash ?? null}>
      <ComposeScreen title={detail.title} piles={piles.data ?? []} mayEdit={detail.may.edit} sortHref={`/spreads/${detail.id}/sort`} />
    </StashProvider>
  );
}
