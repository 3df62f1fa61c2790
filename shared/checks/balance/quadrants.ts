import type { Rect, Size } from '../../model/rect';

/** The four quarters of a frame in reading order: upper left, upper right, lower left, lower right. */
export type PerQuadrant<T> = readonly [upperLeft: T, upperRight: T, lowerLeft: T, lowerRight: T];

/** Sums over the parts of objects that lie in one quarter; distances are those of a part's middle from the frame's. */
export interface Quadrant {
  readonly x: number;
  readonly y: number;
  readonly height: number;
  readonly width: number;
  /** |dy / dx|, a slope and not an angle. */
  readonly slope: number;
  readonly reach: number;
  readonly area: number;
}

const EMPTY: Quadrant = { x: 0, y: 0, height: 0, width: 0, slope: 0, reach: 0, area: 0 };

interface Interval {
  readonly start: number;
  readonly length: number;
}

/** The sums of every quarter. An object across an axis is split there, so that each part lies in one quarter only. */
export function quadrantsOf(frame: Size, rects: readonly Rect[]): PerQuadrant<Quadrant> {
  const sums: Quadrant[] = [EMPTY, EMPTY, EMPTY, EMPTY];
  for (const rect of rects) {
    splitAt({ start: rect.x, length: rect.width }, frame.width / 2).forEach((across, column) => {
      splitAt({ start: rect.y, length: rect.height }, frame.height / 2).forEach((along, row) => {
        const index = row * 2 + column;
        if (across.length > 0 && along.length > 0) sums[index] = add(sums[index]!, across, along, frame);
      });
    });
  }
  return sums as unknown as PerQuadrant<Quadrant>;
}

/** The parts of an interval before and after a point; one may have no length. */
function splitAt({ start, length }: Interval, at: number): readonly [Interval, Interval] {
  const before = Math.min(Math.max(at - start, 0), length);
  return [
    { start, length: before },
    { start: start + before, length: length - before },
  ];
}

function add(sum: Quadrant, across: Interval, along: Interval, frame: Size): Quadrant {
  const x = Math.abs(across.start + across.length / 2 - frame.width / 2);
  const y = Math.abs(along.start + along.length / 2 - frame.height / 2);
  return {
    x: sum.x + x,
    y: sum.y + y,
    height: sum.height + along.length,
    width: sum.width + across.length,
    slope: sum.slope + y / x,
    reach: sum.reach + Math.hypot(x, y),
    area: sum.area + across.length * along.length,
  };
}

/** One quantity of every quarter over the largest of the four; all 0 where there is nothing. */
export function normalised(quadrants: PerQuadrant<Quadrant>, name: keyof Quadrant): PerQuadrant<number> {
  const [a, b, c, d] = quadrants;
  const largest = Math.max(a[name], b[name], c[name], d[name]);
  if (largest === 0) return [0, 0, 0, 0];
  return [a[name] / largest, b[name] / largest, c[name] / largest, d[name] / largest];
}
