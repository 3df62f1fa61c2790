import { gridOf } from '../geometry/grid';
import { contains } from '../geometry/rects';
import { slideWindow } from '../geometry/window';
import { defineCheck, type Finding, type Remedy, type SpreadView } from './check';
import { paperOf } from '../geometry/keep-zone';
import { offPaper } from './off-paper';
import { piecesOf, type Piece } from './pieces';
import { cardUnder } from './rims';

/**
 * A window that leaves the paper where it must be filled: over the panes of a split print, or on a mat
 * whose photo bleeds off the page. Elsewhere it is `print-smaller-than-photo`.
 */
export const windowOffPaper = defineCheck({
  id: 'window-off-paper',
  severity: 'stop',
  basis: { kind: 'common-practice' },
  needsFilledPages: false,
  thresholds: {},
  find: (view) =>
    piecesOf(view).flatMap((piece): Finding[] => {
      if (piece.placement.mode === 'whole' || !mustBeFilled(view, piece)) return [];
      const paper = paperOf(piece.print, piece.placement);
      if (piece.photos.every((photo) => contains(paper, photo.window))) return [];
      return [
        {
          messageId: piece.groupId === null ? 'bleed-off-paper' : 'pane-off-paper',
          data: { title: piece.print.title, missing: offPaper(piece.window, paper).missing },
          matIds: piece.matIds,
          remedies: () => [...slideOntoPaper(view, piece), ...otherRun(view, piece), ...lift(piece)],
        },
      ];
    }),
});

/** Panes must show picture up to their edges, and so must a photo that is trimmed off with the page. */
export function mustBeFilled({ doc, matById }: SpreadView, piece: Piece): boolean {
  if (piece.groupId !== null) return true;
  const mat = matById.get(piece.matIds[0]!);
  if (!mat || doc.format.edge !== 'bleed') return false;
  const grid = gridOf(doc.format);
  const onRim = mat.x === 0 || mat.y === 0 || mat.x + mat.w === grid.columns || mat.y + mat.h === grid.rows;
  return onRim && cardUnder(mat, doc.reveal) === null && mat.trueSize === null;
}

/** The window back on the paper, where the paper is large enough for it. */
export function slideOntoPaper({ trim }: SpreadView, piece: Piece): Remedy[] {
  const paper = paperOf(piece.print, piece.placement);
  if (piece.window.width > paper.width || piece.window.height > paper.height) return [];
  const at = slideWindow(piece.placement.x, piece.placement.y, piece.window, paper, trim.finestMark);
  return [{ messageId: 'slide-window', data: {}, call: { id: 'window.slide', args: { matId: piece.matIds[0]!, ...at } } }];
}

/** A split print run the other way: spread apart it needs less paper, run on behind it may miss a seam. */
export function otherRun({ doc }: SpreadView, piece: Piece): Remedy[] {
  const content = doc.panes.find((group) => group.id === piece.groupId)?.content;
  if (!content || piece.groupId === null) return [];
  const isApart = content.run === 'apart';
  return [
    {
      messageId: isApart ? 'run-behind' : 'spread-apart',
      data: {},
      call: { id: 'panes.setRun', args: { groupId: piece.groupId, run: isApart ? 'behind' : 'apart' } },
    },
  ];
}

export const lift = (piece: Pick<Piece, 'matIds'>): Remedy[] => [
  { messageId: 'back-to-table', data: {}, call: { id: 'prints.lift', args: { matIds: piece.matIds } } },
];
