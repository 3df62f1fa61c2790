import { defineCheck, type Finding } from './check';
import { sharedAcross } from './shared-across';

/**
 * Nothing is shared across the gutter: no kind of motif (split print, strip, pinwheel), no colour of card, no
 * patterned paper, no size of mat, the right way up or turned. One shared thing is enough.
 */
export const nothingShared = defineCheck({
  id: 'nothing-shared',
  severity: 'consider',
  basis: { kind: 'common-practice' },
  needsFilledPages: true,
  thresholds: { things: { default: 1, min: 1, max: 4, unit: 'count' } },
  find: (view, { things }): Finding[] => {
    if (!view.doc.pages.left || !view.doc.pages.right) return [];
    const kinds = new Set(sharedAcross(view).map(({ kind }) => kind));
    return kinds.size >= things ? [] : [{ messageId: 'nothing-shared', data: {}, matIds: [], page: 'left' }];
  },
});
