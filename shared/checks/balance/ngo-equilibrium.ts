import { area, centre } from '../../geometry/rects';
import type { Rect, Size } from '../../model/rect';

export interface NgoEquilibrium {
  /** As the paper has it, the number of objects in the divisor: it nears 1 where there are many. */
  readonly equilibrium: number;
  /** Without the number of objects, so that spreads with few and with many can be compared. */
  readonly withoutCount: number;
}

/**
 * Equilibrium (EM) of D. C. L. Ngo, L. S. Teo, J. G. Byrne (2003), Information Sciences 152:25–46: how near the middle
 * of the objects, weighed by area, lies to the frame's. 0 … 1, 1 best; 1 where there are no objects.
 */
export function ngoEquilibrium(frame: Size, rects: readonly Rect[]): NgoEquilibrium {
  let total = 0;
  let x = 0;
  let y = 0;
  for (const rect of rects) {
    const middle = centre(rect);
    total += area(rect);
    x += area(rect) * (middle.x - frame.width / 2);
    y += area(rect) * (middle.y - frame.height / 2);
  }
  if (total === 0) return { equilibrium: 1, withoutCount: 1 };
  const off = Math.abs((2 * x) / (frame.width * total)) + Math.abs((2 * y) / (frame.height * total));
  return { equilibrium: 1 - off / rects.length / 2, withoutCount: 1 - off / 2 };
}
