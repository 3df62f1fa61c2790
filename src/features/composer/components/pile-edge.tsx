import { useDraggable, useDroppable } from '@dnd-kit/core';
import { memo } from 'react';
import { Link } from 'react-router-dom';
import type { Pile } from '#shared/contracts/prints';
import { smallestCuts } from '#shared/geometry/smallest-cut';
import type { PrintId } from '#shared/model/ids';
import type { Print } from '#shared/model/print';
import { copiesUsed } from '#shared/model/print-use';
import type { SpreadDocument } from '#shared/model/spread';
import { formatLength, type Unit } from '#shared/words/measure';
import { PrintPicture } from '@/components/print-picture';
import { printAngle } from '@/lib/print-angle';
import { TABLE_DROP_ID, type DragData, type DropData } from '@/features/composer/hooks/drag-data';
import { useComposer } from '@/features/composer/hooks/composer-context';

/** px per inch of the prints along the table's edge: one scale for all, so that they compare. */
const PILE_SCALE = 17;

interface PileEdgeProps {
  piles: readonly Pile[];
  heldPrintId: PrintId | null;
  isEditable: boolean;
  sortHref: string;
  marked: ReadonlySet<string>;
}

/** The prints that lie ready along the bottom edge of the table, in their piles, at relative physical scale. */
export function PileEdge({ piles, heldPrintId, isEditable, sortHref, marked }: PileEdgeProps) {
  const doc = useComposer((state) => state.doc);
  const prints = useComposer((state) => state.prints);
  const unit = useComposer((state) => state.unit);
  const usedElsewhere = useComposer((state) => state.usedElsewhere);
  const trim = useComposer((state) => state.trim);
  const dropData: DropData = { type: 'table' };
  const { setNodeRef, isOver } = useDroppable({ id: TABLE_DROP_ID, data: dropData, disabled: !isEditable });
  const used = copiesUsed(doc, trim.tolerance);
  const onTable = doc.table.flatMap((id) => prints.get(id) ?? []);
  const isReady = (print: Print): boolean =>
    print.id === heldPrintId || (used.get(print.id) ?? 0) + (usedElsewhere[print.id] ?? 0) < print.copies;
  const groups = [...piles.map((pile) => ({ id: pile.id as string | null, name: pile.name })), { id: null, name: 'Loose' }]
    .map((pile) => {
      const members = onTable.filter((print) => print.pileId === pile.id);
      return { ...pile, all: members.length, ready: members.filter(isReady) };
    })
    .filter((pile) => pile.all > 0);
  return (
    <div ref={setNodeRef} className={`pile-edge ${isOver ? 'is-over' : ''}`}>
      {groups.length > 0 && <p className="pile-key">Each tag is a print’s smallest cut</p>}
      <div className="piles" tabIndex={0} role="region" aria-label="Prints on the table">
        {groups.map((pile) => (
          <section key={pile.id ?? 'loose'} className="pile" aria-label={`${pile.name}, ${pile.ready.length} of ${pile.all} ready`}>
            <ul>
              {pile.ready.map((print) => (
                <li key={print.id}>
                  <TablePrint print={print} doc={doc} unit={unit} isHeld={print.id === heldPrintId} isEditable={isEditable} isMarked={marked.has(print.id)} />
                </li>
              ))}
              {pile.ready.length === 0 && <li className="pile-empty">All placed</li>}
            </ul>
            <h2 className="pile-name">
              {pile.name}
              <span className="num">
                {pile.ready.length} of {pile.all}
              </span>
            </h2>
          </section>
        ))}
        {groups.length === 0 && (
          <p className="emptyline">
            No prints on this table yet. <Link to={sortHref}>Choose some in Sort</Link>.
          </p>
        )}
      </div>
    </div>
  );
}

interface TablePrintProps {
  print: Print;
  doc: SpreadDocument;
  unit: Unit;
  isHeld: boolean;
  isEditable: boolean;
  isMarked: boolean;
}

const TablePrint = memo(function TablePrint({ print, doc, unit, isHeld, isEditable, isMarked }: TablePrintProps) {
  const data: DragData = { type: 'print', printId: print.id };
  const { setNodeRef, attributes, listeners } = useDraggable({ id: `print/${print.id}`, data, disabled: !isEditable });
  const trim = useComposer((state) => state.trim);
  const cuts = smallestCuts(print, doc.format, doc.reveal, trim);
  const size = `${formatLength(print.paperWidth, unit)} × ${formatLength(print.paperHeight, unit)} ${unit}`;
  return (
    <>
      <button
        type="button"
        ref={setNodeRef}
        {...attributes}
        {...listeners}
        aria-disabled={undefined}
        style={{ rotate: isHeld ? undefined : `${printAngle(print.id)}deg` }}
        className={`table-print ${isHeld ? 'is-held' : ''} ${isMarked ? 'is-marked' : ''}`}
        aria-label={`${print.title}, ${size}${cautionOf(print) ? `, ${cautionOf(print)}` : ''}`}
      >
        <PrintPicture print={print} pxPerInch={PILE_SCALE} state={isHeld ? 'gone' : 'rest'} decorative />
      </button>
      {isHeld ? (
        <span className="tag" data-tone="quiet">in hand</span>
      ) : print.marks.instantFilm ? (
        <span className="tag" data-tone="stop">Do not cut</span>
      ) : (
        <span className="tag">
          {cuts.map(({ width, height }) => `${formatLength(width, unit)} × ${formatLength(height, unit)}`).join(' or ')}
        </span>
      )}
    </>
  );
});

function cautionOf(print: Print): string {
  if (print.marks.instantFilm) return 'instant film, do not cut';
  if (print.marks.oneOfAKind) return 'one of a kind';
  return print.marks.borrowedUntil ? 'borrowed' : '';
}
