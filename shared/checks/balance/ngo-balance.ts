import type { Rect, Size } from '../../model/rect';

export interface NgoBalance {
  /** Left against right: −1 … 1, 0 where equal, positive where the left weighs more. */
  readonly vertical: number;
  /** Top against bottom, likewise. */
  readonly horizontal: number;
  /** 0 … 1, 1 best. */
  readonly balance: number;
}

/**
 * Balance (BM) of D. C. L. Ngo, L. S. Teo, J. G. Byrne (2003), "Modelling interface aesthetics", Information
 * Sciences 152:25–46: on each side of each axis area × distance of its centre line from the frame's, the two
 * sides' difference over the larger. No objects, or all on the axis, count as balanced (0/0 is 0).
 *
 * Variant: an object across an axis is split there, each part with its own area and distance. (The paper
 * leaves this open; giving it whole to the side of its centre changes the ratio.)
 *
 * @param rects - objects within the frame, from its top-left corner.
 */
export function ngoBalance(frame: Size, rects: readonly Rect[]): NgoBalance {
  const sides = { left: 0, right: 0, top: 0, bottom: 0 };
  for (const rect of rects) {
    const across = moments(rect.x, rect.width, frame.width / 2);
    sides.left += across.before * rect.height;
    sides.right += across.after * rect.height;
    const along = moments(rect.y, rect.height, frame.height / 2);
    sides.top += along.before * rect.width;
    sides.bottom += along.after * rect.width;
  }
  const vertical = compare(sides.left, sides.right);
  const horizontal = compare(sides.top, sides.bottom);
  return { vertical, horizontal, balance: 1 - (Math.abs(vertical) + Math.abs(horizontal)) / 2 };
}

/** Length × distance of its middle from the axis, of the parts of an interval before and after it. */
function moments(start: number, length: number, axis: number): { before: number; after: number } {
  const before = Math.min(Math.max(axis - start, 0), length);
  const after = length - before;
  const reach = Math.max(axis - start, 0);
  const far = Math.max(start + length - axis, 0);
  return { before: before * (reach - before / 2), after: after * (far - after / 2) };
}

function compare(a: number, b: number): number {
  const larger = Math.max(a, b);
  return larger === 0 ? 0 : (a - b) / larger;
}
