import { defineCheck, type Finding } from './check';

/** No mat of the spread carries lettering. */
export const noTitle = defineCheck({
  id: 'no-title',
  severity: 'consider',
  basis: { kind: 'common-practice' },
  needsFilledPages: true,
  thresholds: {},
  find: ({ doc }): Finding[] => {
    const hasTitle = doc.mats.some(({ content }) => content.kind === 'lettering' && content.text.trim() !== '');
    return hasTitle ? [] : [{ messageId: 'no-title', data: {}, matIds: [] }];
  },
});
