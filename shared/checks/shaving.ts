import { holdsZone, paperOf } from '../geometry/keep-zone';
import { bottom, right } from '../geometry/rects';
import { SHAVING, slideWindow } from '../geometry/window';
import { inches } from '../model/length';
import type { Rect, Size } from '../model/rect';
import { defineCheck, type Finding } from './check';
import type { Edge } from './messages';
import { piecesOf } from './pieces';

/**
 * A cut that takes off a shaving too thin for a trimmer to hold, where sliding the window to that edge of
 * the paper would save the cut, leave no other shaving and still keep the subject.
 */
export const shaving = defineCheck({
  id: 'shaving',
  severity: 'consider',
  basis: { kind: 'common-practice' },
  needsFilledPages: false,
  yieldsTo: ['never-cut', 'keep-zone-cut', 'window-off-paper', 'print-smaller-than-photo', 'seam-through-keep-zone'],
  thresholds: { width: { default: SHAVING, min: inches(1 / 16), max: inches(1), unit: 'length' } },
  find: (view, { width }) =>
    piecesOf(view).flatMap((piece): Finding[] => {
      const { placement, print, window } = piece;
      if (placement.mode === 'whole' || piece.groupId !== null || print.marks.digital) return [];
      const paper = paperOf(print, placement);
      const thin = stripsOf(window, paper).find(({ strip, opposite, flush }) => {
        if (strip <= 0 || strip >= width || strip + opposite < width) return false;
        const at = slideWindow(flush.x, flush.y, window, paper, view.trim.finestMark);
        const isReachable = at.x === flush.x && at.y === flush.y;
        return isReachable && holdsZone({ ...window, ...flush }, print, placement, view.trim.tolerance);
      });
      if (!thin) return [];
      const args = { matId: piece.matIds[0]!, ...thin.flush };
      return [
        {
          messageId: 'shaving',
          data: { title: print.title, width: thin.strip, edge: CLOCKWISE[(CLOCKWISE.indexOf(thin.edge) + placement.turn) % 4]! },
          matIds: piece.matIds,
          remedies: () => [{ messageId: 'slide-window', data: {}, call: { id: 'window.slide', args } }],
        },
      ];
    }),
});

/** Each quarter-turn of the piece brings every edge to where the next one was. */
const CLOCKWISE: readonly Edge[] = ['top', 'right', 'bottom', 'left'];

interface Strip {
  /** As the paper lies upright. */
  readonly edge: Edge;
  readonly strip: number;
  readonly opposite: number;
  /** The window's corner when it is slid to this edge. */
  readonly flush: { readonly x: number; readonly y: number };
}

/** What is cut off at each edge of the paper. */
function stripsOf(window: Rect, paper: Size): readonly Strip[] {
  const { x, y } = window;
  const after = paper.width - right(window);
  const below = paper.height - bottom(window);
  return [
    { edge: 'left', strip: x, opposite: after, flush: { x: 0, y } },
    { edge: 'right', strip: after, opposite: x, flush: { x: x + after, y } },
    { edge: 'top', strip: y, opposite: below, flush: { x, y: 0 } },
    { edge: 'bottom', strip: below, opposite: y, flush: { x, y: y + below } },
  ];
}
