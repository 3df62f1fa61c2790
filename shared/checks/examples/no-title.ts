import { CARD, type CheckExample } from './parts';
import { but, finished } from './whole-spread';

export const noTitle: CheckExample = {
  wrong: finished({ title: but('title', { content: { kind: 'paper', pattern: 'stripe', color: CARD.accent, ground: CARD.page } }) }),
  right: finished(),
};
