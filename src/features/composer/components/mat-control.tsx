import { useDraggable, useDroppable } from '@dnd-kit/core';
import { memo } from 'react';
import type { MatId, PrintId } from '#shared/model/ids';
import type { Rect } from '#shared/model/rect';
import { matDropId, type DragData, type DropData } from '@/features/composer/hooks/drag-data';

interface MatControlProps {
  matId: MatId;
  /** In px from the spread's top-left corner. */
  rect: Rect;
  z: number;
  label: string;
  /** The print that a drag picks up; without one the mat itself is dragged. */
  printId: PrintId | null;
  isSelected: boolean;
  isEditable: boolean;
  /** How a print in the hand over this mat would lie. */
  drop: 'fits' | 'cuts' | null;
  isMarked: boolean;
  onSelect: (matId: MatId, adds: boolean) => void;
}

/** One mat as something to press, focus, drag and drop on; its picture is drawn by the scene beneath. */
export const MatControl = memo(function MatControl({ matId, rect, z, label, printId, isSelected, isEditable, drop, isMarked, onSelect }: MatControlProps) {
  const dragData: DragData = printId ? { type: 'carried', matId, printId } : { type: 'mat', matId };
  const dropData: DropData = { type: 'mat', matId, z };
  const draggable = useDraggable({ id: `carry/${matId}`, data: dragData, disabled: !isEditable });
  const droppable = useDroppable({ id: matDropId(matId), data: dropData, disabled: !isEditable });
  const state = [isSelected && 'is-selected', isMarked && 'is-marked', drop && `is-drop-${drop}`, draggable.isDragging && printId && 'is-in-hand']
    .filter(Boolean)
    .join(' ');
  return (
    <button
      type="button"
      ref={(node) => {
        draggable.setNodeRef(node);
        droppable.setNodeRef(node);
      }}
      {...draggable.attributes}
      {...draggable.listeners}
      aria-disabled={undefined}
      aria-pressed={isSelected}
      aria-label={label}
      className={`mat-control ${state}`}
      style={{ left: rect.x, top: rect.y, width: rect.width, height: rect.height, zIndex: isSelected ? 4 : 1 }}
      onClick={(event) => onSelect(matId, event.shiftKey || event.metaKey || event.ctrlKey)}
    />
  );
});
