import { useEffect } from 'react';
import { useParams } from 'react-router-dom';
import { TopBar } from '@/components/top-bar';
import { AlbumShelf } from '@/features/albums/components/album-shelf';
import { StudioScreen } from '@/features/albums/components/studio-screen';
import { ContributorTable } from '@/features/prints/components/contributor-table';
import { AccountMenu } from '@/features/session/components/account-menu';
import { rememberStudio, useStudio } from '@/lib/session';
import { NotFound } from './not-found';

/** A studio: its albums; for a contributor, only the piles that are shared with them. */
export function Component() {
  const { studioId } = useParams();
  const studio = useStudio(studioId);
  useEffect(() => {
    if (studio !== undefined) rememberStudio(studio.id);
  }, [studio]);
  if (studio === undefined) return <NotFound />;
  return (
    <>
      <title>{`${studio.name} · Pairleaf`}</title>
      <TopBar title={studio.name}>
        <AccountMenu />
      </TopBar>
      {studio.role === 'contributor' ? (
        <ContributorTable studio={studio} />
      ) : (
        <StudioScreen studio={studio}>
          <AlbumShelf studio={studio} />
        </StudioScreen>
      )}
    </>
  );
}
