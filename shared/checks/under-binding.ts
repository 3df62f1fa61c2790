import { matRect } from '../geometry/grid';
import { right } from '../geometry/rects';
import { defineCheck, type Finding } from './check';

/** A mat that reaches into the strip along the gutter that the album's binding hides. */
export const underBinding = defineCheck({
  id: 'under-binding',
  severity: 'fix',
  basis: { kind: 'common-practice' },
  needsFilledPages: false,
  thresholds: {},
  find: ({ doc }) =>
    doc.mats.flatMap((mat): Finding[] => {
      const hiddenEdge = doc.binding.hiddenEdge[mat.page];
      if (hiddenEdge === 0) return [];
      const rect = matRect(doc.format, mat);
      const hidden = mat.page === 'left' ? right(rect) - (doc.format.width - hiddenEdge) : hiddenEdge - rect.x;
      return hidden > 0 ? [{ messageId: 'under-binding', data: { hidden: Math.min(hidden, rect.width) }, matIds: [mat.id] }] : [];
    }),
});
