import { KeyboardSensor, PointerSensor, useSensor, useSensors, type Announcements, type DndContextProps, type KeyboardCoordinateGetter } from '@dnd-kit/core';
import { useState } from 'react';
import type { Print } from '#shared/model/print';
import type { PileGroup } from '../model/pile-groups';

/** Ids of drop places: a pile's own id, or this for the loose prints. */
export const LOOSE = 'loose';

/** Arrow keys go from pile to pile, in reading order; between them there is nothing to aim at. */
const fromPileToPile: KeyboardCoordinateGetter = (event, { context }) => {
  const step = event.code === 'ArrowRight' || event.code === 'ArrowDown' ? 1 : event.code === 'ArrowLeft' || event.code === 'ArrowUp' ? -1 : 0;
  if (step === 0) return undefined;
  event.preventDefault();
  const places = context.droppableContainers
    .getEnabled()
    .flatMap(({ id }) => {
      const rect = context.droppableRects.get(id);
      return rect ? [{ id, rect }] : [];
    });
  if (places.length === 0) return undefined;
  const at = places.findIndex(({ id }) => id === context.over?.id);
  const next = places[(at + step + places.length) % places.length]!;
  return { x: next.rect.left + 16, y: next.rect.top + 40 };
};

interface PileDragInput {
  readonly groups: readonly PileGroup[];
  readonly prints: readonly Print[];
  readonly onMove: (printId: string, pileId: string | null) => void;
}

/** Dragging prints between piles, by pointer (after 5 px, so that a press still opens) and by keyboard (Space, arrows). */
export function usePileDrag({ groups, prints, onMove }: PileDragInput) {
  const [heldId, setHeldId] = useState<string | null>(null);
  const sensors = useSensors(
    useSensor(PointerSensor, { activationConstraint: { distance: 5 } }),
    useSensor(KeyboardSensor, {
      coordinateGetter: fromPileToPile,
      keyboardCodes: { start: ['Space'], cancel: ['Escape'], end: ['Space', 'Enter'] },
    }),
  );
  const titleOf = (id: unknown): string => prints.find((print) => print.id === id)?.title ?? 'The print';
  const pileOf = (id: unknown): string => groups.find((group) => (group.id ?? LOOSE) === id)?.name ?? 'the table';
  const announcements: Announcements = {
    onDragStart: ({ active }) => `${titleOf(active.id)}: picked up`,
    onDragOver: ({ over }) => (over ? `over ${pileOf(over.id)}` : 'over the table'),
    onDragEnd: ({ active, over }) => (over ? `${titleOf(active.id)}: placed in ${pileOf(over.id)}` : `${titleOf(active.id)}: back where it was`),
    onDragCancel: ({ active }) => `${titleOf(active.id)}: back where it was`,
  };
  const contextProps: DndContextProps = {
    sensors,
    accessibility: {
      announcements,
      screenReaderInstructions: {
        draggable: 'Press Enter to open the print. Press Space to pick it up, arrows to go from pile to pile, Space to place it, Escape to put it back. Or press M and the first letter of a pile.',
      },
    },
    onDragStart: ({ active }) => setHeldId(String(active.id)),
    onDragCancel: () => setHeldId(null),
    onDragEnd: ({ active, over }) => {
      setHeldId(null);
      if (over === null) return;
      onMove(String(active.id), over.id === LOOSE ? null : String(over.id));
    },
  };
  return { heldId, contextProps };
}
