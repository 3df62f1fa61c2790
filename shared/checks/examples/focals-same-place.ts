import type { CheckExample } from './parts';
import { at, finished } from './whole-spread';

/** The right page's second focal, at the left focal's place or at the other end of its page. */
export const focalsSamePlace: CheckExample = {
  wrong: finished({ cove: at('cove', 0, 0, 13, 9, { focal: true }), tower: at('tower', 13, 0, 9, 13), stair: at('stair', 0, 9, 7, 11), rightPaper: at('rightPaper', 7, 9, 6, 11) }),
  right: finished({ cove: at('cove', 9, 0, 13, 9, { focal: true }) }),
};
