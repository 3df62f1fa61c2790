import { useParams } from 'react-router-dom';
import { CHECK_IDS, type CheckId } from '#shared/checks/check-ids';
import { CHECK_HELP } from '#shared/words/en/check-help';
import { TopBar } from '@/components/top-bar';
import { CheckPage } from '@/features/help/components/check-page';
import '@/features/help/help.css';
import { NotFound } from './not-found';

/** `/help/checks/:checkId`: one check. */
export function Component() {
  const { checkId } = useParams();
  const id = CHECK_IDS.find((known): known is CheckId => known === checkId);
  if (id === undefined) return <NotFound />;
  return (
    <>
      <TopBar crumbs={[{ label: 'Help', to: '/help' }]} title={CHECK_HELP[id].name} />
      <CheckPage id={id} />
    </>
  );
}
