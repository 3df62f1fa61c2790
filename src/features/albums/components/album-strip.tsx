import { useMemo, useState } from 'react';
import { useNavigate } from 'react-router-dom';
import type { Album, CreateSpread, SpreadList } from '#shared/contracts/albums';
import type { Print } from '#shared/model/print';
import { Button } from '@/components/button';
import { Menu, MenuItem } from '@/components/menu';
import { EmptyLine, Notice } from '@/components/notice';
import { sentenceOf } from '@/lib/form-errors';
import { useCreateSpread, useUpdateSpread } from '../api/album-mutations';
import { ReadingOrder } from './reading-order';
import { SpreadCard } from './spread-card';

interface AlbumStripProps {
  readonly album: Album;
  readonly list: SpreadList;
  readonly mayEdit: boolean;
}

/** An album's spreads in reading order, joined by a thread; then a bare one to begin. */
export function AlbumStrip({ album, list, mayEdit }: AlbumStripProps) {
  const [failure, setFailure] = useState<string | null>(null);
  const prints = useMemo(() => new Map(list.prints.map((print): [string, Print] => [print.id, print])), [list.prints]);
  const live = list.spreads.filter(({ binned }) => !binned);
  const binned = list.spreads.filter((spread) => spread.binned);
  const fail = (error: unknown): void => setFailure(sentenceOf(error));
  return (
    <>
      {failure !== null && (
        <Notice alert className="mb-4 max-w-[560px]">
          {failure}
        </Notice>
      )}
      <ReadingOrder albumId={album.id} spreads={live} onFail={fail}>
        <ol className="spread-strip">
          {live.map((spread, index) => (
            <SpreadCard key={spread.id} spread={spread} index={index} count={live.length} prints={prints} mayEdit={mayEdit} onFail={fail} />
          ))}
          {mayEdit && <BareSpread album={album} number={live.length + 1} onFail={fail} />}
        </ol>
      </ReadingOrder>
      {!mayEdit && live.length === 0 && <EmptyLine className="max-w-[360px]">No spreads here yet. They show as soon as someone begins one.</EmptyLine>}
      {mayEdit && binned.length > 0 && <Bin albumId={album.id} spreads={binned} onFail={fail} />}
    </>
  );
}

/** Adds a spread at the end: facing pages, or the single page of a first or last leaf. */
export function NewSpreadButton({ album, number, onFail }: { readonly album: Album; readonly number: number; readonly onFail: (error: unknown) => void }) {
  const begin = useBegin(album, number, onFail);
  return (
    <Menu
      align="end"
      trigger={
        <Button variant="ink" working={begin.isPending}>
          New spread
        </Button>
      }
    >
      <MenuItem onSelect={() => begin.start('both')}>Two facing pages</MenuItem>
      <MenuItem onSelect={() => begin.start('right')}>A single right page, first leaf</MenuItem>
      <MenuItem onSelect={() => begin.start('left')}>A single left page, last leaf</MenuItem>
    </Menu>
  );
}

function useBegin(album: Album, number: number, onFail: (error: unknown) => void) {
  const create = useCreateSpread(album.id);
  const navigate = useNavigate();
  return {
    isPending: create.isPending,
    start: (pages: CreateSpread['pages']) =>
      create.mutate(
        { title: `Spread ${number}`, pages },
        { onError: onFail, onSuccess: ({ id }) => void navigate(`/spreads/${id}`) },
      ),
  };
}

function BareSpread({ album, number, onFail }: { readonly album: Album; readonly number: number; readonly onFail: (error: unknown) => void }) {
  const begin = useBegin(album, number, onFail);
  const { width, height } = album.format;
  return (
    <li className="spread-card">
      <div className="spread-thread">
        <div className="bare-spread" aria-hidden="true" style={{ aspectRatio: `${width * 2} / ${height}` }}>
          <i />
          <i />
        </div>
      </div>
      <div className="mt-[9px] flex items-start gap-[9px]">
        <span className="num text-13 leading-[22px] text-ink-2" aria-hidden="true">
          {number}
        </span>
        <button type="button" className="spread-link font-serif text-16 leading-[22px]" onClick={() => begin.start('both')}>
          Bare spread
        </button>
      </div>
      <p className="pl-[17px] text-12 text-ink-2">Begin here with two facing pages</p>
    </li>
  );
}

function Bin({ albumId, spreads, onFail }: { readonly albumId: string; readonly spreads: SpreadList['spreads']; readonly onFail: (error: unknown) => void }) {
  const update = useUpdateSpread(albumId);
  return (
    <details className="mt-8 border-t border-rule pt-3">
      <summary className="cursor-pointer font-serif text-15">
        Bin <span className="num text-12 text-ink-2">{spreads.length}</span>
      </summary>
      <ul className="mt-2 max-w-[420px]">
        {spreads.map(({ id, title }) => (
          <li key={id} className="flex min-h-10 items-center justify-between gap-4 border-b border-rule">
            {title}
            <Button variant="bare" onClick={() => update.mutate({ id, binned: false }, { onError: onFail })}>
              Take out <span className="sr-only">{title}</span>
            </Button>
          </li>
        ))}
      </ul>
    </details>
  );
}
