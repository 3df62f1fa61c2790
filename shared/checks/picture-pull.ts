import { readPixel } from '../colour/raster';
import type { Oklab } from '../colour/convert';
import type { Print } from '../model/print';
import type { Rect } from '../model/rect';
import type { PhotoItem } from '../scene/scene';
import { DETAIL_FULL, DETAIL_PULL, FACE_PULL, SHAPE_PULL } from './weight-factors';

/** A mass with its moments: their quotients are where it balances. */
export interface Moment {
  readonly mass: number;
  readonly x: number;
  readonly y: number;
}

/** Points read along each side of a whole photo; a part of one has its share of them. */
const POINTS = 12;
const WHITE: Oklab = [1, 0, 0];

/**
 * What a part of a photo weighs, read at points of the print's raster, so that only what the window shows counts.
 *
 * @param photo - the whole piece, in page space, as the scene draws it.
 * @param part - the part of `photo.rect` that nothing covers.
 * @param page - the page's colour.
 */
export function picturePull(print: Print, photo: PhotoItem, part: Rect, page: Oklab): Moment {
  const { rect } = photo;
  const columns = Math.max(2, Math.round((POINTS * part.width) / rect.width));
  const rows = Math.max(2, Math.round((POINTS * part.height) / rect.height));
  const share = (part.width * part.height) / (columns * rows);
  let mass = 0;
  let momentX = 0;
  let momentY = 0;
  for (let row = 0; row < rows; row += 1) {
    const y = part.y + ((row + 0.5) * part.height) / rows;
    for (let column = 0; column < columns; column += 1) {
      const x = part.x + ((column + 0.5) * part.width) / columns;
      const pull = share * pullAt(print, photo, (x - rect.x) / rect.width, (y - rect.y) / rect.height, page);
      mass += pull;
      momentX += pull * x;
      momentY += pull * y;
    }
  }
  return { mass, x: momentX, y: momentY };
}

const pixel: [number, number, number] = [0, 0, 0];
const beside: [number, number, number] = [0, 0, 0];

/** Pull at a point of the piece as it lies on the page, 0–1 from its left and top. */
function pullAt(print: Print, photo: PhotoItem, u: number, v: number, page: Oklab): number {
  const { raster } = print;
  const [s, t] = beforeTurns(u, v, photo.turns);
  const imageX = photo.source.x + s * photo.source.width;
  const imageY = photo.source.y + t * photo.source.height;
  const x = Math.floor((imageX * raster.width) / photo.imageWidth);
  const y = Math.floor((imageY * raster.height) / photo.imageHeight);
  // Where paper reaches past the picture it is white.
  if (x < 0 || y < 0 || x >= raster.width || y >= raster.height) return plainPull(WHITE, page);
  const at = y * raster.width + x;
  readPixel(raster, at, pixel);
  let step = 0;
  if (x + 1 < raster.width) {
    readPixel(raster, at + 1, beside);
    step += Math.abs(beside[0] - pixel[0]);
  }
  if (y + 1 < raster.height) {
    readPixel(raster, at + raster.width, beside);
    step += Math.abs(beside[0] - pixel[0]);
  }
  const detail = DETAIL_PULL * Math.min(1, step / DETAIL_FULL);
  const inFace = print.faces.some(({ rect }) => imageX >= rect.x && imageX < rect.x + rect.width && imageY >= rect.y && imageY < rect.y + rect.height);
  return plainPull(pixel, page) + detail + (inFace ? FACE_PULL : 0);
}

/** Pull of plain colour: being a shape at all, the distance of its tone from the page's, and its vividness. */
export const plainPull = (color: Oklab, page: Oklab): number => SHAPE_PULL + Math.abs(color[0] - page[0]) + Math.hypot(color[1], color[2]);

/** A point of a turned picture as a point of the picture before it was turned clockwise. */
function beforeTurns(u: number, v: number, turns: PhotoItem['turns']): readonly [number, number] {
  switch (turns) {
    case 0:
      return [u, v];
    case 1:
      return [v, 1 - u];
    case 2:
      return [1 - u, 1 - v];
    case 3:
      return [1 - v, u];
  }
}
