import { rimContrast, type RimContrast } from '../colour/rim';
import { revealOf } from '../geometry/grid';
import { windowAtOwnSize, type PlacedPhoto } from '../geometry/placed-photos';
import type { Hex } from '../model/ids';
import type { Print } from '../model/print';
import type { Mat } from '../model/spread';
import type { SpreadView } from './check';

interface KnownRim {
  readonly print: Print;
  readonly photo: PlacedPhoto;
  readonly card: Hex;
  readonly contrast: RimContrast;
}

// A mat's object stays the same from edit to edit unless the mat itself changed.
const known = new WeakMap<Mat, KnownRim>();

/** The colour of card that a photo on this mat touches: the inner mat's, where it shows; null where no card shows. */
export function cardUnder(mat: Mat, spreadReveal: number): Hex | null {
  if (mat.inner && mat.inner.reveal > 0) return mat.inner.color;
  return revealOf(mat, spreadReveal) > 0 ? mat.color : null;
}

/** How a placed photo's rim stands against the card round it; null where no card shows. */
export function rimOnCard(view: SpreadView, photo: PlacedPhoto): RimContrast | null {
  const mat = view.matById.get(photo.matId);
  const print = view.prints.get(photo.printId);
  const card = mat && cardUnder(mat, view.doc.reveal);
  if (!mat || !print || !card) return null;
  const last = known.get(mat);
  if (last && last.print === print && last.card === card && sameWindow(last.photo, photo)) return last.contrast;
  const contrast = rimContrast(print, windowAtOwnSize(print, photo), card);
  known.set(mat, { print, photo, card, contrast });
  return contrast;
}

const sameWindow = (a: PlacedPhoto, b: PlacedPhoto): boolean =>
  a.window.x === b.window.x &&
  a.window.y === b.window.y &&
  a.window.width === b.window.width &&
  a.window.height === b.window.height &&
  a.placement.scaledWidth === b.placement.scaledWidth;
