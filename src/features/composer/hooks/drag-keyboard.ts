import { KeyboardCode, type KeyboardCoordinateGetter } from '@dnd-kit/core';
import type { DragData, DropData } from './drag-data';
import { isPrintDrag } from './drag-data';

const DIRECTIONS: Record<string, readonly [number, number]> = {
  [KeyboardCode.Left]: [-1, 0],
  [KeyboardCode.Right]: [1, 0],
  [KeyboardCode.Up]: [0, -1],
  [KeyboardCode.Down]: [0, 1],
};

/** px that one arrow press moves: a step for mats, the trimmer's finest mark for windows (four with Shift). */
export interface KeyboardStrides {
  readonly stepPx: number;
  readonly markPx: number;
}

/**
 * Where an arrow key takes what is in the hand: a print to the nearest mat that way (or to the table),
 * everything else by its stride.
 *
 * @param inHand - what is in the hand, as it was picked up.
 */
export const keyboardCoordinates =
  (strides: () => KeyboardStrides, inHand: () => DragData | null): KeyboardCoordinateGetter =>
  (event, { currentCoordinates, context }) => {
    const direction = DIRECTIONS[event.code];
    if (!direction) return undefined;
    event.preventDefault();
    const data = inHand() ?? undefined;
    const [dx, dy] = direction;
    if (!isPrintDrag(data)) {
      const { stepPx, markPx } = strides();
      const stride = data?.type === 'window' ? markPx * (event.shiftKey ? 4 : 1) : stepPx;
      return { x: currentCoordinates.x + dx * stride, y: currentCoordinates.y + dy * stride };
    }
    const held = context.collisionRect;
    if (!held) return undefined;
    const from = { x: held.left + held.width / 2, y: held.top + held.height / 2 };
    const target = nearest(context, from, dx, dy, context.over?.id);
    return target && { x: target.x - held.width / 2, y: target.y - held.height / 2 };
  };

/** px from the table's edges to where a print is held over it. */
const TABLE_INSET = 40;

type Context = Parameters<KeyboardCoordinateGetter>[1]['context'];

function nearest(context: Context, from: { x: number; y: number }, dx: number, dy: number, overId: unknown): { x: number; y: number } | undefined {
  let best: { cost: number; x: number; y: number } | undefined;
  for (const container of context.droppableContainers.getEnabled()) {
    const rect = context.droppableRects.get(container.id);
    if (!rect || container.id === overId) continue;
    // The table is as wide as the screen nearly: straight down to it, or to the end of it that is nearer.
    const isTable = (container.data.current as DropData | undefined)?.type === 'table';
    const inset = Math.min(rect.width / 2, rect.height / 2, TABLE_INSET);
    const x = isTable ? Math.min(Math.max(from.x, rect.left + inset), rect.right - inset) : rect.left + rect.width / 2;
    const y = isTable ? rect.top + inset : rect.top + rect.height / 2;
    const along = (x - from.x) * dx + (y - from.y) * dy;
    if (along < 2) continue;
    const across = Math.abs((x - from.x) * dy) + Math.abs((y - from.y) * dx);
    const cost = along + 2 * across;
    if (!best || cost < best.cost) best = { cost, x, y };
  }
  return best;
}
