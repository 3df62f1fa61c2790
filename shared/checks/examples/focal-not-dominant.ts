import type { CheckExample } from './parts';
import { but, finished } from './whole-spread';

export const focalNotDominant: CheckExample = {
  wrong: finished({ headland: but('headland', { focal: false }), nora: but('nora', { focal: true }) }),
  right: finished(),
};
