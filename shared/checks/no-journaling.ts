import { defineCheck, type Finding } from './check';

/** No mat of the spread carries words: who, when, where. */
export const noJournaling = defineCheck({
  id: 'no-journaling',
  severity: 'consider',
  basis: { kind: 'common-practice' },
  needsFilledPages: true,
  thresholds: {},
  find: ({ doc }): Finding[] => {
    const hasWords = doc.mats.some(({ content }) => content.kind === 'journaling' && content.text.trim() !== '');
    return hasWords ? [] : [{ messageId: 'no-journaling', data: {}, matIds: [] }];
  },
});
