import { hexToOklab, type Oklab } from '../colour/convert';
import { overlaps } from '../geometry/rects';
import { uncovered } from '../geometry/uncovered';
import { SIDES, type Hex, type MatId, type Side } from '../model/ids';
import type { Print } from '../model/print';
import type { Rect } from '../model/rect';
import type { Mat, PaneGroup, SpreadDocument } from '../model/spread';
import { pageRects, type PageRects } from '../scene/page-rects';
import { centreOfMass, type Mass, type Point } from './balance/centre-of-mass';
import type { SpreadView } from './check';
import { matLayers, outlineOf, type MatLayer, type Tint } from './mat-layers';
import { picturePull, plainPull, type Moment } from './picture-pull';

export interface SpreadWeights {
  readonly mats: ReadonlyMap<MatId, number>;
  /** Every mat's weight at the place where it balances, in the scene's space (Lengths from its top-left corner). */
  readonly masses: ReadonlyMap<MatId, Mass>;
  /** Shares of 100 that add up to 100; both 0 where there are no mats. */
  readonly left: number;
  readonly right: number;
  /** Centre of visual mass, in the scene's space; null without mats. */
  readonly centre: Point | null;
  /** The same of each page. */
  readonly pageCentres: Readonly<Record<Side, Point | null>>;
}

const weighed = new WeakMap<SpreadView, SpreadWeights>();

/**
 * The visual weight of every mat, of both pages, and where the whole balances.
 *
 * A mat weighs the sum, over all that can be seen of it (card, inner mat, picture or other content; not what lies under
 * something laid over it), of
 *
 *     area / page's area × (0.25 + |L − L of the page| + C + 0.25 × detail + 0.4 in a face)
 *
 * with L and chroma C in OKLab. A picture is read point by point within its window, so that what is trimmed off does not
 * count and black and white halves do not cancel to grey; detail is the step of L from one raster pixel to the next,
 * 0–1. Lettering is taken to cover 15 % of its place, a pattern half of it.
 *
 * The formula and its factors are our own. Its reasons: size, contrast of tone, saturation and what there is to look at
 * are what weight in a picture is commonly put down to (R. Arnheim, Art and Visual Perception, 1954, from memory);
 * S. Lok, S. Feiner, G. Ngai (2004), "Evaluation of visual balance for automated layout", weigh layouts by the
 * luminance that stands out from the background; in R. Hübner and M. G. Fillinger (2016), Frontiers in
 * Psychology 7:335, the tone that is not the ground's carries the mass. Busy parts and faces draw the eye: N. H. Mackworth,
 * A. J. Morandi (1967), "The gaze selects informative details within pictures", and M. Cerf, J. Harel, W. Einhäuser, C. Koch
 * (2007), "Predicting human gaze using low-level saliency combined with face detection" (both from memory).
 */
export function weighSpread(view: SpreadView): SpreadWeights {
  let known = weighed.get(view);
  if (!known) weighed.set(view, (known = weigh(view)));
  return known;
}

function weigh(view: SpreadView): SpreadWeights {
  const pages = pageRects(view.doc);
  const bySide = { left: [] as Mass[], right: [] as Mass[] };
  const masses = new Map<MatId, Mass>();
  for (const side of SIDES) {
    const page = pages[side];
    if (!page) continue;
    const mats = view.doc.mats.filter((mat) => mat.page === side);
    weighMats(view, mats).forEach((moment, i) => {
      const mass = massOf(moment, page);
      masses.set(mats[i]!.id, mass);
      bySide[side].push(mass);
    });
  }
  const total = (list: readonly Mass[]): number => list.reduce((sum, { mass }) => sum + mass, 0);
  const [onLeft, onRight] = [total(bySide.left), total(bySide.right)];
  const left = onLeft + onRight > 0 ? Math.round((100 * onLeft) / (onLeft + onRight)) : 0;
  return {
    mats: new Map([...masses].map(([id, { mass }]) => [id, mass])),
    masses,
    left,
    right: onLeft + onRight > 0 ? 100 - left : 0,
    centre: centreOfMass([...bySide.left, ...bySide.right]),
    pageCentres: { left: centreOfMass(bySide.left), right: centreOfMass(bySide.right) },
  };
}

/** A moment over a page's area as a mass at its place in the scene. A mat of which nothing is seen weighs nothing. */
function massOf({ mass, x, y }: Moment, page: PageRects['left'] & object): Mass {
  if (mass <= 0) return { x: page.x, y: page.y, mass: 0 };
  return { x: page.x + x / mass, y: page.y + y / mass, mass: mass / (page.width * page.height) };
}

interface KnownLayers {
  readonly format: SpreadDocument['format'];
  readonly reveal: number;
  readonly print: Print | undefined;
  readonly group: PaneGroup | undefined;
  readonly layers: readonly MatLayer[];
  readonly outline: readonly Rect[];
}
interface KnownMoment {
  readonly layers: readonly MatLayer[];
  readonly pageColor: Hex;
  readonly covers: readonly Rect[];
  readonly moment: Moment;
}
// A mat's object stays the same from edit to edit unless the mat itself changed.
const knownLayers = new WeakMap<Mat, KnownLayers>();
const knownMoments = new WeakMap<Mat, KnownMoment>();

/** The mats of one page, in drawing order, each with its moment in page space. */
function weighMats(view: SpreadView, mats: readonly Mat[]): Moment[] {
  const drawn = mats.map((mat) => layersOf(view, mat));
  return mats.map((mat, i) => {
    const { layers, outline } = drawn[i]!;
    const covers = drawn.slice(i + 1).flatMap((later) => later.outline.filter((rect) => outline.some((own) => overlaps(own, rect))));
    const pageColor = view.doc.pages[mat.page]?.color ?? '#ffffff';
    const last = knownMoments.get(mat);
    if (last && last.layers === layers && last.pageColor === pageColor && isSame(last.covers, covers)) return last.moment;
    const moment = momentOf(view, mat, layers, covers, oklabOf(pageColor));
    knownMoments.set(mat, { layers, pageColor, covers, moment });
    return moment;
  });
}

const isSame = (a: readonly Rect[], b: readonly Rect[]): boolean => a.length === b.length && a.every((rect, i) => rect === b[i]);

function layersOf(view: SpreadView, mat: Mat): KnownLayers {
  const { format, reveal, panes } = view.doc;
  const photo = view.photosByMat.get(mat.id);
  const print = photo && view.prints.get(photo.printId);
  const group = photo?.groupId ? panes.find(({ id }) => id === photo.groupId) : undefined;
  const last = knownLayers.get(mat);
  // A pane's part of its picture depends on where the group's other mats lie, so it is never taken from before.
  if (last && !group && last.format === format && last.reveal === reveal && last.print === print && last.group === group) return last;
  const layers = matLayers(view.doc, mat, photo, print);
  const known = { format, reveal, print, group, layers, outline: outlineOf(layers) };
  knownLayers.set(mat, known);
  return known;
}

function momentOf(view: SpreadView, mat: Mat, layers: readonly MatLayer[], covers: readonly Rect[], page: Oklab): Moment {
  const photo = view.photosByMat.get(mat.id);
  const print = photo && view.prints.get(photo.printId);
  let mass = 0;
  let x = 0;
  let y = 0;
  layers.forEach((layer, i) => {
    const above = [...layers.slice(i + 1).map(({ rect }) => rect), ...covers];
    for (const part of uncovered(layer.rect, above)) {
      const moment = layer.photo && print ? picturePull(print, layer.photo, part, page) : tintMoment(layer.tint, part, page);
      mass += moment.mass;
      x += moment.x;
      y += moment.y;
    }
  });
  return { mass, x, y };
}

function tintMoment(tint: Tint, part: Rect, page: Oklab): Moment {
  const pull = tint.reduce((sum, [color, share]) => sum + share * plainPull(oklabOf(color), page), 0);
  const mass = pull * part.width * part.height;
  return { mass, x: mass * (part.x + part.width / 2), y: mass * (part.y + part.height / 2) };
}

/** Card comes in few colours; converted once each. */
const REMEMBERED_COLORS = 512;
const colors = new Map<Hex, Oklab>();

function oklabOf(hex: Hex): Oklab {
  const found = colors.get(hex);
  if (found) return found;
  if (colors.size >= REMEMBERED_COLORS) colors.clear();
  const oklab = hexToOklab(hex);
  colors.set(hex, oklab);
  return oklab;
}
