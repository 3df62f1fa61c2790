import type { CheckExample } from './parts';
import { at, finished } from './whole-spread';

/** All that the finished spread has at its foot gone or moved up. */
export const centreOff: CheckExample = {
  wrong: finished({
    words: at('words', 14, 0, 8, 7),
    paper: at('paper', 14, 7, 8, 4),
    title: at('title', 0, 11, 22, 3),
    nora: null,
    ivo: null,
    tower: at('tower', 0, 0, 9, 11),
    stair: null,
    rightPaper: at('rightPaper', 9, 9, 13, 2),
  }),
  right: finished(),
};
