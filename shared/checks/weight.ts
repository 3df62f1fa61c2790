import { hexToOklab, type Oklab } from '../colour/convert';
import { innerMatRect, matRect } from '../geometry/grid';
import type { PlacedPhoto } from '../geometry/placed-photos';
import { area, centre } from '../geometry/rects';
import type { Hex, MatId } from '../model/ids';
import type { Print } from '../model/print';
import type { Content, Mat, SpreadDocument } from '../model/spread';
import { pageRects, toScene } from '../scene/page-rects';
import { centreOfMass, type Mass, type Point } from './balance/centre-of-mass';
import type { SpreadView } from './check';

export interface SpreadWeights {
  readonly mats: ReadonlyMap<MatId, number>;
  /** Shares of 100 that add up to 100; both 0 where there are no mats. */
  readonly left: number;
  readonly right: number;
  /** Centre of visual mass, in the scene's space (Lengths from its top-left corner); null without mats. */
  readonly centre: Point | null;
}

/** Even a mat of the page's own colour is a shape with edges and pulls a little. */
const SHAPE_PULL = 0.25;
/** Share of its place that ink or a motif covers. Common practice. */
const INK_SHARE = 0.15;
const EMBELLISHMENT_SHARE = 0.5;
/** What a print of unknown colours is taken for. */
const MID_GREY: Hex = '#808080';

const weighed = new WeakMap<SpreadView, SpreadWeights>();

/**
 * The visual weight of every mat, of both pages, and where the whole balances.
 *
 * A mat weighs the sum, over what shows of it (card, inner mat, picture or other content), of
 *
 *     area / page's area × (0.25 + |L − L of the page| + C)
 *
 * with L and chroma C in OKLab: weight grows with area, with the tone's distance from the page, and with
 * vividness. The formula and its factors are our own. Its reasons: size, contrast of tone and saturation are
 * what weight in a picture is commonly put down to (R. Arnheim, Art and Visual Perception, 1954, from memory);
 * S. Lok, S. Feiner, G. Ngai (2004), "Evaluation of visual balance for automated layout", weigh layouts by the
 * luminance that stands out from the background; in R. Hübner and M. G. Fillinger (2016), Frontiers in
 * Psychology 7:335, the tone that is not the ground's carries the mass. A picture counts with its palette,
 * swatch by swatch, so that black and white halves do not cancel to grey. Detail and faces are not weighed yet.
 */
export function weighSpread(view: SpreadView): SpreadWeights {
  let known = weighed.get(view);
  if (!known) weighed.set(view, (known = weigh(view)));
  return known;
}

function weigh(view: SpreadView): SpreadWeights {
  const pages = pageRects(view.doc);
  const mats = new Map<MatId, number>();
  const masses: Mass[] = [];
  const totals = { left: 0, right: 0 };
  for (const mat of view.doc.mats) {
    const rect = toScene(pages, mat.page, matRect(view.doc.format, mat));
    if (!rect) continue;
    const mass = weighMat(view, mat);
    mats.set(mat.id, mass);
    totals[mat.page] += mass;
    masses.push({ ...centre(rect), mass });
  }
  const total = totals.left + totals.right;
  const left = total > 0 ? Math.round((100 * totals.left) / total) : 0;
  return { mats, left, right: total > 0 ? 100 - left : 0, centre: centreOfMass(masses) };
}

interface KnownWeight {
  readonly format: SpreadDocument['format'];
  readonly reveal: number;
  readonly pageColor: Hex;
  readonly print: Print | undefined;
  readonly photoArea: number;
  readonly weight: number;
}
// A mat's object stays the same from edit to edit unless the mat itself changed.
const known = new WeakMap<Mat, KnownWeight>();

function weighMat(view: SpreadView, mat: Mat): number {
  const { format, reveal, pages } = view.doc;
  const pageColor = pages[mat.page]?.color ?? '#ffffff';
  const photo = view.photosByMat.get(mat.id);
  const print = photo && view.prints.get(photo.printId);
  const photoArea = photo ? area(photo.rect) : 0;
  const last = known.get(mat);
  if (
    last &&
    last.format === format &&
    last.reveal === reveal &&
    last.pageColor === pageColor &&
    last.print === print &&
    last.photoArea === photoArea
  ) {
    return last.weight;
  }
  const weight = partsOf(view, mat, photo, print, pageColor).reduce((sum, part) => sum + part.area * part.pull, 0) / (format.width * format.height);
  known.set(mat, { format, reveal, pageColor, print, photoArea, weight });
  return weight;
}

interface Part {
  /** In square Lengths. */
  readonly area: number;
  readonly pull: number;
}

function partsOf(view: SpreadView, mat: Mat, photo: PlacedPhoto | undefined, print: Print | undefined, pageColor: Hex): Part[] {
  const { format, reveal } = view.doc;
  const page = oklabOf(pageColor);
  const inner = innerMatRect(format, reveal, mat);
  const card = inner ? area(inner) : 0;
  const upper = photo && print ? area(photo.rect) : 0;
  const outer = area(matRect(format, mat));
  return [
    { area: Math.max(0, outer - Math.max(card, upper)), pull: contentPull(mat.content, mat.color, page) },
    { area: Math.max(0, card - upper), pull: mat.inner ? contentPull(mat.content, mat.inner.color, page) : 0 },
    { area: upper, pull: print ? picturePull(print, page) : 0 },
  ];
}

/** Pull of card with what is drawn on it; a picture is a part of its own. */
function contentPull(content: Content, card: Hex, page: Oklab): number {
  const ground = pullOf(oklabOf(card), page);
  const mixed = (ink: Hex, share: number): number => share * pullOf(oklabOf(ink), page) + (1 - share) * ground;
  switch (content.kind) {
    case 'lettering':
    case 'journaling':
      return mixed(content.color, INK_SHARE);
    case 'embellishment':
      return mixed(content.color, EMBELLISHMENT_SHARE);
    case 'paper':
      return (pullOf(oklabOf(content.color), page) + pullOf(oklabOf(content.ground), page)) / 2;
    default:
      return ground;
  }
}

const pullOf = (color: Oklab, page: Oklab): number => SHAPE_PULL + Math.abs(color[0] - page[0]) + Math.hypot(color[1], color[2]);

function picturePull({ palette }: Print, page: Oklab): number {
  let total = 0;
  let pull = 0;
  for (const { oklch, share } of palette) {
    total += share;
    pull += share * (SHAPE_PULL + Math.abs(oklch[0] - page[0]) + oklch[1]);
  }
  return total > 0 ? pull / total : pullOf(oklabOf(MID_GREY), page);
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
