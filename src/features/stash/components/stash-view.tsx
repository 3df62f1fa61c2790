import { useSuspenseQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { useSearchParams } from 'react-router-dom';
import type { Studio } from '#shared/contracts/accounts';
import { freeSheets, isLow } from '#shared/model/stash';
import { sheetCount } from '#shared/words/en/stash';
import { Button } from '@/components/button';
import { EmptyLine, Notice } from '@/components/notice';
import { sentenceOf } from '@/lib/form-errors';
import { useMay } from '@/lib/session';
import { stashQuery } from '../api/stash-queries';
import { arrangeSheets, readArrangement, SHOWS, writeArrangement, type Arrangement, type Show, type Sort } from '../model/arrange-sheets';
import { BulkBar } from './bulk-bar';
import { ImportDialog } from './import-dialog';
import { QuickAdd } from './quick-add';
import { StashTable } from './stash-table';

const SHOW_WORDS: Readonly<Record<Show, string>> = { all: 'All', solid: 'Solid', patterned: 'Patterned', low: 'Low' };
/** Rows drawn at once: a stash may hold thousands of kinds. */
const ROWS = 200;

/** The stash of a studio: what is in the drawer, how much of it is free, and where it lies. */
export function StashView({ studio }: { readonly studio: Studio }) {
  const { data: sheets } = useSuspenseQuery(stashQuery(studio.id));
  const [params, setParams] = useSearchParams();
  const [selected, setSelected] = useState<ReadonlySet<string>>(new Set());
  const [failure, setFailure] = useState<string | null>(null);
  const [isImporting, setIsImporting] = useState(false);
  const [rows, setRows] = useState(ROWS);
  const mayEdit = useMay()('stash:edit', { studioId: studio.id });
  const arrangement = readArrangement(params);
  const shown = arrangeSheets(sheets, arrangement);
  const chosen = shown.filter(({ id }) => selected.has(id)).map(({ id }) => id);
  const arrange = (change: Partial<Arrangement>): void => setParams(writeArrangement({ ...arrangement, ...change }), { replace: true });
  const sortBy = (sort: Sort): void => arrange({ sort, isDescending: arrangement.sort === sort && !arrangement.isDescending });
  const fail = (error: unknown): void => setFailure(sentenceOf(error));
  const low = sheets.filter(isLow).length;
  const free = sheets.reduce((sum, sheet) => sum + freeSheets(sheet), 0);
  const reserved = sheets.reduce((sum, sheet) => sum + sheet.reserved, 0);
  return (
    <div className="stash">
      <header className="stash-head">
        <h1>Stash</h1>
        <p>
          {sheets.length === 0
            ? 'The cardstock and patterned paper on hand'
            : [`${sheets.length} ${sheets.length === 1 ? 'kind' : 'kinds'}`, `${sheetCount(free)} free`, reserved > 0 && `${reserved} reserved`, low > 0 && `${low} low`].filter(Boolean).join(', ')}
        </p>
        <span className="stash-files">
          {mayEdit && <Button onClick={() => setIsImporting(true)}>Bring in CSV</Button>}
          {sheets.length > 0 && (
            <a className="btn" href={`/api/studios/${studio.id}/stash/file`} download="stash.csv">
              Take out CSV
            </a>
          )}
        </span>
      </header>
      {failure !== null && (
        <Notice alert className="mb-3">
          {failure}{' '}
          <button type="button" className="link-button" onClick={() => setFailure(null)}>
            Put away
          </button>
        </Notice>
      )}
      {mayEdit && <QuickAdd studioId={studio.id} unit={studio.unit} onFail={fail} />}
      {sheets.length === 0 ? (
        <EmptyLine className="mt-4">
          {mayEdit ? 'Nothing in the drawer yet. Add a sheet above, or bring in a list that you keep as CSV.' : 'Nothing in the drawer yet.'}
        </EmptyLine>
      ) : (
        <>
          <div className="stash-tools">
            <input type="search" className="field-input" aria-label="Find sheets" placeholder="Find by name, colour, maker, place" value={arrangement.query} onChange={(event) => arrange({ query: event.target.value })} />
            <span role="group" aria-label="Show">
              {SHOWS.map((show) => (
                <button key={show} type="button" className="opt" aria-pressed={arrangement.show === show} onClick={() => arrange({ show })}>
                  {SHOW_WORDS[show]}
                </button>
              ))}
            </span>
            {chosen.length > 0 && <BulkBar studioId={studio.id} sheetIds={chosen} onDone={() => setSelected(new Set())} onFail={fail} />}
          </div>
          <StashTable
            studioId={studio.id}
            sheets={shown.slice(0, rows)}
            unit={studio.unit}
            mayEdit={mayEdit}
            sort={arrangement.sort}
            isDescending={arrangement.isDescending}
            selected={selected}
            onSort={sortBy}
            onSelect={setSelected}
            onFail={fail}
          />
          {shown.length === 0 && <EmptyLine className="mt-3">No sheet in the stash is like that.</EmptyLine>}
          {shown.length > rows && (
            <Button className="mt-3" onClick={() => setRows(rows + ROWS)}>
              Show {Math.min(ROWS, shown.length - rows)} more of {shown.length}
            </Button>
          )}
        </>
      )}
      {isImporting && <ImportDialog studioId={studio.id} onClose={() => setIsImporting(false)} />}
    </div>
  );
}
