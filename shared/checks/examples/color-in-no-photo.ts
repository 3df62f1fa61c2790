import type { CheckExample } from './parts';
import { but, finished } from './whole-spread';

const VIOLET = '#7d4a8c';

export const colorInNoPhoto: CheckExample = {
  wrong: finished({ stair: but('stair', { color: VIOLET }) }),
  right: finished(),
};
