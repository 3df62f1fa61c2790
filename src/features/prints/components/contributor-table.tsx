import { useQuery } from '@tanstack/react-query';
import { useCallback, useState } from 'react';
import type { Studio } from '#shared/contracts/accounts';
import { EmptyLine } from '@/components/notice';
import { pilesQuery } from '../api/print-queries';
import { useFileDrop } from '../hooks/use-file-drop';
import { useUploadQueue } from '../hooks/use-upload-queue';
import { ArrivalsList } from './arrivals-list';
import { FileButton } from './file-button';

/** All that a contributor needs: the piles shared with them, and a way to send photographs to one. */
export function ContributorTable({ studio }: { readonly studio: Studio }) {
  const { data: piles } = useQuery(pilesQuery(studio.id));
  const uploads = useUploadQueue(studio.id);
  const [chosenId, setChosenId] = useState<string | null>(null);
  const chosen = piles?.find(({ id }) => id === chosenId) ?? piles?.[0];
  const { add } = uploads;
  const pileId = chosen?.id ?? null;
  const takeFiles = useCallback((files: readonly File[]) => void (pileId !== null && files.length > 0 && add(files, pileId)), [add, pileId]);
  const isDropping = useFileDrop(takeFiles);
  return (
    <main className="mx-auto w-full max-w-[640px] px-6 py-8 max-sm:px-4">
      <h1 className="text-32 max-sm:text-24">Send photographs</h1>
      <p className="mt-2 mb-6 text-ink-2">
        They go to {studio.name}. Only the studio’s members see them; where and with what they were taken is left out.
      </p>
      {piles?.length === 0 && <EmptyLine>No pile is shared with you yet. Ask the studio to share one, and it shows here.</EmptyLine>}
      {piles !== undefined && piles.length > 1 && (
        <div role="group" aria-label="Pile" className="mb-4 flex flex-wrap gap-2">
          {piles.map(({ id, name }) => (
            <button key={id} type="button" className="opt" aria-pressed={id === pileId} onClick={() => setChosenId(id)}>
              {name}
            </button>
          ))}
        </div>
      )}
      {chosen !== undefined && (
        <div className="bare-page mb-6 p-6 sm:p-9">
          <div className="drop-sheet" data-over={isDropping}>
            <h2>{chosen.name}</h2>
            <p className="text-ink-2">Drop photographs here, or</p>
            <FileButton label="Choose photographs" variant="ink" onFiles={takeFiles} />
          </div>
        </div>
      )}
      <ArrivalsList arrivals={uploads.arrivals} onRetry={uploads.retry} onClear={uploads.clear} />
    </main>
  );
}
