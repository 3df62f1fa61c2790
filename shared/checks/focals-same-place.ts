import { centre } from '../geometry/rects';
import { defineCheck, type Finding } from './check';
import { declaredFocals } from './focals';

/** Two focals at the same place of facing pages, measured between their centres in steps of the grid, each way. */
export const focalsSamePlace = defineCheck({
  id: 'focals-same-place',
  severity: 'consider',
  basis: { kind: 'common-practice' },
  needsFilledPages: true,
  thresholds: { distance: { default: 2, min: 0, max: 8, unit: 'steps' } },
  find: (view, { distance }): Finding[] => {
    const [left, right] = declaredFocals(view);
    if (!left || !right) return [];
    const a = centre(left.rect);
    const b = centre(right.rect);
    const limit = distance * view.doc.format.step;
    if (Math.abs(a.x - b.x) > limit || Math.abs(a.y - b.y) > limit) return [];
    return [{ messageId: 'focals-same-place', data: {}, matIds: [left.mat.id, right.mat.id] }];
  },
});
