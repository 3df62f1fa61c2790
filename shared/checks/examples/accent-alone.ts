import { CARD, type CheckExample } from './parts';
import { but, finished } from './whole-spread';

/** The right page's patterned paper in the spread's other colours. */
export const accentAlone: CheckExample = {
  wrong: finished({ rightPaper: but('rightPaper', { color: CARD.second, content: { kind: 'paper', pattern: 'stripe', color: CARD.main, ground: CARD.page } }) }),
  right: finished(),
};
