import type { CheckExample } from './parts';
import { at, finished } from './whole-spread';

/** All that the finished spread has at its foot gone or moved up. */
export const centreOff: CheckExample = {
  wrong: finished({
    words: at('words', 14, 0, 8, 7),
    title: at('title', 14, 7, 8, 4),
    nora: null,
    ivo: null,
    paper: null,
    tower: at('tower', 0, 0, 9, 11),
    stair: null,
    rightPaper: at('rightPaper', 9, 9, 13, 2),
  }),
  right: finished(),
};
