import type { Mat } from '../../model/spread';
import { CARD, type CheckExample } from './parts';
import { at, but, finished } from './whole-spread';

/** The right page in card and paper of its own. */
const OTHER: Partial<Mat> = { color: '#7d3f4f' };

export const nothingShared: CheckExample = {
  wrong: finished({
    paper: but('paper', { color: CARD.second, content: { kind: 'paper', pattern: 'stripe', color: CARD.ink, ground: CARD.page } }),
    tower: but('tower', OTHER),
    cove: but('cove', OTHER),
    stair: but('stair', OTHER),
    rightPaper: at('rightPaper', 16, 9, 6, 11, { color: '#e7c4b4', content: { kind: 'paper', pattern: 'dot', color: '#7d3f4f', ground: '#f3e3da' } }),
  }),
  right: finished(),
};
