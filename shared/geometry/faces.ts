import type { Face, Print } from '../model/print';
import type { Rect } from '../model/rect';
import type { Placement } from '../model/spread';
import { toPaper } from './paper';
import { placedPaper } from './window';

/** A face on the upright paper of a placed print, in Lengths. */
export interface PaperFace {
  readonly rect: Rect;
  readonly facing: Face['facing'];
}

const known = new WeakMap<Print, readonly PaperFace[]>();

/** The faces marked on a placed print, at the size at which it is placed. */
export function facesOf(print: Print, { scaledWidth }: Pick<Placement, 'scaledWidth'>): readonly PaperFace[] {
  if (scaledWidth !== null) {
    const paper = placedPaper(print, { scaledWidth });
    return print.faces.map(({ rect, facing }) => ({ rect: toPaper({ ...print, paperWidth: paper.width, paperHeight: paper.height }, rect), facing }));
  }
  let faces = known.get(print);
  if (!faces) known.set(print, (faces = print.faces.map(({ rect, facing }) => ({ rect: toPaper(print, rect), facing }))));
  return faces;
}
