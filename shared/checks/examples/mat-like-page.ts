import { CARD, type CheckExample } from './parts';
import { but, finished } from './whole-spread';

export const matLikePage: CheckExample = { wrong: finished({ cove: but('cove', { color: CARD.page }) }), right: finished() };
