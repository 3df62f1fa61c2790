import { inches } from '../model/length';
import { defineCheck, type Finding } from './check';
import { declaredFocals } from './focals';

/** Two focals of the same shape and size: neither leads. One turned on its side is another shape. */
export const focalsSameSize = defineCheck({
  id: 'focals-same-size',
  severity: 'consider',
  basis: { kind: 'common-practice' },
  needsFilledPages: true,
  thresholds: { difference: { default: inches(1 / 4), min: 0, max: inches(2), unit: 'length' } },
  find: (view, { difference }): Finding[] => {
    const [left, right] = declaredFocals(view);
    if (!left || !right) return [];
    const isAlike =
      Math.abs(left.rect.width - right.rect.width) <= difference && Math.abs(left.rect.height - right.rect.height) <= difference;
    if (!isAlike) return [];
    const { width, height } = left.rect;
    return [{ messageId: 'focals-same-size', data: { width, height }, matIds: [left.mat.id, right.mat.id] }];
  },
});
