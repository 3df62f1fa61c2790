import { closestCenter, DndContext, KeyboardSensor, PointerSensor, useSensor, useSensors, type Announcements, type DragEndEvent } from '@dnd-kit/core';
import { rectSortingStrategy, SortableContext, sortableKeyboardCoordinates } from '@dnd-kit/sortable';
import type { ReactNode } from 'react';
import type { SpreadSummary } from '#shared/contracts/albums';
import { useUpdateSpread } from '../api/album-mutations';

interface ReadingOrderProps {
  readonly albumId: string;
  /** In reading order. */
  readonly spreads: readonly SpreadSummary[];
  readonly onFail: (error: unknown) => void;
  readonly children: ReactNode;
}

const HELP = { draggable: 'Press Space to pick a spread up, the arrow keys to move it, Space to place it, Escape to put it back.' };

/** Spreads that change places by drag or keyboard: their numbers are the handles. */
export function ReadingOrder({ albumId, spreads, onFail, children }: ReadingOrderProps) {
  const update = useUpdateSpread(albumId);
  const sensors = useSensors(
    useSensor(PointerSensor, { activationConstraint: { distance: 5 } }),
    useSensor(KeyboardSensor, { coordinateGetter: sortableKeyboardCoordinates, keyboardCodes: { start: ['Space'], cancel: ['Escape'], end: ['Space', 'Enter'] } }),
  );
  const placeOf = (id: unknown): number => spreads.findIndex((spread) => spread.id === id);
  const titleOf = (id: unknown): string => spreads[placeOf(id)]?.title ?? 'The spread';
  const numberOf = (id: unknown): string => `place ${placeOf(id) + 1} of ${spreads.length}`;
  const announcements: Announcements = {
    onDragStart: ({ active }) => `${titleOf(active.id)} picked up.`,
    onDragOver: ({ over }) => (over ? `Over ${numberOf(over.id)}.` : undefined),
    onDragEnd: ({ active, over }) => `${titleOf(active.id)} placed on ${over ? numberOf(over.id) : 'its old place'}.`,
    onDragCancel: ({ active }) => `${titleOf(active.id)} put back.`,
  };
  const handleDragEnd = ({ active, over }: DragEndEvent): void => {
    if (over && over.id !== active.id) update.mutate({ id: String(active.id), position: placeOf(over.id) }, { onError: onFail });
  };
  return (
    <DndContext sensors={sensors} collisionDetection={closestCenter} accessibility={{ announcements, screenReaderInstructions: HELP }} onDragEnd={handleDragEnd}>
      <SortableContext items={spreads.map(({ id }) => id)} strategy={rectSortingStrategy}>
        {children}
      </SortableContext>
    </DndContext>
  );
}
