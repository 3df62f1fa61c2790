import type { CheckExample } from './parts';
import { at, finished } from './whole-spread';

export const focalsSameSize: CheckExample = {
  wrong: finished({ headland: at('headland', 0, 0, 13, 9), cove: at('cove', 9, 0, 13, 9, { focal: true }) }),
  right: finished({ cove: at('cove', 9, 0, 13, 9, { focal: true }) }),
};
