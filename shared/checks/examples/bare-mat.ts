import type { CheckExample } from './parts';
import { but, finished } from './whole-spread';

export const bareMat: CheckExample = { wrong: finished({ stair: but('stair', { content: { kind: 'bare' } }) }), right: finished() };
