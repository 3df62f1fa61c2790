import { useSuspenseQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { gridOf } from '#shared/geometry/grid';
import { formatLength } from '#shared/words/measure';
import { IconButton } from '@/components/button';
import { MoreIcon } from '@/components/icons';
import { Menu, MenuItem } from '@/components/menu';
import { NameDialog } from '@/components/name-dialog';
import { Notice } from '@/components/notice';
import { sentenceOf } from '@/lib/form-errors';
import { useMay } from '@/lib/session';
import { useRenameAlbum } from '../api/album-mutations';
import { albumQueries } from '../api/album-queries';
import { describeAlbum } from '../model/spread-words';
import { AlbumStrip, NewSpreadButton } from './album-strip';

/** An album: its name and format, and its spreads. Reviewers see no edit controls. */
export function AlbumView({ albumId }: { readonly albumId: string }) {
  const { data: album } = useSuspenseQuery(albumQueries.detail(albumId));
  const { data: list } = useSuspenseQuery(albumQueries.spreads(albumId));
  const rename = useRenameAlbum(albumId, album.studioId);
  const mayEdit = useMay()('album:edit', { studioId: album.studioId, albumId });
  const [isNaming, setIsNaming] = useState(false);
  const [failure, setFailure] = useState<string | null>(null);
  const { format } = album;
  const live = list.spreads.filter(({ binned }) => !binned);
  const margin = format.edge === 'bleed' ? null : gridOf(format).marginX;
  return (
    <>
      <div className="flex min-h-[76px] flex-wrap items-center gap-x-5 gap-y-1 pt-3 pb-3 sm:pt-4">
        <div className="flex items-center gap-1">
          <h1 className="text-32 max-sm:text-24">{album.title}</h1>
          {mayEdit && (
            <Menu
              trigger={
                <IconButton label={`More for the album ${album.title}`}>
                  <MoreIcon />
                </IconButton>
              }
            >
              <MenuItem onSelect={() => setIsNaming(true)}>Rename album</MenuItem>
            </Menu>
          )}
        </div>
        <p className="text-ink-2 lg:pt-2">
          <span className="num">{format.name}</span>
          {margin !== null && (
            <>
              , margin{' '}
              <span className="num">
                {formatLength(margin, format.unit)} {format.unit}
              </span>
            </>
          )}
          . {describeAlbum(live)}
        </p>
        {mayEdit && (
          <div className="ml-auto">
            <NewSpreadButton album={album} number={live.length + 1} onFail={(error) => setFailure(sentenceOf(error))} />
          </div>
        )}
      </div>
      {failure !== null && (
        <Notice alert className="mb-4 max-w-[560px]">
          {failure}
        </Notice>
      )}
      <AlbumStrip album={album} list={list} mayEdit={mayEdit} />
      {isNaming && (
        <NameDialog
          title="Rename album"
          label="Name"
          action="Rename"
          initial={album.title}
          maxLength={120}
          onClose={() => setIsNaming(false)}
          onSave={(title) => rename.mutateAsync(title)}
        />
      )}
    </>
  );
}
