import { useQuery } from '@tanstack/react-query';
import { useOutletContext } from 'react-router-dom';
import type { SpreadDetail } from '#shared/contracts/albums';
import { ComposeScreen } from '@/features/composer/components/compose-screen';
import { pilesQuery } from '@/features/prints/api/print-queries';

/** The Compose stage of a spread. */
export function Component() {
  const detail = useOutletContext<SpreadDetail>();
  const piles = useQuery(pilesQuery(detail.studioId));
  return <ComposeScreen title={detail.title} piles={piles.data ?? []} mayEdit={detail.may.edit} sortHref={`/spreads/${detail.id}/sort`} />;
}
