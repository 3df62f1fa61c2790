import { DndContext } from '@dnd-kit/core';
import { lazy, useEffect, useMemo, useState } from 'react';
import type { Pile } from '#shared/contracts/prints';
import type { PrintId } from '#shared/model/ids';
import { toInches } from '#shared/model/length';
import { pageRects } from '#shared/scene/page-rects';
import { formatSize, type Unit } from '#shared/words/measure';
import { pixelsPerInch } from '@/features/composer/canvas/page-scale';
import { useComposer, useComposerStore } from '@/features/composer/hooks/composer-context';
import { isPrintDrag } from '@/features/composer/hooks/drag-data';
import { useComposeDrag } from '@/features/composer/hooks/use-compose-drag';
import { stopOn, useJudgement, type Judgement } from '@/features/composer/hooks/use-judgement';
import { RefusalLine, RefusalProvider } from '@/features/composer/hooks/use-run';
import { useViewport } from '@/features/composer/hooks/use-viewport';
import { AfterPages } from './after-pages';
import { HeldPrint, type DropWords } from './held-print';
import { NoteText } from './notes-margin';
import { PileEdge } from './pile-edge';
import type { Comparison } from './scheme-fan';
import { SpreadTable } from './spread-table';

// The schemes' colour work comes after the pages: dragging does not wait for it.
const SchemeFan = lazy(async () => ({ default: (await import('./scheme-fan')).SchemeFan }));

const COMPOSE_MIN_WIDTH = 1024;
const WIDE = 1280;
const MARGIN_WIDE = 192;
const MARGIN_NARROW = 148;
/** Top bar, beam and rulers above the pages; page actions and piles below. */
const VERTICAL_SURROUND = 372;

interface ComposeScreenProps {
  readonly title: string;
  readonly piles: readonly Pile[];
  readonly mayEdit: boolean;
  readonly sortHref: string;
}

/** Compose: pages, piles, schemes, notes. Under 1024 px the spread is shown read-only with its notes below. */
export function ComposeScreen({ title, piles, mayEdit, sortHref }: ComposeScreenProps) {
  const viewport = useViewport();
  const doc = useComposer((state) => state.doc);
  const prints = useComposer((state) => state.prints);
  const unit = useComposer((state) => state.unit);
  const judgement = useJudgement();
  const [sources, setSources] = useState<readonly PrintId[] | null>(null);
  const [comparison, setComparison] = useState<Comparison | null>(null);
  const isSmall = viewport.width < COMPOSE_MIN_WIDTH;
  const isEditable = mayEdit && !isSmall;
  const margin = isSmall ? 0 : viewport.width < WIDE ? MARGIN_NARROW : MARGIN_WIDE;
  const perInch = isSmall
    ? Math.max(4, (viewport.width - 24) / toInches(pageRects(doc).width))
    : pixelsPerInch(viewport, doc, { sides: 2 * margin, vertical: VERTICAL_SURROUND });
  const { held, contextProps } = useComposeDrag(perInch);
  useComposeKeys(isEditable, held !== null);

  const heldPrint = held && isPrintDrag(held.data) ? (prints.get(held.data.printId) ?? null) : null;
  const marked = useMemo(() => new Set(sources ?? []), [sources]);
  return (
    <RefusalProvider>
      <DndContext {...contextProps}>
      <main className={`compose ${isSmall ? 'is-small' : ''}`}>
        <h1 className="sr-only">Compose {title}</h1>
        <RefusalLine />
        <SpreadTable judgement={isSmall ? { ...judgement, notes: [] } : judgement} held={held} perInch={perInch} margin={margin} isEditable={isEditable} sources={sources} comparison={comparison} />
        {isSmall ? (
          <section className="notes-below" aria-label="Notes">
            <p>Composing needs a wider screen, from 1024 px. Here is the spread and what the notes say of it.</p>
            <ol>
              {judgement.notes.map((note) => (
                <li key={note.key} className={`note is-${note.severity}`}>
                  <NoteText note={note} unit={unit} />
                </li>
              ))}
            </ol>
          </section>
        ) : (
          <div className="table-edge">
            <AfterPages fallback={<div aria-busy="true" />}>
              <SchemeFan isEditable={isEditable} isHeld={held !== null} onSources={setSources} onCompare={setComparison} />
            </AfterPages>
            <PileEdge piles={piles} heldPrintId={held?.data.type === 'print' ? held.data.printId : null} isEditable={isEditable} sortHref={sortHref} marked={marked} />
          </div>
        )}
      </main>
      {isEditable && <HeldPrint print={heldPrint} perInch={perInch} drop={held?.overMatId ? dropWords(judgement, held.overMatId, unit) : null} />}
      </DndContext>
    </RefusalProvider>
  );
}

/** What dropping the print on this mat would do: the preview lies there already, so its notes tell. */
function dropWords({ view, notes }: Judgement, matId: string, unit: Unit): DropWords | null {
  const photo = view.photosByMat.get(matId);
  if (!photo) return null;
  const stop = stopOn(notes, matId);
  const isKept = Boolean(view.prints.get(photo.printId)?.keepZone);
  const fits = photo.placement.mode === 'whole' ? 'Whole' : isKept ? 'Keep zone fits' : 'Photo';
  const spoils = stop?.checkId === 'never-cut' ? 'Do not cut' : 'Would cut the keep zone';
  return { words: stop ? spoils : fits, size: formatSize(photo.rect, unit), isStop: stop !== undefined };
}

/** Undo, redo, duplicate, delete and let go, from the keyboard, while no field has the focus. */
function useComposeKeys(isEditable: boolean, isHolding: boolean): void {
  const store = useComposerStore();
  useEffect(() => {
    if (!isHolding) return undefined;
    // With something in the hand, Escape puts it back, and no more: the selection stays.
    const claimEscape = (event: KeyboardEvent): void => {
      if (event.key === 'Escape') event.preventDefault();
    };
    window.addEventListener('keydown', claimEscape, { capture: true });
    return () => window.removeEventListener('keydown', claimEscape, { capture: true });
  }, [isHolding]);
  useEffect(() => {
    if (!isEditable) return undefined;
    const handleKeyDown = (event: KeyboardEvent): void => {
      const target = event.target as HTMLElement;
      if (event.defaultPrevented || target.closest('input, textarea, select, [contenteditable], [role="dialog"]')) return;
      const { undo, redo, run, select, selection } = store.getState();
      const isCommand = event.ctrlKey || event.metaKey;
      const key = event.key.toLowerCase();
      if (isCommand && key === 'z') (event.shiftKey ? redo : undo)();
      else if (isCommand && key === 'y') redo();
      else if (isCommand && key === 'd' && selection.length === 1) run({ id: 'mats.duplicate', args: { matId: selection[0]! } });
      else if ((key === 'delete' || key === 'backspace') && selection.length > 0) {
        run({ id: 'mats.delete', args: { matIds: selection } });
        select([]);
      } else if (key === 'escape') select([]);
      else return;
      event.preventDefault();
    };
    window.addEventListener('keydown', handleKeyDown);
    return () => window.removeEventListener('keydown', handleKeyDown);
  }, [store, isEditable]);
}
