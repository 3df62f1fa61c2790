import type { CheckExample } from './parts';
import { at, finished } from './whole-spread';

/** Both upright prints trimmed to flat strips of themselves, or left upright. */
export const orientationsAlike: CheckExample = {
  wrong: finished({
    cove: at('cove', 8, 0, 14, 10),
    stair: at('stair', 0, 5, 8, 5),
    tower: at('tower', 0, 10, 9, 7),
    rightPaper: at('rightPaper', 9, 10, 13, 10),
  }),
  right: finished(),
};
