import { CARD, type CheckExample } from './parts';
import { but, finished } from './whole-spread';

export const noJournaling: CheckExample = {
  wrong: finished({ words: but('words', { content: { kind: 'paper', pattern: 'dot', color: CARD.main, ground: CARD.second } }) }),
  right: finished(),
};
