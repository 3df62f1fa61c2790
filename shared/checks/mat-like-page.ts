import { ciede2000 } from '../colour/ciede2000';
import { hexToLab } from '../colour/convert';
import { revealOf } from '../geometry/grid';
import { defineCheck, type Finding } from './check';

/** Card this near to the page in CIEDE2000 is not seen as card. Common practice. */
const UNSEEN = 3;

/** A mat the colour of the page, which shows nothing but its content: that could lie on the page itself. */
export const matLikePage = defineCheck({
  id: 'mat-like-page',
  severity: 'consider',
  basis: { kind: 'common-practice' },
  needsFilledPages: true,
  thresholds: { difference: { default: UNSEEN, min: 0, max: 12, unit: 'points' } },
  find: ({ doc }, { difference }): Finding[] => {
    const alike = new Map<string, boolean>();
    const mats = doc.mats.filter((mat) => {
      const page = doc.pages[mat.page];
      const kind = mat.content.kind;
      // Lettering and journaling on the page's colour are meant to look written on the page.
      if (!page || kind === 'lettering' || kind === 'journaling' || revealOf(mat, doc.reveal) === 0) return false;
      const pair = `${mat.color} ${page.color}`;
      let isAlike = alike.get(pair);
      if (isAlike === undefined) alike.set(pair, (isAlike = mat.color === page.color || ciede2000(hexToLab(mat.color), hexToLab(page.color)) <= difference));
      return isAlike;
    });
    const [first] = mats;
    return first ? [{ messageId: 'mat-like-page', data: { color: first.color }, matIds: mats.map((mat) => mat.id) }] : [];
  },
});
