import { turnedSize } from '../geometry/paper';
import { defineCheck, type Finding, type Remedy } from './check';
import { cardOf } from './keep-zone-remedies';
import { paperOf } from '../geometry/keep-zone';
import { growMat } from './resize-mat';
import { piecesOf } from './pieces';
import { lift } from './window-off-paper';

/** A print mounted whole that is larger than the card under it, so that it lies on its neighbours or hangs off the page. */
export const wholeOverhangs = defineCheck({
  id: 'whole-overhangs',
  severity: 'fix',
  basis: { kind: 'common-practice' },
  needsFilledPages: false,
  thresholds: {},
  find: (view) =>
    piecesOf(view).flatMap((piece): Finding[] => {
      const mat = view.matById.get(piece.matIds[0]!);
      if (!mat || piece.placement.mode !== 'whole') return [];
      const paper = turnedSize(paperOf(piece.print, piece.placement), piece.placement.turn);
      const card = cardOf(view, mat);
      const width = paper.width - card.width;
      const height = paper.height - card.height;
      if (width <= 0 && height <= 0) return [];
      return [
        {
          messageId: 'whole-overhangs',
          data: { title: piece.print.title, over: Math.max(width, height) },
          matIds: piece.matIds,
          remedies: (): Remedy[] => [
            ...growMat(view, mat, { width: Math.max(0, width), height: Math.max(0, height) }),
            { messageId: 'trim-to-mat', data: {}, call: { id: 'placement.setWhole', args: { matId: mat.id, whole: false } } },
            ...lift(piece),
          ],
        },
      ];
    }),
});
