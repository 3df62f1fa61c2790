import { mustStayWhole } from '../model/must-stay-whole';
import type { PageFormat } from '../model/page-format';
import type { Print } from '../model/print';
import type { Size } from '../model/rect';
import type { TrimSettings } from '../model/spread';
import { neededOf, paperOf } from './keep-zone';
import { turnedSize } from './paper';
import { canHold } from './window';

const AT_OWN_SIZE = { scaledWidth: null, detailId: null };

/**
 * True sizes (Lengths) of the smallest mats on a page's grid whose photo, at this reveal, still holds the print's keep
 * zone, with the cutting tolerance on every side and its window on the trimmer's finest mark. For a print without a
 * keep zone, or one that must stay whole, the smallest that carry all of it. On an edge-to-edge page: away from the rim.
 *
 * @returns one size; two, flat before upright, for a print with no up whose smallest mat is not square.
 */
export function smallestCuts(print: Print, format: PageFormat, reveal: number, trim: TrimSettings): readonly Size[] {
  const paper = paperOf(print, AT_OWN_SIZE);
  const needed = (mustStayWhole(print) ? null : neededOf(print, AT_OWN_SIZE, trim.tolerance)) ?? paper;
  const photoOf = (steps: number): number => steps * format.step - format.gap - 2 * reveal;
  const least = (holds: (photo: number) => boolean): number => {
    let steps = 1;
    while (photoOf(steps) <= 0 || !holds(photoOf(steps))) steps += 1;
    return steps * format.step - format.gap;
  };
  // Each side is judged by itself, the other being as large as the paper.
  const cut: Size = {
    width: least((width) => canHold(needed, { width, height: paper.height }, paper, trim.finestMark)),
    height: least((height) => canHold(needed, { width: paper.width, height }, paper, trim.finestMark)),
  };
  if (!print.marks.noUp || cut.width === cut.height) return [cut];
  const turned = turnedSize(cut, 1);
  return cut.width > cut.height ? [cut, turned] : [turned, cut];
}
