import { canSeparate } from '../geometry/separable';
import { defineCheck, type Finding } from './check';
import { piecesOf } from './pieces';
import { lift, otherRun } from './window-off-paper';

/** A split print whose panes no cuts from edge to edge can part, as of a pinwheel: a trimmer cannot make them out of one print. */
export const panesInseparable = defineCheck({
  id: 'panes-inseparable',
  severity: 'stop',
  basis: { kind: 'common-practice' },
  needsFilledPages: false,
  yieldsTo: ['never-cut', 'window-off-paper'],
  thresholds: {},
  find: (view) =>
    piecesOf(view).flatMap((piece): Finding[] => {
      // A digital photo is printed pane by pane.
      if (piece.groupId === null || piece.print.marks.digital || canSeparate(piece.photos.map((photo) => photo.window))) return [];
      return [
        {
          messageId: 'panes-inseparable',
          data: { title: piece.print.title },
          matIds: piece.matIds,
          remedies: () => [...otherRun(view, piece), ...lift(piece)],
        },
      ];
    }),
});
