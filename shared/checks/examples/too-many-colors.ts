import type { CheckExample } from './parts';
import { but, finished } from './whole-spread';

const BRICK = '#a8553f';
const OLIVE = '#6b6a34';
const BLUE = '#3f7aa0';

/** Each taken from a photo, and three more than the finished spread has. */
export const tooManyColors: CheckExample = {
  wrong: finished({ nora: but('nora', { color: BRICK }), cove: but('cove', { color: BLUE }), stair: but('stair', { color: OLIVE }) }),
  right: finished(),
};
