import type { CheckExample } from './parts';
import { at, finished } from './whole-spread';

export const noFocal: CheckExample = {
  wrong: finished({ headland: at('headland', 0, 0, 12, 9, { focal: false }), words: at('words', 12, 0, 10, 11) }),
  right: finished(),
};
