import { cellRect, contentRect, matRect, revealOf } from '../geometry/grid';
import { neededOf } from '../geometry/keep-zone';
import { placedPhotos, windowAtOwnSize, type PlacedPhoto } from '../geometry/placed-photos';
import { area, bottom, boundingBox, centre, contains, inset, overlaps, right } from '../geometry/rects';
import type { Hex, MatId, PrintId, Side } from '../model/ids';
import { inches } from '../model/length';
import type { Print } from '../model/print';
import type { Rect } from '../model/rect';
import type { Mat, Scheme, SchemeRole, SpreadDocument, TrimSettings } from '../model/spread';
import { MIN_REVEAL } from '../model/trim-settings';
import { ciede2000 } from './ciede2000';
import { contrastRatio } from './contrast';
import { hexToLab } from './convert';
import type { Point } from './hull';
import { RIM_DELTA_E, rimContrast, standsOut } from './rim';
import { shownCard } from './shares';

const ROLES: readonly SchemeRole[] = ['base', 'main', 'second', 'accent'];
/** WCAG 2.2, 1.4.3: text against its ground. */
const TEXT_CONTRAST = 4.5;
/** No inner mat is put round a photo that would be left narrower than this. */
const MIN_PHOTO = inches(1);

/** How a colour suits a unit. */
export interface Suitability {
  /** All that the mats carry keeps its distance from the colour. */
  readonly fits: boolean;
  /** The least difference, CIEDE2000; 100 where nothing is carried. */
  readonly distance: number;
  /** The least difference of lightness, L*; 100 where nothing is carried. */
  readonly tone: number;
  /** The largest share of a photo's rim that is too close, 0–1. */
  readonly closeShare: number;
}

/** Mats that take one colour together: a single mat, or all panes of a split print. */
export interface CardUnit {
  readonly mats: readonly Mat[];
  readonly page: Side;
  /** Middle of its bounding box on the spread, from the left page's corner. */
  readonly centre: Point;
  /** Of its mats, square Lengths. */
  readonly area: number;
  /** Of its card that shows, whatever its colour. */
  readonly shown: number;
  readonly isFocal: boolean;
  readonly kind: Mat['content']['kind'];
  /** How a colour suits it as card. */
  readonly card: Readonly<Record<SchemeRole, Suitability>>;
  /** How a colour would suit it as a thin inner mat. */
  readonly inner: Readonly<Record<SchemeRole, Suitability>>;
  /** A person's own inner mat is too close to what it surrounds. */
  readonly ownInnerHides: boolean;
  /** A thin inner mat would show all round and leave enough of each photo. */
  readonly mayTakeInner: boolean;
  /** Units that touch it on the same page, as positions in the list. */
  readonly neighbours: readonly number[];
}

/** The inner mats that a person chose; one that the document's scheme put there is decided anew with each scheme. */
export function ownInner(doc: Pick<SpreadDocument, 'scheme'>, mat: Pick<Mat, 'inner'>): Mat['inner'] {
  if (!mat.inner || !doc.scheme || mat.inner.reveal !== MIN_REVEAL) return mat.inner;
  const { color } = mat.inner;
  return ROLES.some((role) => doc.scheme!.colors[role].hex === color) ? null : mat.inner;
}

/**
 * All mats of the spread as units, measured against the scheme's colours. In the order of their mats' ids, so that
 * a spread and its mirror image are judged in the same order.
 */
export function cardUnits(doc: SpreadDocument, prints: ReadonlyMap<PrintId, Print>, trim: TrimSettings, scheme: Scheme): CardUnit[] {
  const photos = new Map(placedPhotos(doc, (id) => prints.get(id)).map((photo) => [photo.matId, photo]));
  const groups = new Map<string, Mat[]>();
  for (const mat of doc.mats) {
    const key = mat.content.kind === 'pane' ? mat.content.groupId : mat.id;
    const group = groups.get(key);
    if (group) group.push(mat);
    else groups.set(key, [mat]);
  }
  const lists = [...groups.values()]
    .map((mats) => [...mats].sort((a, b) => (a.id < b.id ? -1 : 1)))
    .sort(([a], [b]) => (a!.id < b!.id ? -1 : 1));
  const cardShown = shownCard({ ...doc, mats: doc.mats.map((mat) => ({ ...mat, inner: ownInner(doc, mat) })) }, prints);
  return lists.map((mats, i) => {
    const own = ownInner(doc, mats[0]!);
    // An inner mat without a reveal lies wholly under the photo: the card still meets it.
    const shown = own && own.reveal > 0 ? own : null;
    const carried = suitabilities(mats, photos, prints, scheme);
    return {
      mats: mats.map((mat) => ({ ...mat, inner: ownInner(doc, mat) })),
      page: mats[0]!.page,
      centre: centreOnSpread(doc, mats),
      area: mats.reduce((sum, mat) => sum + area(matRect(doc.format, mat)), 0),
      shown: mats.reduce((sum, mat) => sum + (cardShown.get(mat.id) ?? 0), 0),
      isFocal: mats.some((mat) => mat.focal),
      kind: mats[0]!.content.kind,
      card: cardSuitability(doc, mats, shown, carried, scheme),
      inner: carried,
      ownInnerHides: shown !== null && !fitsAll(mats, photos, prints, shown.color),
      mayTakeInner: !own && mats.every((mat) => canTakeInner(doc, mat, photos.get(mat.id), prints.get(photos.get(mat.id)?.printId ?? ''), trim)),
      neighbours: lists.flatMap((others, k) => (k !== i && touch(doc, mats, others) ? [k] : [])),
    };
  });
}

type RoleSuitability = Record<SchemeRole, Suitability>;

function suitabilities(
  mats: readonly Mat[],
  photos: ReadonlyMap<MatId, PlacedPhoto>,
  prints: ReadonlyMap<PrintId, Print>,
  scheme: Scheme,
): RoleSuitability {
  return eachRole(scheme, (hex) => {
    const parts = mats.map((mat) => suitability(mat, photos.get(mat.id), prints, hex));
    return {
      fits: parts.every(({ fits }) => fits),
      distance: Math.min(...parts.map(({ distance }) => distance)),
      tone: Math.min(...parts.map(({ tone }) => tone)),
      closeShare: Math.max(...parts.map(({ closeShare }) => closeShare)),
    };
  });
}

function centreOnSpread(doc: SpreadDocument, mats: readonly Mat[]): Point {
  const middle = centre(boundingBox(mats.map((mat) => matRect(doc.format, mat))));
  return mats[0]!.page === 'right' && doc.pages.left ? { x: middle.x + doc.format.width + doc.binding.gap, y: middle.y } : middle;
}

const fitsAll = (mats: readonly Mat[], photos: ReadonlyMap<MatId, PlacedPhoto>, prints: ReadonlyMap<PrintId, Print>, hex: Hex): boolean =>
  mats.every((mat) => suitability(mat, photos.get(mat.id), prints, hex).fits);

const eachRole = (scheme: Scheme, measure: (hex: Hex) => Suitability): RoleSuitability =>
  Object.fromEntries(ROLES.map((role) => [role, measure(scheme.colors[role].hex)])) as RoleSuitability;

/** With an inner mat of its own the card does not meet what it carries, and without a reveal no card shows at all. */
function cardSuitability(doc: SpreadDocument, mats: readonly Mat[], shownInner: Mat['inner'], carried: RoleSuitability, scheme: Scheme): RoleSuitability {
  if (shownInner) return against(shownInner.color, scheme);
  const isHidden = mats.every((mat) => revealOf(mat, doc.reveal) === 0 && (mat.content.kind === 'print' || mat.content.kind === 'pane'));
  return isHidden ? eachRole(scheme, () => NOTHING_CARRIED) : carried;
}

const against = (color: Hex, scheme: Scheme): RoleSuitability => eachRole(scheme, (hex) => apart(color, hex));

function apart(color: Hex, hex: Hex): Suitability {
  const distance = ciede2000(hexToLab(color), hexToLab(hex));
  return { fits: distance >= RIM_DELTA_E, distance, tone: toneBetween(color, hex), closeShare: 0 };
}

const toneBetween = (a: Hex, b: Hex): number => Math.abs(hexToLab(a)[0] - hexToLab(b)[0]);

const NOTHING_CARRIED: Suitability = { fits: true, distance: 100, tone: 100, closeShare: 0 };

function suitability(mat: Mat, photo: PlacedPhoto | undefined, prints: ReadonlyMap<PrintId, Print>, hex: Hex): Suitability {
  const print = photo && prints.get(photo.printId);
  if (photo && print) {
    const contrast = rimContrast(print, windowAtOwnSize(print, photo), hex);
    return { fits: standsOut(contrast), distance: contrast.medianDeltaE, tone: contrast.toneDifference, closeShare: contrast.closeShare };
  }
  const { content } = mat;
  switch (content.kind) {
    case 'lettering':
    case 'journaling':
      return { ...apart(content.color, hex), fits: contrastRatio(content.color, hex) >= TEXT_CONTRAST };
    case 'paper':
      return apart(content.ground, hex);
    case 'embellishment':
      return apart(content.color, hex);
    default:
      return NOTHING_CARRIED;
  }
}

/**
 * True where a thin inner mat would show and do no harm: it makes the photo narrower from its right and
 * bottom edges, so it must leave enough of it, and the keep zone with it. Panes take none: it would move
 * their seams.
 */
function canTakeInner(doc: SpreadDocument, mat: Mat, photo: PlacedPhoto | undefined, print: Print | undefined, trim: TrimSettings): boolean {
  if (!photo || !print || photo.groupId !== null) return false;
  if (photo.placement.mode === 'whole') {
    const inner = inset(matRect(doc.format, mat), revealOf(mat, doc.reveal));
    return contains(inset(inner, MIN_REVEAL), photo.rect);
  }
  const left = inset(contentRect(doc.format, doc.reveal, { ...mat, inner: null }), MIN_REVEAL);
  if (left.width < MIN_PHOTO || left.height < MIN_PHOTO) return false;
  const { window, placement } = photo;
  const needed = neededOf(print, placement, trim.tolerance);
  const narrower = { ...window, width: window.width - 2 * MIN_REVEAL, height: window.height - 2 * MIN_REVEAL };
  return !needed || contains(narrower, needed) || !contains(window, needed);
}

/** True where some mat of one list shares an edge with, or lies on, some mat of the other. */
function touch(doc: SpreadDocument, some: readonly Mat[], others: readonly Mat[]): boolean {
  if (some[0]!.page !== others[0]!.page) return false;
  return some.some((a) => others.some((b) => shareEdge(cellRect(doc.format, a), cellRect(doc.format, b))));
}

function shareEdge(a: Rect, b: Rect): boolean {
  if (overlaps(a, b)) return true;
  const meetsX = a.x === right(b) || b.x === right(a);
  const meetsY = a.y === bottom(b) || b.y === bottom(a);
  return (meetsX && a.y < bottom(b) && b.y < bottom(a)) || (meetsY && a.x < right(b) && b.x < right(a));
}
