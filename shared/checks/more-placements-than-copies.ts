import { copiesFor, printUses, type PrintUse } from '../model/print-use';
import { defineCheck, type Finding, type SpreadView } from './check';

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
      const needed = copiesFor(view.doc, uses, view.trim.tolerance);
      if (needed + elsewhere <= print.copies) return [];
      return [
        {
          messageId: 'more-placements',
          data: { title: print.title, needed: needed + elsewhere, copies: print.copies, elsewhere },
          // The last one placed is the one too many.
          matIds: [...uses].reverse().flatMap(({ matIds }) => matIds),
          remedies: () => {
            const surplus = surplusOf(view, uses, print.copies - elsewhere).flatMap(({ matIds }) => matIds);
            return [{ messageId: 'back-to-table', data: {}, call: { id: 'prints.lift', args: { matIds: surplus } } }];
          },
        },
      ];
    }),
});

/** The last uses without which the copies suffice. */
function surplusOf({ doc, trim }: SpreadView, uses: readonly PrintUse[], copies: number): readonly PrintUse[] {
  for (let kept = uses.length - 1; kept > 0; kept -= 1) {
    if (copiesFor(doc, uses.slice(0, kept), trim.tolerance) <= copies) return uses.slice(kept);
  }
  return uses;
}
