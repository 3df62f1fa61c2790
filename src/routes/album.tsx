import { useQuery } from '@tanstack/react-query';
import { useEffect } from 'react';
import { useParams } from 'react-router-dom';
import { TopBar } from '@/components/top-bar';
import { albumQueries } from '@/features/albums/api/album-queries';
import { AlbumView } from '@/features/albums/components/album-view';
import { StudioScreen } from '@/features/albums/components/studio-screen';
import { AccountMenu } from '@/features/session/components/account-menu';
import { rememberStudio, useStudio } from '@/lib/session';
import { NotFound } from './not-found';

export function Component() {
  const albumId = useParams().albumId!;
  const { data: album, error } = useQuery(albumQueries.detail(albumId));
  const studio = useStudio(album?.studioId);
  useEffect(() => {
    if (studio !== undefined) rememberStudio(studio.id);
  }, [studio]);
  if (error !== null) throw error;
  if (album === undefined) return <TopBar />;
  if (studio === undefined) return <NotFound />;
  return (
    <>
      <title>{`${album.title} · Pairleaf`}</title>
      <TopBar crumbs={[{ label: 'Albums', to: `/studios/${studio.id}` }]} title={album.title}>
        <AccountMenu />
      </TopBar>
      <StudioScreen studio={studio}>
        <AlbumView albumId={albumId} />
      </StudioScreen>
    </>
  );
}
