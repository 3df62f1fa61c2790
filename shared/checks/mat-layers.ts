import { contentRect, innerMatRect, matRect } from '../geometry/grid';
import type { PlacedPhoto } from '../geometry/placed-photos';
import { contains } from '../geometry/rects';
import type { Hex } from '../model/ids';
import type { Print } from '../model/print';
import type { Rect } from '../model/rect';
import type { Mat, SpreadDocument } from '../model/spread';
import { photoItem } from '../scene/photo-item';
import type { PhotoItem } from '../scene/scene';
import { INK_SHARE, PATTERN_SHARE } from './weight-factors';

/** Colours of one layer, each with the share of the layer that it covers; shares add up to 1. */
export type Tint = readonly (readonly [color: Hex, share: number])[];

/** One opaque thing of a mat, in page space: card, inner mat, or what it carries. */
export interface MatLayer {
  readonly rect: Rect;
  readonly tint: Tint;
  readonly photo: PhotoItem | null;
}

/** White of a keepsake's paper, as the scene draws it. */
const KEEPSAKE: Hex = '#f4f2ea';
const ORIGIN = { x: 0, y: 0 };
/** Area of a disc over that of the square round it. */
const DISC = Math.PI / 4;

/** What a mat consists of, from its card upwards; every layer hides what it covers of those before it. */
export function matLayers(doc: SpreadDocument, mat: Mat, placed: PlacedPhoto | undefined, print: Print | undefined): MatLayer[] {
  const card = matRect(doc.format, mat);
  const inner = innerMatRect(doc.format, doc.reveal, mat);
  const layers: MatLayer[] = [plain(card, mat.color)];
  if (inner && mat.inner) layers.push(plain(inner, mat.inner.color));
  const photo = placed && print ? photoItem(placed, print, ORIGIN) : null;
  if (photo) layers.push({ rect: photo.rect, tint: [], photo });
  else layers.push(...carried(doc, mat));
  return layers.filter(({ rect }) => rect.width > 0 && rect.height > 0);
}

const plain = (rect: Rect, color: Hex): MatLayer => ({ rect, tint: [[color, 1]], photo: null });

function carried(doc: SpreadDocument, mat: Mat): MatLayer[] {
  const { content } = mat;
  const rect = contentRect(doc.format, doc.reveal, mat);
  const ground = mat.inner?.color ?? mat.color;
  const drawn = (at: Rect, color: Hex, share: number): MatLayer => ({ rect: at, tint: [[color, share], [ground, 1 - share]], photo: null });
  switch (content.kind) {
    case 'lettering':
    case 'journaling':
      return [drawn(rect, content.color, INK_SHARE)];
    case 'embellishment': {
      const side = Math.min(rect.width, rect.height);
      return [drawn(centred(rect, side, side), content.color, DISC)];
    }
    case 'paper':
      return [{ rect, tint: [[content.color, PATTERN_SHARE], [content.ground, 1 - PATTERN_SHARE]], photo: null }];
    case 'keepsake':
      return [plain(centred(rect, content.width, content.height), KEEPSAKE)];
    default:
      return [];
  }
}

const centred = (place: Rect, width: number, height: number): Rect => ({
  x: place.x + (place.width - width) / 2,
  y: place.y + (place.height - height) / 2,
  width,
  height,
});

/** The rectangles that a mat's layers cover together: its card, and whatever reaches over the card's edges. */
export function outlineOf(layers: readonly MatLayer[]): Rect[] {
  const [card, ...others] = layers.map(({ rect }) => rect);
  return card ? [card, ...others.filter((rect) => !contains(card, rect))] : [];
}
