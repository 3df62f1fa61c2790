import type { PrintId } from '../model/ids';
import { defineCheck, type Finding } from './check';
import { copiesNeeded, type CopyUse } from './copies';
import { piecesOf, type Piece } from './pieces';

/**
 * More placements of a print than copies of it, the studio's other live spreads included. How placements
 * share a copy is `copiesNeeded`'s rule. Digital photos are not printed yet, and are never short.
 */
export const morePlacementsThanCopies = defineCheck({
  id: 'more-placements-than-copies',
  severity: 'stop',
  basis: { kind: 'common-practice' },
  needsFilledPages: false,
  thresholds: {},
  find: (view) => {
    const byPrint = new Map<PrintId, Piece[]>();
    for (const piece of piecesOf(view)) {
      const others = byPrint.get(piece.print.id);
      if (others) others.push(piece);
      else byPrint.set(piece.print.id, [piece]);
    }
    return [...byPrint.values()].flatMap((pieces): Finding[] => {
      const { print } = pieces[0]!;
      const elsewhere = view.usedElsewhere[print.id] ?? 0;
      // Never fewer copies are needed than 1, nor more than there are placements.
      if (print.marks.digital || pieces.length + elsewhere <= print.copies) return [];
      const needed = copiesNeeded(pieces.map(useOf), view.trim.tolerance);
      if (needed + elsewhere <= print.copies) return [];
      return [
        {
          messageId: 'more-placements',
          data: { title: print.title, needed: needed + elsewhere, copies: print.copies, elsewhere },
          // The last one placed is the one too many.
          matIds: [...pieces].reverse().flatMap((piece) => piece.matIds),
          remedies: () => {
            const surplus = surplusOf(pieces, print.copies - elsewhere, view.trim.tolerance).flatMap((piece) => piece.matIds);
            return [{ messageId: 'back-to-table', data: {}, call: { id: 'prints.lift', args: { matIds: surplus } } }];
          },
        },
      ];
    });
  },
});

const useOf = (piece: Piece): CopyUse =>
  piece.groupId !== null || piece.placement.mode === 'whole' ? { kind: 'all' } : { kind: 'piece', window: piece.window };

/** The last pieces without which the copies suffice. */
function surplusOf(pieces: readonly Piece[], copies: number, tolerance: number): readonly Piece[] {
  for (let kept = pieces.length - 1; kept > 0; kept -= 1) {
    if (copiesNeeded(pieces.slice(0, kept).map(useOf), tolerance) <= copies) return pieces.slice(kept);
  }
  return pieces;
}
