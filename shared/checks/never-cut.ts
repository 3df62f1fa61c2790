import type { Print } from '../model/print';
import { defineCheck, type Finding, type Message } from './check';
import { mountWhole } from './keep-zone-remedies';
import { isUncut, paperOf } from './keep-zones';
import { piecesOf } from './pieces';
import { lift } from './window-off-paper';

/**
 * A print that must not be cut, about to be trimmed or split: instant film (its pack holds caustic paste),
 * the only print there is, or one that must go back. Whole it is welcome. A digital photo is never cut
 * before it is printed.
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
      const isWhole = piece.groupId === null && (piece.placement.mode === 'whole' || isUncut(piece, paperOf(piece.print, piece.placement)));
      if (!message || isWhole) return [];
      return [{ ...message, matIds: piece.matIds, remedies: () => [...mountWhole(view, piece), ...lift(piece)] }];
    }),
});

function spoiledByCut({ title, marks }: Print): Message | null {
  if (marks.digital) return null;
  if (marks.instantFilm) return { messageId: 'instant-film-cut', data: { title } };
  if (marks.oneOfAKind) return { messageId: 'one-of-a-kind-cut', data: { title } };
  return marks.borrowedUntil === null ? null : { messageId: 'borrowed-cut', data: { title, until: marks.borrowedUntil } };
}
