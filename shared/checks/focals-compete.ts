import { defineCheck, type Finding } from './check';
import { weighedUnits } from './focals';

/** The focals of facing pages weigh about the same, so that the eye lands on neither first. Weight is `weighSpread`'s. */
export const focalsCompete = defineCheck({
  id: 'focals-compete',
  severity: 'consider',
  basis: { kind: 'common-practice' },
  needsFilledPages: true,
  yieldsTo: ['focals-same-place', 'focals-same-size'],
  thresholds: { likeness: { default: 0.9, min: 0.5, max: 1, unit: 'ratio' } },
  find: (view, { likeness }): Finding[] => {
    const [heavier, lighter] = weighedUnits(view)
      .filter(({ isFocal, page }) => isFocal && view.doc.pages[page])
      .sort((a, b) => b.weight - a.weight);
    if (!heavier || !lighter || lighter.weight < likeness * heavier.weight) return [];
    return [{ messageId: 'focals-compete', data: {}, matIds: [heavier.mat.id, lighter.mat.id] }];
  },
});
