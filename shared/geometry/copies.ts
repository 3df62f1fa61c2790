import { canSeparate } from './separable';
import { inset, overlaps } from './rects';
import type { Rect } from '../model/rect';

/** More pieces than this are shared out first come, first served instead of by trying every way. */
const EXACT_PIECES = 9;

/** What one copy is asked for: a whole print or a split print takes all of it; a window takes its rectangle. */
export type CopyUse = { readonly kind: 'all' } | { readonly kind: 'piece'; readonly window: Rect };

/**
 * The fewest copies from which all uses can be cut. The rule: a whole print and a split print take one copy
 * each (the panes of one group are one copy); windows may share a copy where they keep `tolerance` between
 * them and can be separated by cuts from edge to edge.
 *
 * With over nine pieces of one print, the pieces go to the first copy that has room, which may count a copy too many.
 */
export function copiesNeeded(uses: readonly CopyUse[], tolerance: number): number {
  const pieces = uses.flatMap((use) => (use.kind === 'piece' ? [use.window] : []));
  const whole = uses.length - pieces.length;
  if (pieces.length <= 1) return whole + pieces.length;
  const fits = (copy: readonly Rect[], piece: Rect): boolean => fitsOn(copy, piece, tolerance);
  return whole + (pieces.length > EXACT_PIECES ? firstFit(pieces, fits) : fewest(pieces, fits));
}

type Fits = (copy: readonly Rect[], piece: Rect) => boolean;

/** True where a further piece can come out of a copy that already gives these. */
function fitsOn(copy: readonly Rect[], piece: Rect, tolerance: number): boolean {
  const apart = copy.every((other) => !overlaps(inset(other, -tolerance), piece));
  return apart && canSeparate([...copy, piece]);
}

function firstFit(pieces: readonly Rect[], fits: Fits): number {
  const copies: Rect[][] = [];
  for (const piece of pieces) {
    const copy = copies.find((candidate) => fits(candidate, piece));
    if (copy) copy.push(piece);
    else copies.push([piece]);
  }
  return copies.length;
}

/** Tries every way of sharing the pieces out, leaving off as soon as a way needs no fewer copies than the best. */
function fewest(pieces: readonly Rect[], fits: Fits): number {
  let best = firstFit(pieces, fits);
  const copies: Rect[][] = [];
  const place = (next: number): void => {
    if (copies.length >= best) return;
    const piece = pieces[next];
    if (!piece) {
      best = copies.length;
      return;
    }
    for (const copy of copies) {
      if (!fits(copy, piece)) continue;
      copy.push(piece);
      place(next + 1);
      copy.pop();
    }
    copies.push([piece]);
    place(next + 1);
    copies.pop();
  };
  place(0);
  return best;
}
