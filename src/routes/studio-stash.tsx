import { useParams } from 'react-router-dom';
import { TopBar } from '@/components/top-bar';
import { StudioScreen } from '@/features/albums/components/studio-screen';
import { AccountMenu } from '@/features/session/components/account-menu';
import { StashView } from '@/features/stash/components/stash-view';
import '@/features/stash/stash.css';
import { useMay, useStudio } from '@/lib/session';
import { NotFound } from './not-found';

/** The sheets of a studio. */
export function Component() {
  const { studioId } = useParams();
  const studio = useStudio(studioId);
  const may = useMay();
  if (studio === undefined || !may('stash:see', { studioId: studio.id })) return <NotFound />;
  return (
    <>
      <title>{`Stash · ${studio.name} · Pairleaf`}</title>
      <TopBar crumbs={[{ label: studio.name, to: `/studios/${studio.id}` }]} title="Stash">
        <AccountMenu />
      </TopBar>
      <StudioScreen studio={studio}>
        <StashView studio={studio} />
      </StudioScreen>
    </>
  );
}
