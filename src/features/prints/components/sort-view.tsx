import { DndContext, DragOverlay } from '@dnd-kit/core';
import { useSuspenseQuery } from '@tanstack/react-query';
import { useCallback, useEffect, useMemo, useRef, useState } from 'react';
import { Button } from '@/components/button';
import { useAnnounce } from '@/components/live-region';
import { NameDialog } from '@/components/name-dialog';
import { EmptyLine, Notice } from '@/components/notice';
import { PrintPicture } from '@/components/print-picture';
import { sentenceOf } from '@/lib/form-errors';
import { useCreatePile, useUpdatePrint } from '../api/print-mutations';
import { pilesQuery, printsQuery } from '../api/print-queries';
import { useFileDrop } from '../hooks/use-file-drop';
import { useLetterAfterM } from '../hooks/use-letter-after-m';
import { usePileDrag } from '../hooks/use-pile-drag';
import { useUploadQueue } from '../hooks/use-upload-queue';
import { groupByPile, pileByLetter, type PileGroup } from '../model/pile-groups';
import type { Sizing } from '../model/table-words';
import { ArrivalsList } from './arrivals-list';
import { FileButton } from './file-button';
import { PileSection } from './pile-section';
import { PrintPanel } from './print-panel';
import { SortHead } from './sort-head';
import { TablePrint } from './table-print';

interface SortViewProps {
  readonly studioId: string;
  readonly sizing: Sizing;
  readonly mayEdit: boolean;
  readonly mayDelete: boolean;
  /** Prints chosen for the spread whose stage this is; left out on the studio's own table. */
  readonly onTable?: ReadonlySet<string>;
  /** @returns why some of it was not done, in one sentence, or null. */
  readonly setOnTable?: (ids: readonly string[], on: boolean) => string | null;
}

/** The prints of a studio in their piles, at one scale, and one of them opened beside them. */
export function SortView({ studioId, sizing, mayEdit, mayDelete, onTable, setOnTable }: SortViewProps) {
  const { data: prints } = useSuspenseQuery(printsQuery(studioId));
  const { data: piles } = useSuspenseQuery(pilesQuery(studioId));
  const groups = useMemo(() => groupByPile(piles, prints), [piles, prints]);
  const [openId, setOpenId] = useState<string | null>(null);
  const [isNaming, setIsNaming] = useState(false);
  const [failure, setFailure] = useState<string | null>(null);
  const uploads = useUploadQueue(studioId);
  const announce = useAnnounce();
  const { mutate: update } = useUpdatePrint(studioId);
  const createPile = useCreatePile(studioId);
  const fail = useCallback((error: unknown) => setFailure(sentenceOf(error)), []);

  const move = useCallback(
    (printId: string, pileId: string | null) => {
      const print = prints.find(({ id }) => id === printId);
      if (print === undefined || print.pileId === pileId) return;
      setFailure(null);
      update({ id: printId, pileId }, { onError: fail });
    },
    [prints, update, fail],
  );
  const { heldId, contextProps } = usePileDrag({ groups, prints, onMove: move });
  const moveByLetter = useCallback(
    (printId: string, letter: string) => {
      const print = prints.find(({ id }) => id === printId);
      const pile = pileByLetter(groups, letter, print?.pileId ?? null);
      if (print === undefined || pile === undefined) return announce(`No other pile begins with ${letter.toUpperCase()}`);
      move(printId, pile.id);
      announce(`${print.title}: placed in ${pile.name}`);
    },
    [prints, groups, move, announce],
  );
  const onKey = useLetterAfterM(mayEdit, moveByLetter);
  const mean = useCallback((ids: readonly string[], on: boolean) => setFailure(setOnTable?.(ids, on) ?? null), [setOnTable]);
  const choose = useCallback((id: string, on: boolean) => mean([id], on), [mean]);
  const { add } = uploads;
  const takeFiles = useCallback((files: readonly File[]) => void (mayEdit && files.length > 0 && add(files, null)), [mayEdit, add]);
  const isDropping = useFileDrop(takeFiles);

  // Where the panel stands under the table, an opened print would be out of sight.
  const panel = useRef<HTMLDivElement>(null);
  useEffect(() => {
    if (openId !== null && window.matchMedia('(width < 64rem)').matches) panel.current?.scrollIntoView();
  }, [openId]);

  const opened = prints.find(({ id }) => id === openId) ?? null;
  const held = prints.find(({ id }) => id === heldId) ?? null;
  const shown = groups.filter(({ id, prints: lying }) => id !== null || lying.length > 0);
  return (
    <div className="sort-screen" data-dropping={isDropping && mayEdit}>
      <div className="sort-table">
        <SortHead unit={sizing.unit} isForSpread={onTable !== undefined}>
          {mayEdit && (
            <>
              <FileButton label="Add prints" onFiles={takeFiles} />
              <Button onClick={() => setIsNaming(true)}>New pile</Button>
            </>
          )}
        </SortHead>
        {failure !== null && (
          <Notice alert className="mb-4">
            {failure}
          </Notice>
        )}
        <ArrivalsList arrivals={uploads.arrivals} onRetry={uploads.retry} onClear={uploads.clear} />
        {prints.length === 0 && piles.length === 0 ? (
          <EmptyLine className="max-w-[420px]">
            {mayEdit ? 'No prints here yet. Drop photographs anywhere on the table, or press “Add prints”.' : 'No prints here yet. They show as soon as someone adds some.'}
          </EmptyLine>
        ) : (
          <DndContext {...contextProps}>
            <div className="piles-lay">
              {shown.map((group) => (
                <PileSection
                  key={group.id ?? 'loose'}
                  studioId={studioId}
                  group={group}
                  isEditable={mayEdit}
                  onFail={fail}
                  action={onTable !== undefined && mayEdit && group.prints.length > 0 && <ChooseAll group={group} onTable={onTable} onChoose={mean} />}
                >
                  {group.prints.map((print) => (
                    <TablePrint
                      key={print.id}
                      print={print}
                      sizing={sizing}
                      isOpen={print.id === openId}
                      isHeld={print.id === heldId}
                      isEditable={mayEdit}
                      isOnSpread={onTable?.has(print.id)}
                      onOpen={setOpenId}
                      onKey={onKey}
                      onChoose={choose}
                    />
                  ))}
                </PileSection>
              ))}
            </div>
            <DragOverlay dropAnimation={null}>{held && <PrintPicture print={held} state="hand" decorative />}</DragOverlay>
          </DndContext>
        )}
        {mayEdit && prints.length > 0 && (
          <p className="mt-auto pt-6 text-12 text-ink-2">
            Drag a print to a pile, or press <kbd>M</kbd> and the pile’s first letter
          </p>
        )}
      </div>
      <div ref={panel} className="sort-panel">
        {opened === null ? (
          <EmptyLine>{prints.length === 0 ? 'A print shows here large, with its size and marks.' : 'Press a print to see it large, and to set its size, keep zone and marks.'}</EmptyLine>
        ) : (
          <PrintPanel key={opened.id} print={opened} groups={groups} sizing={sizing} mayEdit={mayEdit} mayDelete={mayDelete} onClose={() => setOpenId(null)} />
        )}
      </div>
      {isDropping && mayEdit && (
        <p className="drop-word" aria-hidden="true">
          Let go: they come onto the table
        </p>
      )}
      {isNaming && (
        <NameDialog title="New pile" label="Name" action="Make pile" maxLength={80} onClose={() => setIsNaming(false)} onSave={(name) => createPile.mutateAsync(name)} />
      )}
    </div>
  );
}

interface ChooseAllProps {
  readonly group: PileGroup;
  readonly onTable: ReadonlySet<string>;
  readonly onChoose: (ids: readonly string[], on: boolean) => void;
}

/** Means a whole pile for the spread, or none of it. */
function ChooseAll({ group, onTable, onChoose }: ChooseAllProps) {
  const ids = group.prints.map(({ id }) => id);
  const areAllOn = ids.every((id) => onTable.has(id));
  return (
    <button type="button" className="link-button text-12 text-ink-2" onClick={() => onChoose(ids, !areAllOn)}>
      {areAllOn ? 'Put all away' : 'Choose all'} <span className="sr-only">of {group.name}</span>
    </button>
  );
}
