import { neededOf, paperOf } from '../geometry/keep-zone';
import { contains } from '../geometry/rects';
import type { Rect } from '../model/rect';
import { defineCheck, type Finding, type Remedy, type SpreadView } from './check';
import { slideBy } from './keep-zone-remedies';
import { piecesOf, type Piece } from './pieces';
import { otherRun } from './window-off-paper';

/**
 * A split print whose keep zone does not lie within one pane, tolerance included: a cut goes through it or,
 * where the picture runs on behind the gaps, a strip of it is swallowed. A zone that leaves the window
 * altogether belongs to `keep-zone-cut`.
 */
export const seamThroughKeepZone = defineCheck({
  id: 'seam-through-keep-zone',
  severity: 'stop',
  basis: { kind: 'common-practice' },
  needsFilledPages: false,
  yieldsTo: ['never-cut', 'window-off-paper', 'keep-zone-cut'],
  thresholds: {},
  find: (view) =>
    piecesOf(view).flatMap((piece): Finding[] => {
      if (piece.groupId === null) return [];
      const needed = neededOf(piece.print, piece.placement, view.trim.tolerance);
      if (!needed) return [];
      const isHeld = piece.photos.some((photo) => contains(photo.window, needed));
      if (isHeld || !contains(piece.window, needed)) return [];
      const isBehind = view.doc.panes.some((group) => group.id === piece.groupId && group.content?.run === 'behind');
      return [
        {
          messageId: isBehind ? 'seam-behind' : 'seam-apart',
          data: { title: piece.print.title },
          matIds: piece.matIds,
          remedies: () => [...slideIntoOnePane(view, piece, needed), ...otherRun(view, piece)],
        },
      ];
    }),
});

/** Moves of the whole window that bring the keep zone into one pane and leave all panes on the paper, the smallest first. */
function slideIntoOnePane({ trim }: SpreadView, piece: Piece, needed: Rect): Remedy[] {
  const { placement } = piece;
  const paper = paperOf(piece.print, placement);
  return piece.photos
    .flatMap(({ window }) => {
      const dx = slideBy(window.x, window.width, needed.x, needed.width, placement.x, trim.finestMark);
      const dy = slideBy(window.y, window.height, needed.y, needed.height, placement.y, trim.finestMark);
      if (dx === null || dy === null) return [];
      const moved = { ...piece.window, x: piece.window.x + dx, y: piece.window.y + dy };
      return contains(paper, moved) ? [{ dx, dy, far: Math.abs(dx) + Math.abs(dy) }] : [];
    })
    .sort((a, b) => a.far - b.far)
    .map(({ dx, dy }) => ({
      messageId: 'slide-window',
      data: {},
      call: { id: 'window.slide', args: { matId: piece.matIds[0]!, x: placement.x + dx, y: placement.y + dy } },
    }));
}
