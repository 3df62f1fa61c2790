import { copiesNeeded } from '../geometry/copies';
import { printUses, type PrintUse } from '../model/print-use';
import { defineCheck, type Finding } from './check';

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
  find: (view) =>
    [...printUses(view.doc)].flatMap(([id, uses]): Finding[] => {
      const print = view.prints.get(id);
      const elsewhere = view.usedElsewhere[id] ?? 0;
      // Never fewer copies are needed than 1, nor more than there are placements.
      if (!print || print.marks.digital || uses.length === 0 || uses.length + elsewhere <= print.copies) return [];
      const needed = copiesFor(uses, view.trim.tolerance);
      if (needed + elsewhere <= print.copies) return [];
      return [
        {
          messageId: 'more-placements',
          data: { title: print.title, needed: needed + elsewhere, copies: print.copies, elsewhere },
          // The last one placed is the one too many.
          matIds: [...uses].reverse().flatMap(({ matIds }) => matIds),
          remedies: () => {
            const surplus = surplusOf(uses, print.copies - elsewhere, view.trim.tolerance).flatMap(({ matIds }) => matIds);
            return [{ messageId: 'back-to-table', data: {}, call: { id: 'prints.lift', args: { matIds: surplus } } }];
          },
        },
      ];
    }),
});

const copiesFor = (uses: readonly PrintUse[], tolerance: number): number => copiesNeeded(uses.map(({ asked }) => asked), tolerance);

/** The last uses without which the copies suffice. */
function surplusOf(uses: readonly PrintUse[], copies: number, tolerance: number): readonly PrintUse[] {
  for (let kept = uses.length - 1; kept > 0; kept -= 1) {
    if (copiesFor(uses.slice(0, kept), tolerance) <= copies) return uses.slice(kept);
  }
  return uses;
}
