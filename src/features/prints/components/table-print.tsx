import { useDraggable } from '@dnd-kit/core';
import { memo, type KeyboardEvent } from 'react';
import type { Print } from '#shared/model/print';
import { PrintPicture } from '@/components/print-picture';
import { Tag } from '@/components/tag';
import { printAngle } from '@/lib/print-angle';
import { describePrint, tagOf, type Sizing } from '../model/table-words';

interface TablePrintProps {
  readonly print: Print;
  readonly sizing: Sizing;
  readonly isOpen: boolean;
  readonly isHeld: boolean;
  readonly isEditable: boolean;
  /** Undefined where there is no spread to choose prints for. */
  readonly isOnSpread: boolean | undefined;
  readonly onOpen: (id: string) => void;
  readonly onKey: (id: string, event: KeyboardEvent) => void;
  readonly onChoose: (id: string, on: boolean) => void;
}

/** A print on the table, askew by its own angle, with its tag. Opens when pressed; goes to another pile when dragged. */
export const TablePrint = memo(function TablePrint({
  print,
  sizing,
  isOpen,
  isHeld,
  isEditable,
  isOnSpread,
  onOpen,
  onKey,
  onChoose,
}: TablePrintProps) {
  const { setNodeRef, attributes, listeners } = useDraggable({ id: print.id, disabled: !isEditable });
  const tag = tagOf(print, sizing);
  return (
    <li>
      <div className="relative w-max">
        <button
          ref={setNodeRef}
          {...attributes}
          {...listeners}
          type="button"
          aria-disabled={undefined}
          aria-label={describePrint(print, sizing.unit)}
          aria-expanded={isOpen}
          className="sort-print"
          data-open={isOpen}
          style={{ rotate: isHeld ? undefined : `${printAngle(print.id)}deg` }}
          onClick={() => onOpen(print.id)}
          onKeyDown={(event) => {
            onKey(print.id, event);
            if (!event.defaultPrevented) listeners?.onKeyDown?.(event);
          }}
        >
          <PrintPicture print={print} state={isHeld ? 'gone' : 'rest'} decorative />
        </button>
        {isOnSpread !== undefined && !isHeld && (
          <input
            type="checkbox"
            className="on-spread"
            aria-label={`${print.title} on this spread`}
            title={isOnSpread ? 'Meant for this spread' : 'Choose for this spread'}
            checked={isOnSpread}
            disabled={!isEditable}
            onChange={(event) => onChoose(print.id, event.target.checked)}
          />
        )}
      </div>
      <div className="mt-1 flex flex-wrap items-center gap-1">
        {isHeld ? <Tag tone="quiet">in hand</Tag> : <Tag tone={tag.tone}>{tag.words}</Tag>}
        {print.marks.digital && !isHeld && <Tag tone="quiet">digital</Tag>}
      </div>
    </li>
  );
});
