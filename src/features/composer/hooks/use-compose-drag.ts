import {
  closestCenter,
  KeyboardSensor,
  PointerSensor,
  pointerWithin,
  useSensor,
  useSensors,
  type Announcements,
  type ClientRect,
  type Collision,
  type CollisionDetection,
  type DragEndEvent,
  type DragMoveEvent,
  type DragOverEvent,
  type DragStartEvent,
} from '@dnd-kit/core';
import { useMemo, useRef, useState } from 'react';
import type { CommandCall } from '#shared/commands/calls';
import { placedPhotos, type PlacedPhoto } from '#shared/geometry/placed-photos';
import { UNITS_PER_INCH } from '#shared/model/length';
import type { Mat } from '#shared/model/spread';
import { compose as words } from '#shared/words/en/compose';
import { matLabels, stepPx } from '@/features/composer/canvas/page-scale';
import type { Gesture } from '@/features/composer/model/composer-store';
import { useComposerStore } from './composer-context';
import { isPrintDrag, type DragData, type DropData } from './drag-data';
import { keyboardCoordinates } from './drag-keyboard';
import { moveCall, resizeCall, slideCall } from './drag-steps';

/** What is in the hand, for the overlay and for the marks on its target. */
export interface Held {
  readonly data: DragData;
  readonly overMatId: string | null;
}

interface Start {
  readonly data: DragData;
  readonly gesture: Gesture;
  readonly mat: Mat | undefined;
  readonly photo: PlacedPhoto | undefined;
}

/** The pointer's topmost target. When the hand is a keyboard, what lies under the middle of the print, then the nearest. */
const findTargets: CollisionDetection = (args) => {
  if (!args.pointerCoordinates) {
    // Distance alone would never lead to the table: it is so wide that the mats' middles are nearer than its own.
    const isUnder = ({ id }: Collision): boolean => isMiddleIn(args.collisionRect, args.droppableRects.get(id));
    const nearest = closestCenter(args);
    return [...nearest.filter(isUnder), ...nearest.filter((hit) => !isUnder(hit))];
  }
  const zOf = (hit: (typeof hits)[number]): number => {
    const data = hit.data?.droppableContainer.data.current as DropData | undefined;
    return data?.type === 'mat' ? data.z : -Infinity;
  };
  const hits = pointerWithin(args);
  return hits.sort((a, b) => zOf(b) - zOf(a));
};

/**
 * Everything that dragging in Compose does. A drag is one gesture: each move previews the document from
 * where it began, the drop is one undo step, Escape puts everything back.
 */
export function useComposeDrag(perInch: number) {
  const store = useComposerStore();
  const start = useRef<Start | null>(null);
  // As it was picked up, also once it is let go. The draggable's own data changes in mid-drag: while its print is
  // previewed elsewhere, the mat that it was taken from is bare.
  const inHand = useRef<DragData | null>(null);
  const hasLeft = useRef(false);
  const [held, setHeld] = useState<Held | null>(null);
  const perInchRef = useRef(perInch);
  perInchRef.current = perInch;

  const strides = useMemo(
    () => () => {
      const { doc, trim } = store.getState();
      return {
        stepPx: stepPx(doc.format, perInchRef.current),
        markPx: (trim.finestMark * perInchRef.current) / UNITS_PER_INCH,
      };
    },
    [store],
  );
  const sensors = useSensors(
    useSensor(PointerSensor, { activationConstraint: { distance: 5 } }),
    useSensor(KeyboardSensor, {
      coordinateGetter: useMemo(() => keyboardCoordinates(strides, () => inHand.current), [strides]),
      keyboardCodes: { start: ['Space'], cancel: ['Escape'], end: ['Space', 'Enter'] },
    }),
  );

  const handleDragStart = ({ active }: DragStartEvent) => {
    const data = active.data.current as DragData;
    const state = store.getState();
    const matId = 'matId' in data ? data.matId : undefined;
    const mat = state.doc.mats.find((m) => m.id === matId);
    const photo = placedPhotos(state.doc, (id) => state.prints.get(id)).find((p) => p.matId === matId);
    inHand.current = data;
    hasLeft.current = false;
    start.current = { data, gesture: state.beginGesture(), mat, photo };
    setHeld({ data, overMatId: null });
  };

  const handleDragMove = ({ delta }: DragMoveEvent) => {
    const begun = start.current;
    if (!begun || isPrintDrag(begun.data)) return;
    const call = callOf(begun, delta, perInchRef.current, store.getState().doc);
    if (call) begun.gesture.preview(call);
  };

  const handleDragOver = ({ over }: DragOverEvent) => {
    const begun = start.current;
    if (!begun || !isPrintDrag(begun.data)) return;
    const { data, gesture } = begun;
    const drop = over?.data.current as DropData | undefined;
    gesture.preview(dropCalls(data, drop));
    setHeld({ data, overMatId: drop?.type === 'mat' ? drop.matId : null });
  };

  const handleDragEnd = ({ over, delta }: DragEndEvent) => {
    const begun = start.current;
    if (begun) {
      const { data } = begun;
      const drop = over?.data.current as DropData | undefined;
      if (isPrintDrag(data)) begun.gesture.preview(dropCalls(data, drop));
      else {
        const call = callOf(begun, delta, perInchRef.current, store.getState().doc);
        if (call) begun.gesture.preview(call);
      }
      begun.gesture.commit();
      if (isPrintDrag(data) && drop?.type === 'mat') store.getState().select([drop.matId]);
    }
    start.current = null;
    setHeld(null);
  };

  const handleDragCancel = () => {
    start.current?.gesture.cancel();
    start.current = null;
    setHeld(null);
  };

  const collisionDetection = useMemo(
    (): CollisionDetection => (args) => (isPrintDrag(inHand.current ?? undefined) ? findTargets(args) : []),
    [],
  );

  const announcements = useMemo((): Announcements => {
    const nameOf = (data: DragData | null): string => {
      const { prints, doc } = store.getState();
      if (!data) return words.aPrint;
      if (isPrintDrag(data)) return prints.get(data.printId)?.title ?? words.aPrint;
      return words.mat(matLabels(doc.mats).get(data.matId) ?? '');
    };
    const placeOf = (drop: DropData | undefined): string => {
      if (!drop) return words.nothing;
      return drop.type === 'table' ? words.theTable : words.mat(matLabels(store.getState().doc.mats).get(drop.matId) ?? '');
    };
    const isPrintInHand = (): boolean => isPrintDrag(inHand.current ?? undefined);
    const matNow = (matId: string): string => {
      const mat = store.getState().doc.mats.find((m) => m.id === matId);
      return mat ? words.cells(mat) : '';
    };
    return {
      onDragStart: ({ active }) => words.pickedUp(nameOf(active.data.current as DragData)),
      onDragOver: ({ over }) => {
        const drop = over?.data.current as DropData | undefined;
        hasLeft.current ||= !isHome(inHand.current, drop);
        // Where it was picked up, "picked up" is the last word until it leaves.
        return isPrintInHand() && hasLeft.current ? words.over(placeOf(drop)) : undefined;
      },
      onDragMove: () => {
        const data = inHand.current;
        return data?.type === 'mat' || data?.type === 'resize' ? matNow(data.matId) : undefined;
      },
      onDragEnd: ({ over }) =>
        isPrintInHand() ? words.placed(nameOf(inHand.current), placeOf(over?.data.current as DropData | undefined)) : words.putDown(nameOf(inHand.current)),
      onDragCancel: () => words.putBack(nameOf(inHand.current)),
    };
  }, [store]);

  return {
    held,
    contextProps: {
      sensors,
      collisionDetection,
      accessibility: { announcements, screenReaderInstructions: { draggable: words.dragHelp } },
      onDragStart: handleDragStart,
      onDragMove: handleDragMove,
      onDragOver: handleDragOver,
      onDragEnd: handleDragEnd,
      onDragCancel: handleDragCancel,
    },
  };
}

function isMiddleIn(held: ClientRect, target: ClientRect | undefined): boolean {
  if (!target) return false;
  const x = held.left + held.width / 2;
  const y = held.top + held.height / 2;
  return target.left <= x && x <= target.right && target.top <= y && y <= target.bottom;
}

/** True for the place that a print was picked up from. */
const isHome = (data: DragData | null, drop: DropData | undefined): boolean =>
  drop?.type === 'mat' ? data?.type === 'carried' && data.matId === drop.matId : drop?.type === 'table' && data?.type === 'print';

function callOf({ data, ...begun }: Start, delta: { x: number; y: number }, perInch: number, doc: Parameters<typeof moveCall>[0]): CommandCall | null {
  switch (data.type) {
    case 'mat':
      return begun.mat ? moveCall(doc, begun.mat, delta, perInch) : null;
    case 'resize':
      return begun.mat ? resizeCall(doc, begun.mat, data.edge, delta, perInch) : null;
    case 'window':
      return begun.photo ? slideCall(begun.photo, delta, perInch) : null;
    default:
      return null;
  }
}

function dropCalls(data: Extract<DragData, { printId: string }>, drop: DropData | undefined): CommandCall[] {
  if (!drop) return [];
  if (data.type === 'print') {
    return drop.type === 'mat' ? [{ id: 'prints.place', args: { printId: data.printId, matId: drop.matId } }] : [];
  }
  if (drop.type === 'table') return [{ id: 'prints.lift', args: { matIds: [data.matId] } }];
  return drop.matId === data.matId ? [] : [{ id: 'prints.move', args: { fromMatId: data.matId, toMatId: drop.matId } }];
}
