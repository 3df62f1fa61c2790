import type { PageFormat } from '../model/page-format';
import type { Print } from '../model/print';
import type { Size } from '../model/rect';
import type { TrimSettings } from '../model/spread';
import { toPaper } from './paper';

/**
 * True where a print must not be trimmed at all: instant film (its pack holds caustic paste), the only
 * print there is, or one that must go back. A digital photo can be printed again. PRODUCT.md section 5.
 */
export const mustStayWhole = ({ marks }: Pick<Print, 'marks'>): boolean =>
  !marks.digital && (marks.instantFilm || marks.oneOfAKind || marks.borrowedUntil !== null);

/**
 * True size (Lengths) of the smallest mat on a page's grid whose photo, at this reveal, still holds the
 * print's keep zone with the cutting tolerance on every side; for a print without a keep zone, or one that
 * must stay whole, the smallest that carries all of it.
 */
export function smallestMat(print: Print, format: PageFormat, reveal: number, trim: TrimSettings): Size {
  const paper = { x: 0, y: 0, width: print.paperWidth, height: print.paperHeight };
  const isTrimmed = print.keepZone !== null && !mustStayWhole(print);
  const keep = isTrimmed ? toPaper(print, print.keepZone!) : paper;
  const spare = isTrimmed ? trim.tolerance : 0;
  const side = (kept: number, whole: number): number => {
    const photo = Math.min(kept + 2 * spare, whole);
    const steps = Math.ceil((photo + 2 * reveal + format.gap) / format.step);
    return steps * format.step - format.gap;
  };
  return { width: side(keep.width, paper.width), height: side(keep.height, paper.height) };
}
