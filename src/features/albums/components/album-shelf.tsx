import { useSuspenseQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { Link, useNavigate } from 'react-router-dom';
import type { Studio } from '#shared/contracts/accounts';
import { Button } from '@/components/button';
import { EmptyLine } from '@/components/notice';
import { useMay } from '@/lib/session';
import { albumQueries } from '../api/album-queries';
import { NewAlbumDialog } from './new-album-dialog';

/** A studio's albums, closed, drawn in the proportions of their pages. */
export function AlbumShelf({ studio }: { readonly studio: Studio }) {
  const { data: albums } = useSuspenseQuery(albumQueries.list(studio.id));
  const mayEdit = useMay()('album:edit', { studioId: studio.id });
  const navigate = useNavigate();
  const [isMaking, setIsMaking] = useState(false);
  const widest = Math.max(1, ...albums.map(({ format }) => format.width));
  return (
    <>
      <div className="flex min-h-[76px] flex-wrap items-center gap-x-5 gap-y-1 pt-3 pb-3 sm:pt-4">
        <h1 className="text-32 max-sm:text-24">Albums</h1>
        <p className="text-ink-2 lg:pt-2">of {studio.name}</p>
        {mayEdit && (
          <Button variant="ink" className="ml-auto" onClick={() => setIsMaking(true)}>
            New album
          </Button>
        )}
      </div>
      {albums.length === 0 ? (
        <EmptyLine className="max-w-[420px]">
          {mayEdit ? (
            <>
              No albums yet.{' '}
              <button type="button" className="link-button" onClick={() => setIsMaking(true)}>
                Make the first
              </button>
              , then put spreads into it.
            </>
          ) : (
            'No albums yet. They show here as soon as someone makes one.'
          )}
        </EmptyLine>
      ) : (
        <ul className="album-shelf">
          {albums.map(({ id, title, format, spreadCount }) => (
            <li key={id} className="relative">
              <div
                className="album-cover"
                aria-hidden="true"
                style={{ width: `${(format.width / widest) * 100}%`, aspectRatio: `${format.width} / ${format.height}` }}
              >
                <span>{title}</span>
              </div>
              <h2 className="mt-[9px] text-16 leading-[22px]">
                <Link to={`/albums/${id}`} className="spread-link">
                  {title}
                </Link>
              </h2>
              <p className="text-12 text-ink-2">
                <span className="num">{format.name}</span>, {spreadCount} {spreadCount === 1 ? 'spread' : 'spreads'}
              </p>
            </li>
          ))}
        </ul>
      )}
      {isMaking && (
        <NewAlbumDialog studio={studio} onClose={() => setIsMaking(false)} onMade={(albumId) => void navigate(`/albums/${albumId}`)} />
      )}
    </>
  );
}
