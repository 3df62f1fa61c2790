import { ciede2000 } from '../colour/ciede2000';
import { hexToLab } from '../colour/convert';
import { matRect } from '../geometry/grid';
import type { Hex, Side } from '../model/ids';
import type { Mat } from '../model/spread';
import { defineCheck, type Finding, type SpreadView } from './check';
import { motifsOf } from './motifs';

/** Card this near in CIEDE2000 is taken for the same colour. Common practice: what lies side by side looks alike. */
const SAME_COLOR = 3;

/**
 * Nothing is shared across the gutter: no kind of motif (split print, strip, pinwheel), no colour of card, no
 * patterned paper, no size of mat, the right way up or turned. One shared thing is enough. Mats of the page's
 * own colour share nothing by it.
 */
export const nothingShared = defineCheck({
  id: 'nothing-shared',
  severity: 'consider',
  basis: { kind: 'common-practice' },
  needsFilledPages: true,
  thresholds: {},
  find: (view): Finding[] => {
    if (!view.doc.pages.left || !view.doc.pages.right) return [];
    const isShared = sharesSize(view) || sharesMotif(view) || sharesPaper(view) || sharesColor(view);
    return isShared ? [] : [{ messageId: 'nothing-shared', data: {}, matIds: [], page: 'left' }];
  },
});

/** True where the two pages have one value in common. */
function meets<T>(of: (side: Side) => Iterable<T>): boolean {
  const left = new Set(of('left'));
  for (const value of of('right')) if (left.has(value)) return true;
  return false;
}

const matsOn = ({ doc }: SpreadView, side: Side): readonly Mat[] => doc.mats.filter((mat) => mat.page === side && !mat.laidOver);

function sharesSize(view: SpreadView): boolean {
  return meets((side) =>
    matsOn(view, side).map((mat) => {
      const { width, height } = matRect(view.doc.format, mat);
      return `${Math.min(width, height)} ${Math.max(width, height)}`;
    }),
  );
}

const sharesMotif = (view: SpreadView): boolean => meets((side) => motifsOf(view).flatMap((motif) => (motif.page === side ? [motif.kind] : [])));

function sharesPaper(view: SpreadView): boolean {
  return meets((side) =>
    view.doc.mats.flatMap(({ page, content }) => (page === side && content.kind === 'paper' ? [`${content.pattern} ${content.color} ${content.ground}`] : [])),
  );
}

function sharesColor(view: SpreadView): boolean {
  const colors = (side: Side): Hex[] => [
    ...new Set(view.doc.mats.flatMap((mat) => (mat.page === side && mat.color !== view.doc.pages[side]?.color ? [mat.color] : []))),
  ];
  if (meets(colors)) return true;
  const right = colors('right').map(hexToLab);
  return colors('left').some((hex) => {
    const lab = hexToLab(hex);
    return right.some((other) => ciede2000(lab, other) <= SAME_COLOR);
  });
}
