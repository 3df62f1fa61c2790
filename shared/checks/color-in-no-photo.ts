import type { Hex } from '../model/ids';
import { cardColors, idsOf } from './card-colors';
import { recolor, schemeColors } from './card-choices';
import { defineCheck, type Finding, type SpreadView } from './check';
import { hueDistance, isNeutral, oklchOf } from './color-memo';
import { photoHues } from './photo-hues';
import { piecesOf } from './pieces';

/**
 * Coloured card whose hue is found in no photo of the spread: further than `hue` degrees from every coloured
 * swatch of the placed prints, in OKLCH. Tone and vividness do not count, since card of a photo's colour is
 * seldom of its tone. Neutrals go with everything; black and white photos say nothing about hue.
 */
export const colorInNoPhoto = defineCheck({
  id: 'color-in-no-photo',
  severity: 'consider',
  basis: { kind: 'common-practice' },
  needsFilledPages: true,
  offUnder: ['lift'],
  thresholds: { hue: { default: 30, min: 10, max: 90, unit: 'degrees' } },
  find: (view, { hue }): Finding[] => {
    const hues = photoHues(view);
    if (hues.length === 0) return [];
    const isFound = (hex: Hex): boolean => isNeutral(hex) || comesFromPlacedPrint(view, hex) || hues.some((other) => hueDistance(other, oklchOf(hex)[2]) <= hue);
    return cardColors(view).flatMap(({ hex, mats }): Finding[] => {
      if (isFound(hex)) return [];
      const own = mats.filter((mat) => mat.color === hex);
      return [
        {
          messageId: 'color-in-no-photo',
          data: { color: hex },
          matIds: idsOf(mats),
          remedies: () => (own.length < mats.length ? [] : recolor(view, own, [...schemeColors(view), ...cardColors(view).map((card) => card.hex)].filter(isFound))),
        },
      ];
    });
  },
});

/** A scheme's colour says which prints it was taken from. */
function comesFromPlacedPrint(view: SpreadView, hex: Hex): boolean {
  const { scheme } = view.doc;
  const sources = scheme ? Object.values(scheme.colors).flatMap((color) => (color.hex === hex ? color.printIds : [])) : [];
  return sources.length > 0 && piecesOf(view).some(({ print }) => sources.includes(print.id));
}
