import { isUncut, paperOf } from '../geometry/keep-zone';
import { wholeReason } from '../model/must-stay-whole';
import type { Print } from '../model/print';
import { defineCheck, type Finding, type Message } from './check';
import { mountWhole } from './keep-zone-remedies';
import { piecesOf } from './pieces';
import { lift } from './window-off-paper';

/**
 * A print that must not be cut (`wholeReason`), about to be trimmed or split. Whole it is welcome.
 */
export const neverCut = defineCheck({
  id: 'never-cut',
  severity: 'stop',
  basis: { kind: 'common-practice' },
  needsFilledPages: false,
  thresholds: {},
  find: (view) =>
    piecesOf(view).flatMap((piece): Finding[] => {
      const message = spoiledByCut(piece.print);
      const isWhole = piece.groupId === null && (piece.placement.mode === 'whole' || isUncut(piece.window, paperOf(piece.print, piece.placement)));
      if (!message || isWhole) return [];
      return [{ ...message, matIds: piece.matIds, remedies: () => [...mountWhole(view, piece), ...lift(piece)] }];
    }),
});

function spoiledByCut(print: Print): Message | null {
  const { title } = print;
  switch (wholeReason(print)) {
    case 'instant-film':
      return { messageId: 'instant-film-cut', data: { title } };
    case 'one-of-a-kind':
      return { messageId: 'one-of-a-kind-cut', data: { title } };
    case 'borrowed':
      return { messageId: 'borrowed-cut', data: { title, until: print.marks.borrowedUntil ?? '' } };
    case null:
      return null;
  }
}
