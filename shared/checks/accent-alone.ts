import type { Hex } from '../model/ids';
import type { Mat } from '../model/spread';
import { cardColors, idsOf, pagesOf } from './card-colors';
import { standOutFrom } from './card-choices';
import { defineCheck, type Finding, type Remedy, type SpreadView } from './check';
import { isNeutral, oklchOf } from './color-memo';

/** Card that covers more of all card than this is no accent. Common practice: accents are the 10 of 60/30/10. */
const ACCENT_SHARE = 0.2;
/** Without a scheme, the most vivid card is the accent from this OKLCH chroma on. Our own figure. */
const VIVID = 0.09;

/**
 * An accent used in fewer places than the eye needs to travel, or on one page only: the trade's visual triangle
 * wants three places. A place is a mat whose card, inner mat, lettering, pattern or embellishment has the
 * colour. The accent is the scheme's or, without one, the most vivid card of which there is little.
 */
export const accentAlone = defineCheck({
  id: 'accent-alone',
  severity: 'consider',
  basis: { kind: 'common-practice' },
  needsFilledPages: true,
  yieldsTo: ['color-in-no-photo', 'too-many-colors'],
  thresholds: { places: { default: 2, min: 2, max: 6, unit: 'count' } },
  find: (view, { places }): Finding[] => {
    const accent = accentOf(view);
    if (!accent) return [];
    const mats = view.doc.mats.filter((mat) => view.doc.pages[mat.page] && shows(mat, accent));
    if (mats.length === 0) return [];
    const isOnOnePage = view.doc.pages.left !== null && view.doc.pages.right !== null && pagesOf(mats).size === 1;
    if (mats.length >= places && !isOnOnePage) return [];
    return [
      {
        messageId: mats.length < places ? 'accent-few' : 'accent-one-page',
        data: { color: accent, places: mats.length },
        matIds: idsOf(mats),
        remedies: () => repeatOn(view, accent, mats),
      },
    ];
  },
});

function accentOf(view: SpreadView): Hex | null {
  const { scheme } = view.doc;
  if (scheme) return isNeutral(scheme.colors.accent.hex) ? null : scheme.colors.accent.hex;
  const colors = cardColors(view);
  const total = colors.reduce((sum, color) => sum + color.area, 0);
  const vivid = colors.filter(({ hex, area }) => oklchOf(hex)[1] >= VIVID && area <= ACCENT_SHARE * total);
  if (vivid.length === 0) return null;
  return vivid.reduce((a, b) => (oklchOf(b.hex)[1] > oklchOf(a.hex)[1] ? b : a)).hex;
}

function shows({ color, inner, content }: Mat, hex: Hex): boolean {
  if (color === hex || inner?.color === hex) return true;
  return ('color' in content && content.color === hex) || (content.kind === 'paper' && content.ground === hex);
}

/** The accent as card of the smallest mat from which its photo stands out, on the page that lacks it. */
function repeatOn(view: SpreadView, accent: Hex, used: readonly Mat[]): Remedy[] {
  const pages = pagesOf(used);
  const free = view.doc.mats.filter((mat) => view.doc.pages[mat.page] && !mat.focal && mat.content.kind === 'print' && !used.includes(mat));
  const wanted = [...free].sort((a, b) => Number(pages.has(a.page)) - Number(pages.has(b.page)) || a.w * a.h - b.w * b.h);
  const mat = wanted.find((candidate) => {
    const photo = view.photosByMat.get(candidate.id);
    return photo !== undefined && standOutFrom(view, [photo], accent);
  });
  if (!mat) return [];
  return [{ messageId: 'repeat-accent', data: { color: accent }, call: { id: 'mats.setColor', args: { matIds: [mat.id], color: accent } } }];
}
