import { useQuery } from '@tanstack/react-query';
import { lazy, Suspense, useEffect, useState } from 'react';
import { Outlet, useLocation, useParams } from 'react-router-dom';
import type { SpreadDetail } from '#shared/contracts/albums';
import { IconButton, Button } from '@/components/button';
import { RedoIcon, UndoIcon } from '@/components/icons';
import { StageBar, type Stage } from '@/components/stage-bar';
import { TopBar } from '@/components/top-bar';
import { spreadQuery } from '@/features/composer/api/spread-queries';
import '@/features/composer/compose.css';
import { DraftOffer } from '@/features/composer/components/draft-offer';
import { SaveState } from '@/features/composer/components/save-state';
import { ComposerProvider, useComposer, useComposerStore } from '@/features/composer/hooks/composer-context';
import { openComposer } from '@/features/composer/api/open-composer';
import type { ComposerStore } from '@/features/composer/model/composer-store';
import { commandLabel } from '#shared/words/en/commands';

// Loaded when they are first needed, so that the spread can be worked on sooner.
const ConflictDialog = lazy(async () => ({ default: (await import('@/features/composer/components/conflict-dialog')).ConflictDialog }));
const ExportDialog = lazy(async () => ({ default: (await import('@/features/composer/components/export-dialog')).ExportDialog }));

/** One spread: its bar and stages, with one editor store under all of them. */
export function Component() {
  const { spreadId = '' } = useParams();
  return <OpenSpread key={spreadId} spreadId={spreadId} />;
}

function OpenSpread({ spreadId }: { spreadId: string }) {
  const { data, error } = useQuery(spreadQuery(spreadId));
  if (error) throw error;
  return data ? <Loaded detail={data} /> : <main className="min-h-dvh" aria-busy="true" aria-label="Opening the spread" />;
}

function Loaded({ detail }: { detail: SpreadDetail }) {
  const [store, setStore] = useState<ComposerStore | null>(null);
  useEffect(() => {
    const opened = openComposer(detail);
    setStore(opened.store);
    return opened.close;
  }, [detail]);
  if (!store) return null;
  return (
    <ComposerProvider value={store}>
      <SpreadBar detail={detail} />
      <DraftOffer />
      <OnConflict />
      <Outlet context={detail} />
    </ComposerProvider>
  );
}

function OnConflict() {
  const isConflict = useComposer((state) => state.save.status === 'conflict');
  return <Suspense fallback={null}>{isConflict && <ConflictDialog />}</Suspense>;
}

function SpreadBar({ detail }: { detail: SpreadDetail }) {
  const store = useComposerStore();
  const [isExporting, setIsExporting] = useState(false);
  const undoCommand = useComposer((state) => state.undoCommand);
  const redoCommand = useComposer((state) => state.redoCommand);
  return (
    <>
      <TopBar crumbs={[{ label: detail.albumTitle, to: `/albums/${detail.albumId}` }]} title={detail.title} stages={<StageBar stages={useStages(detail.id)} />}>
        <SaveState mayEdit={detail.may.edit} />
        {detail.may.edit && (
          <>
            <IconButton label={undoCommand ? `Undo: ${commandLabel(undoCommand)}` : 'Undo'} disabled={!undoCommand} onClick={() => store.getState().undo()}>
              <UndoIcon />
            </IconButton>
            <IconButton label={redoCommand ? `Redo: ${commandLabel(redoCommand)}` : 'Redo'} disabled={!redoCommand} onClick={() => store.getState().redo()}>
              <RedoIcon />
            </IconButton>
          </>
        )}
        {detail.may.export && (
          <Button variant="ink" className="ml-2" onClick={() => setIsExporting(true)}>
            Export
          </Button>
        )}
      </TopBar>
      <Suspense fallback={null}>{isExporting && <ExportDialog spreadId={detail.id} onClose={() => setIsExporting(false)} />}</Suspense>
    </>
  );
}

/** The stages that have a screen, in the order in which a maker does them. */
function useStages(spreadId: string): Stage[] {
  const { pathname } = useLocation();
  const base = `/spreads/${spreadId}`;
  const doc = useComposer((state) => state.doc);
  const all = [
    { id: 'sort', label: 'Sort', to: `${base}/sort`, isDone: doc.table.length > 0 },
    { id: 'match', label: 'Match', to: `${base}/match`, isDone: doc.mats.length > 0 },
    { id: 'compose', label: 'Compose', to: base, isDone: false },
  ];
  return all.map(({ isDone, ...stage }) => ({ ...stage, state: pathname === stage.to ? 'current' : isDone ? 'done' : 'ahead' }));
}
