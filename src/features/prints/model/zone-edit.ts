import { clamp } from '#shared/geometry/clamp';
import { toPicture, type PaperFrame } from '#shared/geometry/paper';
import type { PxRect } from '#shared/model/print';
import type { Rect, Size } from '#shared/model/rect';

/** Which sides of a rectangle a handle pulls; -1 is left or top, 1 right or bottom, 0 neither. */
export interface Handle {
  readonly x: -1 | 0 | 1;
  readonly y: -1 | 0 | 1;
}

export const HANDLES: readonly Handle[] = ([-1, 0, 1] as const).flatMap((y) =>
  ([-1, 0, 1] as const).filter((x) => x !== 0 || y !== 0).map((x) => ({ x, y })),
);

/** A rectangle moved by (dx, dy), kept on the paper. All in one unit. */
export const moveZone = (zone: Rect, dx: number, dy: number, paper: Size): Rect => ({
  ...zone,
  x: clamp(zone.x + dx, 0, paper.width - zone.width),
  y: clamp(zone.y + dy, 0, paper.height - zone.height),
});

/** A rectangle pulled at a handle by (dx, dy), kept on the paper and never smaller than `least` on a side. */
export function pullZone(zone: Rect, handle: Handle, dx: number, dy: number, paper: Size, least: number): Rect {
  const right = zone.x + zone.width;
  const bottom = zone.y + zone.height;
  const x = handle.x === -1 ? clamp(zone.x + dx, 0, right - least) : zone.x;
  const y = handle.y === -1 ? clamp(zone.y + dy, 0, bottom - least) : zone.y;
  return {
    x,
    y,
    width: handle.x === 1 ? clamp(zone.width + dx, least, paper.width - x) : right - x,
    height: handle.y === 1 ? clamp(zone.height + dy, least, paper.height - y) : bottom - y,
  };
}

/** The rectangle between two points, kept on the paper and at least `least` on a side. */
export function zoneBetween(a: { x: number; y: number }, b: { x: number; y: number }, paper: Size, least: number): Rect {
  const width = clamp(Math.abs(b.x - a.x), least, paper.width);
  const height = clamp(Math.abs(b.y - a.y), least, paper.height);
  return moveZone({ x: Math.min(a.x, b.x), y: Math.min(a.y, b.y), width, height }, 0, 0, paper);
}

/** Where a keep zone starts for a print that has none: the middle half of the paper. */
export const middleZone = ({ width, height }: Size): Rect => ({ x: width / 4, y: height / 4, width: width / 2, height: height / 2 });

/** A rectangle on the paper as whole pixels of the oriented original, the form in which zones are stored. */
export function toPxRect(frame: PaperFrame, rect: Rect): PxRect {
  const exact = toPicture(frame, rect);
  const x = Math.round(exact.x);
  const y = Math.round(exact.y);
  return {
    x,
    y,
    width: Math.max(1, Math.round(exact.x + exact.width) - x),
    height: Math.max(1, Math.round(exact.y + exact.height) - y),
  };
}
