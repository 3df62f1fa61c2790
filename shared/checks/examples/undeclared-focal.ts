import { CARD, type CheckExample, type ExampleSpread } from './parts';
import { WORDS, at, finished } from './whole-spread';

const beside = (words: Parameters<typeof at>[5]): ExampleSpread =>
  finished({
    headland: at('headland', 0, 2, 13, 9),
    words: at('words', 13, 1, 9, 10, words),
    tower: at('tower', 0, 0, 9, 14),
    stair: at('stair', 9, 9, 7, 12),
    rightPaper: at('rightPaper', 16, 9, 6, 13),
  });

/** The words beside the focal, on dark card or on light. */
export const undeclaredFocal: CheckExample = {
  wrong: beside({ color: CARD.main, content: { ...WORDS, color: CARD.page } }),
  right: beside({ color: CARD.second }),
};
