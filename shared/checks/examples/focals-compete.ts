import type { CheckExample } from './parts';
import { at, finished } from './whole-spread';

/** A flat focal on the left page and an upright one on the right: nearly of one weight, or the left one clearly the heavier. */
export const focalsCompete: CheckExample = {
  wrong: finished({
    headland: at('headland', 0, 0, 13, 10),
    words: at('words', 13, 0, 9, 11),
    tower: at('tower', 12, 8, 10, 14, { focal: true }),
    cove: at('cove', 9, 0, 13, 8),
    stair: at('stair', 2, 0, 7, 11),
    rightPaper: at('rightPaper', 6, 11, 6, 11),
  }),
  right: finished({
    tower: at('tower', 13, 9, 9, 13, { focal: true }),
    cove: at('cove', 9, 0, 13, 9),
    stair: at('stair', 2, 0, 7, 11),
    rightPaper: at('rightPaper', 7, 11, 6, 11),
  }),
};
