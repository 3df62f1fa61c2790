import { ciede2000 } from '../colour/ciede2000';
import { matRect } from '../geometry/grid';
import { SIDES, type Hex, type MatId, type Side } from '../model/ids';
import type { Mat } from '../model/spread';
import type { SpreadView } from './check';
import { labOf } from './color-memo';
import type { MotifKind } from './messages';
import { footprint, motifsOf } from './motifs';

export type SharedKind = MotifKind | 'size' | 'paper' | 'color';

/**
 * What two facing pages have in common. `related`: it stands elsewhere, turned or in another size, and ties the
 * pages together. `copied`: a figure of three mats or more stands in the very same shape and place.
 */
export interface SharedThing {
  readonly kind: SharedKind;
  readonly relation: 'related' | 'copied';
  /** The mats of a figure, left page first; empty for what is not a figure. */
  readonly matIds: readonly MatId[];
}

/** Card this near in CIEDE2000 is taken for the same colour. Common practice: what lies side by side looks alike. */
const SAME_COLOR = 3;
/** Fewer mats that lie alike are no arrangement. Common practice. */
const ARRANGEMENT = 3;

const known = new WeakMap<SpreadView, readonly SharedThing[]>();

/**
 * Everything shared across the gutter: kinds of motif (split print, strip, pinwheel), the whole arrangement,
 * sizes of mat the right way up or turned, patterned papers, colours of card that are not the page's. Where the
 * whole arrangement is copied, its figures are not told one by one.
 */
export function sharedAcross(view: SpreadView): readonly SharedThing[] {
  let things = known.get(view);
  if (!things) known.set(view, (things = findShared(view)));
  return things;
}

function findShared(view: SpreadView): SharedThing[] {
  if (!view.doc.pages.left || !view.doc.pages.right) return [];
  const figures = motifs(view);
  const arrangement = copiedArrangement(view);
  // One figure that is all of both pages is called by its own name.
  const isOneFigure = figures.some(({ relation, matIds }) => relation === 'copied' && matIds.length === arrangement?.matIds.length);
  return [
    ...(arrangement && !isOneFigure ? [arrangement] : figures),
    ...related('size', sharesSize(view)),
    ...related('paper', sharesPaper(view)),
    ...related('color', sharesColor(view)),
  ];
}

const related = (kind: SharedKind, isShared: boolean): SharedThing[] => (isShared ? [{ kind, relation: 'related', matIds: [] }] : []);

const matsOn = ({ doc }: SpreadView, side: Side): readonly Mat[] => doc.mats.filter((mat) => mat.page === side && !mat.laidOver);

/** Every mat of one page has its twin at the same place of the other. */
function copiedArrangement(view: SpreadView): SharedThing | null {
  const [left, right] = SIDES.map((side) => matsOn(view, side));
  if (!left || !right || left.length < ARRANGEMENT || left.length !== right.length) return null;
  const places = new Set(left.map(({ x, y, w, h }) => `${x} ${y} ${w} ${h}`));
  if (!right.every(({ x, y, w, h }) => places.has(`${x} ${y} ${w} ${h}`))) return null;
  return { kind: 'arrangement', relation: 'copied', matIds: [...left, ...right].map((mat) => mat.id) };
}

function motifs(view: SpreadView): SharedThing[] {
  const all = motifsOf(view);
  const left = new Map(all.flatMap((motif) => (motif.page === 'left' ? [[`${motif.kind} ${footprint(motif)}`, motif] as const] : [])));
  const onLeft = new Set([...left.values()].map(({ kind }) => kind));
  return all.flatMap((motif): SharedThing[] => {
    if (motif.page !== 'right' || !onLeft.has(motif.kind)) return [];
    const twin = left.get(`${motif.kind} ${footprint(motif)}`);
    if (!twin) return [{ kind: motif.kind, relation: 'related', matIds: motif.mats.map((mat) => mat.id) }];
    return [{ kind: motif.kind, relation: 'copied', matIds: [...twin.mats, ...motif.mats].map((mat) => mat.id) }];
  });
}

/** True where the two pages have one value in common. */
function meets<T>(of: (side: Side) => Iterable<T>): boolean {
  const left = new Set(of('left'));
  for (const value of of('right')) if (left.has(value)) return true;
  return false;
}

function sharesSize(view: SpreadView): boolean {
  return meets((side) =>
    matsOn(view, side).map((mat) => {
      const { width, height } = matRect(view.doc.format, mat);
      return `${Math.min(width, height)} ${Math.max(width, height)}`;
    }),
  );
}

function sharesPaper(view: SpreadView): boolean {
  return meets((side) =>
    view.doc.mats.flatMap(({ page, content }) => (page === side && content.kind === 'paper' ? [`${content.pattern} ${content.color} ${content.ground}`] : [])),
  );
}

/** Mats of the page's own colour share nothing by it. */
function sharesColor(view: SpreadView): boolean {
  const colors = (side: Side): Hex[] => [
    ...new Set(view.doc.mats.flatMap((mat) => (mat.page === side && mat.color !== view.doc.pages[side]?.color ? [mat.color] : []))),
  ];
  if (meets(colors)) return true;
  const right = colors('right').map(labOf);
  return colors('left').some((hex) => right.some((other) => ciede2000(labOf(hex), other) <= SAME_COLOR));
}
