import sharp, { type Sharp } from 'sharp';
import { inverseTurn, turnedSize } from '../../shared/geometry/paper';
import type { Rect, Size } from '../../shared/model/rect';
import { PHOTO_PAPER, pictureCover, type PictureCover } from '../../shared/scene/picture-cover';
import { toPixels } from '../../shared/scene/pixels';
import type { PhotoItem } from '../../shared/scene/scene';
import type { Layer } from './canvas';

/** A picture file's bytes, or its path. */
export type PictureData = Buffer | string;

/** Pictures much larger than needed are first read at twice the final size, which JPEG readers do fast. */
const MUCH_LARGER = 4;

/**
 * The part of a photo that its picture covers, in pixels, upright as on the page. The white paper
 * beside it is left to the caller.
 *
 * @param scale - pixels of the drawing per unit of the scene.
 * @param load - the original, or any smaller copy of all of it; EXIF orientation is applied here.
 * @returns null where only white paper is in view, or less than a pixel.
 */
export async function drawPhoto(
  photo: PhotoItem,
  scale: number,
  load: () => Promise<{ readonly data: PictureData }>,
): Promise<{ readonly layer: Layer; readonly x: number; readonly y: number } | null> {
  const cover = pictureCover(photo);
  if (!cover) return null;
  const target = toPixels(cover.rect, scale);
  if (target.width < 1 || target.height < 1) return null;
  const { data } = await load();
  const upright = await cutPicture(data, photo, cover, turnedSize(target, inverseTurn(photo.turns)));
  const layer = photo.turns === 0 ? upright : await turnLayer(upright, photo.turns * 90);
  return { layer, x: target.x, y: target.y };
}

async function cutPicture(data: PictureData, photo: PhotoItem, cover: PictureCover, size: Size): Promise<Layer> {
  const { autoOrient: file } = await sharp(data).metadata();
  const onFile = scaleRect(cover.source, file.width / photo.imageWidth, file.height / photo.imageHeight);
  // As strict as intake and no stricter: what was taken in must be drawn.
  const picture = sharp(data, { sequentialRead: true, failOn: 'error' }).autoOrient();
  if (onFile.width < size.width * MUCH_LARGER || onFile.height < size.height * MUCH_LARGER) return cut(picture, file, onFile, size);
  const width = Math.ceil((file.width * size.width * 2) / onFile.width);
  const height = Math.ceil((file.height * size.height * 2) / onFile.height);
  const { data: pixels, info } = await picture
    .resize(width, height, { fit: 'fill' })
    .flatten({ background: PHOTO_PAPER })
    .toColourspace('srgb')
    .raw()
    .toBuffer({ resolveWithObject: true });
  const reduced = sharp(pixels, { raw: { width, height, channels: info.channels } });
  return cut(reduced, info, scaleRect(onFile, width / file.width, height / file.height), size);
}

/** Cuts a fractional rectangle out of a picture and brings it to `size`. */
async function cut(picture: Sharp, image: Size, source: Rect, size: Size): Promise<Layer> {
  const across = cutAxis(source.x, source.width, size.width, image.width);
  const down = cutAxis(source.y, source.height, size.height, image.height);
  const { data, info } = await picture
    .extract({ left: across.from, top: down.from, width: across.length, height: down.length })
    .resize(across.resized, down.resized, { fit: 'fill', kernel: KERNEL })
    .extract({ left: across.skip, top: down.skip, ...size })
    .flatten({ background: PHOTO_PAPER })
    .toColourspace('srgb')
    .raw()
    .toBuffer({ resolveWithObject: true });
  return { data, width: info.width, height: info.height, channels: 3 };
}

interface AxisCut {
  /** Whole pixels to take from the picture. */
  readonly from: number;
  readonly length: number;
  /** Their length in pixels of the result, and how many of those lie before the piece wanted. */
  readonly resized: number;
  readonly skip: number;
}

/** Of sharp's kernels the one whose results come nearest to a browser's scaling; it neither rings nor blurs much. */
const KERNEL = 'mitchell';

/** How many more pixels than needed may be taken at either end to meet the result's pixels better. */
const SLACK_PX = 12;

/**
 * A cut takes whole pixels of the picture and gives whole pixels of the result, but the piece wanted
 * may begin and end between pixels of both. A few more pixels are taken at either end, so many that
 * the piece falls as near to the result's pixel lines as can be.
 */
export function cutAxis(start: number, wanted: number, result: number, image: number): AxisCut {
  const scale = result / wanted;
  const first = clamp(Math.floor(start + 1e-6), image - 1);
  const last = Math.max(first + 1, Math.min(image, Math.ceil(start + wanted - 1e-6)));
  const from = nearest(first, Math.max(0, first - SLACK_PX), (at) => (start - at) * scale);
  const end = nearest(last, Math.min(image, last + SLACK_PX), (at) => (at - from) * scale);
  const resized = Math.max(result, Math.round((end - from) * scale));
  return { from, length: end - from, resized, skip: clamp(Math.round((start - from) * scale), resized - result) };
}

/** Of the whole numbers from `near` to `far`, the one whose measure is nearest to a whole number; the first of equals. */
function nearest(near: number, far: number, measure: (at: number) => number): number {
  const step = far < near ? -1 : 1;
  let best = near;
  let bestMiss = Infinity;
  for (let at = near; step > 0 ? at <= far : at >= far; at += step) {
    const miss = Math.abs(measure(at) - Math.round(measure(at)));
    if (miss < bestMiss - 1e-6) [best, bestMiss] = [at, miss];
  }
  return best;
}

const scaleRect = (r: Rect, x: number, y: number): Rect => ({ x: r.x * x, y: r.y * y, width: r.width * x, height: r.height * y });

const clamp = (value: number, max: number): number => Math.min(Math.max(value, 0), max);

async function turnLayer(layer: Layer, degrees: number): Promise<Layer> {
  const { width, height, channels } = layer;
  const { data, info } = await sharp(layer.data, { raw: { width, height, channels } })
    .rotate(degrees)
    .raw()
    .toBuffer({ resolveWithObject: true });
  return { data, width: info.width, height: info.height, channels };
}
