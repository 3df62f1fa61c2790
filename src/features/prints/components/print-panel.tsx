import { useState } from 'react';
import { smallestCuts } from '#shared/geometry/smallest-cut';
import type { Turns } from '#shared/model/ids';
import type { Print } from '#shared/model/print';
import { Button, IconButton } from '@/components/button';
import { CloseIcon, FixMark, StopMark, TurnIcon } from '@/components/icons';
import { Measure } from '@/components/measure';
import { NameDialog } from '@/components/name-dialog';
import { Notice } from '@/components/notice';
import { ApiError } from '@/lib/api';
import { sentenceOf } from '@/lib/form-errors';
import { useDeletePrint, useUpdatePrint, type PrintChange } from '../api/print-mutations';
import { needsALook } from '../model/paper-edit';
import type { PileGroup } from '../model/pile-groups';
import { cautionsOf, type Sizing } from '../model/table-words';
import { BigPrint } from './big-print';
import { Fact } from './fact';
import { MarksEditor } from './marks-editor';
import { PaletteStrip } from './palette-strip';
import { PaperRectEditor } from './paper-rect-editor';
import { SizeChoice } from './size-choice';

interface PrintPanelProps {
  readonly print: Print;
  readonly groups: readonly PileGroup[];
  readonly sizing: Sizing;
  readonly mayEdit: boolean;
  readonly mayDelete: boolean;
  readonly onClose: () => void;
}

/** One print, opened: large, with rulers and its keep zone, and all that is known of it. */
export function PrintPanel({ print, groups, sizing, mayEdit, mayDelete, onClose }: PrintPanelProps) {
  const { mutate, mutateAsync } = useUpdatePrint(print.studioId);
  const remove = useDeletePrint(print.studioId);
  const [failure, setFailure] = useState<string | null>(null);
  const [isNaming, setIsNaming] = useState(false);
  const [isNudging, setIsNudging] = useState(false);
  const isOdd = needsALook(print);
  const fail = (error: unknown): void =>
    setFailure(
      error instanceof ApiError && error.code === 'stale-revision'
        ? 'Someone else changed this print meanwhile. It now shows as they left it; set yours again if it still holds.'
        : sentenceOf(error),
    );
  const save = (change: PrintChange): void => {
    setFailure(null);
    mutate({ id: print.id, ...change }, { onError: fail });
  };
  return (
    <section aria-label={`Opened print: ${print.title}`}>
      <div className="mb-4 flex items-start gap-2">
        <h2 className="min-w-0 text-24 break-words">{print.title}</h2>
        {mayEdit && (
          <button type="button" className="link-button mt-[7px] flex-none text-12 text-ink-2" onClick={() => setIsNaming(true)}>
            Rename
          </button>
        )}
        <IconButton label="Close this print" className="ml-auto" onClick={onClose}>
          <CloseIcon />
        </IconButton>
      </div>
      {failure !== null && (
        <Notice alert className="mb-4">
          {failure}
        </Notice>
      )}
      {isNudging ? (
        <PaperRectEditor print={print} onSave={(paperRect) => save({ paperRect })} onDone={() => setIsNudging(false)} />
      ) : (
        <BigPrint print={print} unit={sizing.unit} trim={sizing.trim} mayEdit={mayEdit} onSave={save} />
      )}
      <ul className="grid gap-2 empty:hidden">
        {cautionsOf(print).map((caution) => (
          <li key={caution} className="flex items-start gap-2 text-13 text-cut-deep">
            <span className="mt-[2px]">
              <StopMark />
            </span>
            {caution}
          </li>
        ))}
        {isOdd && !isNudging && (
          <li className="flex items-start gap-2 text-13 text-pencil-deep">
            <span className="mt-[2px]">
              <FixMark />
            </span>
            <span>
              The file and the paper differ in shape, so the paper shows only part of the picture. Hold the print beside it and nudge the part if it differs.{' '}
              {mayEdit && (
                <button type="button" className="remedy ml-1" onClick={() => setIsNudging(true)}>
                  Nudge the paper
                </button>
              )}
            </span>
          </li>
        )}
      </ul>
      <div className="facts">
        <SizeChoice print={print} unit={sizing.unit} mayEdit={mayEdit} onSave={save} />
        <Fact label="Smallest cut">
          {smallestCuts(print, sizing.format, sizing.reveal, sizing.trim).map((cut, i) => (
            <span key={`${cut.width}/${cut.height}`}>
              {i > 0 && 'or '}
              <Measure of={cut} unit={sizing.unit} />
            </span>
          ))}
        </Fact>
        <Fact label="Picture">
          <Button variant="bare" disabled={!mayEdit} onClick={() => save({ turns: ((print.turns + 1) % 4) as Turns })}>
            <TurnIcon /> Turn upright
          </Button>
          {!isNudging && !isOdd && mayEdit && (
            <button type="button" className="opt" onClick={() => setIsNudging(true)}>
              Nudge the paper
            </button>
          )}
        </Fact>
        <MarksEditor print={print} mayEdit={mayEdit} onSave={save} />
        <Fact label="Pile" htmlFor="print-pile">
          <select
            id="print-pile"
            className="field-input max-w-[240px]"
            value={print.pileId ?? ''}
            disabled={!mayEdit}
            onChange={(event) => save({ pileId: event.target.value === '' ? null : event.target.value })}
          >
            {groups.map(({ id, name }) => (
              <option key={id ?? 'loose'} value={id ?? ''}>
                {name}
              </option>
            ))}
          </select>
        </Fact>
        <PaletteStrip palette={print.palette} />
      </div>
      {mayDelete && (
        <p className="mt-4 text-right">
          <button
            type="button"
            className="link-button text-12 text-ink-2"
            onClick={() => remove.mutate(print.id, { onError: fail, onSuccess: onClose })}
          >
            Throw this print away
          </button>
        </p>
      )}
      {isNaming && (
        <NameDialog
          title="Rename print"
          label="Title"
          action="Rename"
          initial={print.title}
          maxLength={120}
          onClose={() => setIsNaming(false)}
          onSave={(title) => mutateAsync({ id: print.id, title })}
        />
      )}
    </section>
  );
}
