import type { SpreadDocument } from '../model/spread';
import { defineCheck, type Finding } from './check';
import { weighSpread, type SpreadWeights } from './weight';

/**
 * Greatest difference of the pages' shares of 100 that is not noted: 41 against 59. The marks at the ends of
 * the balance beam stand there. Common practice, our own figure.
 */
export const BALANCE_LIMIT = 18;

/** True where two pages' shares of the weight differ by more than the limit. A single page has nothing to balance. */
export const isUneven = ({ pages }: SpreadDocument, { left, right }: SpreadWeights, limit: number = BALANCE_LIMIT): boolean =>
  pages.left !== null && pages.right !== null && Math.abs(left - right) > limit;

/** The two pages' visual weights (`weighSpread`) differ by more than the limit. */
export const pagesUnequal = defineCheck({
  id: 'pages-unequal',
  severity: 'consider',
  basis: { kind: 'common-practice' },
  needsFilledPages: true,
  thresholds: { difference: { default: BALANCE_LIMIT, min: 4, max: 80, unit: 'points' } },
  find: (view, { difference }): Finding[] => {
    const weights = weighSpread(view);
    if (!isUneven(view.doc, weights, difference)) return [];
    const { left, right, mats } = weights;
    const heavy = left > right ? 'left' : 'right';
    const onHeavy = view.doc.mats.filter((mat) => mat.page === heavy);
    const heaviest = onHeavy.reduce((a, b) => ((mats.get(b.id) ?? 0) > (mats.get(a.id) ?? 0) ? b : a));
    return [{ messageId: 'pages-unequal', data: { left, right, heavy }, matIds: [heaviest.id], page: heavy }];
  },
});
