import { defineCheck, type Finding } from './check';
import { declaredFocals, picturesBySize } from './focals';

/**
 * No mat is declared as focal, and no picture is so much larger than the next that it acts as one. A split
 * print counts as one picture.
 */
export const noFocal = defineCheck({
  id: 'no-focal',
  severity: 'consider',
  basis: { kind: 'common-practice' },
  needsFilledPages: true,
  thresholds: { dominance: { default: 1.5, min: 1.1, max: 4, unit: 'ratio' } },
  find: (view, { dominance }): Finding[] => {
    if (declaredFocals(view).length > 0) return [];
    const [first, second] = picturesBySize(view);
    if (!first || (second ? first.area >= dominance * second.area : true)) return [];
    return [
      {
        messageId: 'no-focal',
        data: {},
        matIds: [first.mat.id],
        remedies: () => [{ messageId: 'make-focal', data: { matId: first.mat.id }, call: { id: 'mats.setFocal', args: { matId: first.mat.id, focal: true } } }],
      },
    ];
  },
});
