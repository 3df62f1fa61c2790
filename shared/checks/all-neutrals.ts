import { SIDES } from '../model/ids';
import { cardColors } from './card-colors';
import { defineCheck, type Finding } from './check';
import { isNeutral, oklchOf } from './color-memo';
import { photoHues } from './photo-hues';

/** Every card and page is a neutral though the photos have colour to give. Black and white photos ask for none. */
export const allNeutrals = defineCheck({
  id: 'all-neutrals',
  severity: 'consider',
  basis: { kind: 'common-practice' },
  needsFilledPages: true,
  offUnder: ['quiet'],
  thresholds: { chroma: { default: 0.03, min: 0.005, max: 0.1, unit: 'ratio' } },
  find: (view, { chroma }): Finding[] => {
    const colors = cardColors(view);
    const isGrey = (hex: string): boolean => oklchOf(hex)[1] < chroma;
    const pagesAreGrey = SIDES.every((side) => isGrey(view.doc.pages[side]?.color ?? '#ffffff'));
    const hasPattern = view.doc.mats.some(({ content }) => content.kind === 'paper' && !(isNeutral(content.color) && isNeutral(content.ground)));
    if (colors.length === 0 || hasPattern || !pagesAreGrey || !colors.every(({ hex }) => isGrey(hex)) || photoHues(view).length === 0) return [];
    return [{ messageId: 'all-neutrals', data: {}, matIds: [] }];
  },
});
