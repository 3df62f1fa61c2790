import { ciede2000 } from '../colour/ciede2000';
import { cardColors, idsOf, type CardColor } from './card-colors';
import { recolor, schemeColors } from './card-choices';
import { defineCheck, type Finding } from './check';
import { isNeutral, labOf } from './color-memo';

/** Card this near in CIEDE2000 is taken for the same colour. Common practice: what lies side by side looks alike. */
const SAME_COLOR = 3;

/**
 * More different colours of card than hold together. Neutrals and pages do not count, and near shades count as
 * one. Speaks of the colour of which there is least.
 */
export const tooManyColors = defineCheck({
  id: 'too-many-colors',
  severity: 'consider',
  basis: { kind: 'common-practice' },
  needsFilledPages: true,
  thresholds: { colors: { default: 4, min: 1, max: 12, unit: 'count' } },
  find: (view, { colors: most }): Finding[] => {
    const coloured = cardColors(view).filter(({ hex }) => !isNeutral(hex));
    if (coloured.length <= most) return [];
    const groups = groupAlike(coloured);
    if (groups.length <= most) return [];
    const sizes = groups.map((group) => ({ group, area: group.reduce((sum, color) => sum + color.area, 0) }));
    const least = sizes.reduce((a, b) => (b.area < a.area ? b : a)).group;
    const mats = [...new Set(least.flatMap((color) => color.mats))];
    const isWholeCard = mats.every((mat) => least.some(({ hex }) => hex === mat.color));
    const kept = groups.filter((group) => group !== least).map((group) => group[0]!.hex);
    const lab = labOf(least[0]!.hex);
    const nearest = [...kept].sort((a, b) => ciede2000(lab, labOf(a)) - ciede2000(lab, labOf(b)));
    return [
      {
        messageId: 'too-many-colors',
        data: { count: groups.length, most, color: least[0]!.hex },
        matIds: idsOf(mats),
        remedies: () => (isWholeCard ? recolor(view, mats, [...schemeColors(view).filter((hex) => kept.includes(hex)), ...nearest]) : []),
      },
    ];
  },
});

/** Each colour joins the first group whose first member it looks like; the most used come first, so that they name the groups. */
function groupAlike(colors: readonly CardColor[]): CardColor[][] {
  const groups: CardColor[][] = [];
  for (const color of [...colors].sort((a, b) => b.area - a.area || (a.hex < b.hex ? -1 : 1))) {
    const lab = labOf(color.hex);
    const group = groups.find(([first]) => ciede2000(labOf(first!.hex), lab) <= SAME_COLOR);
    if (group) group.push(color);
    else groups.push([color]);
  }
  return groups;
}
