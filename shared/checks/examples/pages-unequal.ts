import { CARD, type CheckExample } from './parts';
import { WORDS, but, finished } from './whole-spread';

const PALE = '#f6f0e2';

export const pagesUnequal: CheckExample = {
  wrong: finished({
    tower: but('tower', { content: WORDS, color: PALE }),
    cove: but('cove', { color: PALE, content: { kind: 'paper', pattern: 'dot', color: CARD.page, ground: '#ffffff' } }),
    stair: but('stair', { color: PALE, content: { kind: 'paper', pattern: 'stripe', color: CARD.page, ground: '#ffffff' } }),
  }),
  right: finished(),
};
