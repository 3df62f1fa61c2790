import sharp from 'sharp';
import { inverseTurn, turnedSize } from '../../shared/geometry/paper';
import type { Rect, Size } from '../../shared/model/rect';
import { pictureCover, type PictureCover } from '../../shared/scene/picture-cover';
import { toPixels } from '../../shared/scene/pixels';
import type { PhotoItem } from '../../shared/scene/scene';
import type { Layer } from './canvas';

/** A picture file's bytes, or its path. */
export type PictureData = Buffer | string;

/** From this reduction on, a JPEG is cheaper to read reduced as a whole than to cut first. */
const REDUCE_FIRST = 0.5;

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
  const source = scaleRect(cover.source, file.width / photo.imageWidth, file.height / photo.imageHeight);
  const scaleX = size.width / source.width;
  const scaleY = size.height / source.height;
  const isReduced = Math.max(scaleX, scaleY) <= REDUCE_FIRST;
  const region = isReduced ? { x: 0, y: 0, width: file.width, height: file.height } : wholePixels(source, file);
  const width = Math.max(size.width, Math.round(region.width * scaleX));
  const height = Math.max(size.height, Math.round(region.height * scaleY));
  const left = clamp(Math.round((source.x - region.x) * scaleX), width - size.width);
  const top = clamp(Math.round((source.y - region.y) * scaleY), height - size.height);
  const picture = sharp(data, { sequentialRead: true }).autoOrient();
  if (!isReduced) picture.extract({ left: region.x, top: region.y, width: region.width, height: region.height });
  const { data: pixels, info } = await picture
    .resize(width, height, { fit: 'fill' })
    .extract({ left, top, width: size.width, height: size.height })
    .flatten({ background: '#ffffff' })
    .toColourspace('srgb')
    .raw()
    .toBuffer({ resolveWithObject: true });
  return { data: pixels, width: info.width, height: info.height, channels: 3 };
}

const scaleRect = (r: Rect, x: number, y: number): Rect => ({ x: r.x * x, y: r.y * y, width: r.width * x, height: r.height * y });

const clamp = (value: number, max: number): number => Math.min(Math.max(value, 0), max);

/** The whole pixels that a fractional rectangle touches, on the image. */
function wholePixels(r: Rect, image: Size): Rect {
  const x = clamp(Math.floor(r.x + 1e-6), image.width - 1);
  const y = clamp(Math.floor(r.y + 1e-6), image.height - 1);
  return {
    x,
    y,
    width: Math.max(1, Math.min(image.width, Math.ceil(r.x + r.width - 1e-6)) - x),
    height: Math.max(1, Math.min(image.height, Math.ceil(r.y + r.height - 1e-6)) - y),
  };
}

async function turnLayer(layer: Layer, degrees: number): Promise<Layer> {
  const { width, height, channels } = layer;
  const { data, info } = await sharp(layer.data, { raw: { width, height, channels } })
    .rotate(degrees)
    .raw()
    .toBuffer({ resolveWithObject: true });
  return { data, width: info.width, height: info.height, channels };
}
