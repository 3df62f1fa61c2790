import { contains } from '../geometry/rects';
import { turnedSize } from '../geometry/paper';
import { defineCheck, type Finding } from './check';
import { mountWhole } from './keep-zone-remedies';
import { paperOf } from '../geometry/keep-zone';
import { offPaper } from './off-paper';
import { piecesOf } from './pieces';
import { shrinkMat } from './resize-mat';
import { mustBeFilled, slideOntoPaper } from './window-off-paper';

/** A window that reaches past its print where the mat may show instead: the window is slid back, the print mounted whole, or the mat made smaller. */
export const printSmallerThanPhoto = defineCheck({
  id: 'print-smaller-than-photo',
  severity: 'fix',
  basis: { kind: 'common-practice' },
  needsFilledPages: false,
  thresholds: {},
  find: (view) =>
    piecesOf(view).flatMap((piece): Finding[] => {
      const { placement, print, window } = piece;
      if (placement.mode === 'whole' || mustBeFilled(view, piece)) return [];
      const paper = paperOf(print, placement);
      if (contains(paper, window)) return [];
      const onPage = turnedSize(paper, placement.turn);
      const photo = turnedSize(window, placement.turn);
      const isWide = (offPaper(window, paper).axis === 'wide') === (placement.turn % 2 === 0);
      const [shown, wanted] = isWide ? [onPage.width, photo.width] : [onPage.height, photo.height];
      return [
        {
          messageId: 'print-smaller',
          data: { title: print.title, print: shown, photo: wanted, axis: isWide ? 'wide' : 'high' },
          matIds: piece.matIds,
          remedies: () => {
            const mat = view.matById.get(piece.matIds[0]!);
            const excess = { width: Math.max(0, photo.width - onPage.width), height: Math.max(0, photo.height - onPage.height) };
            return [...slideOntoPaper(view, piece), ...mountWhole(view, piece), ...(mat ? shrinkMat(view, mat, excess) : [])];
          },
        },
      ];
    }),
});
