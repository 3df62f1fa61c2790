import sharp, { type Sharp } from 'sharp';
import { MAX_PIXELS } from '../../shared/contracts/prints';
import type { PictureRefusal } from '../../shared/model/picture-refusal';
import { Refusal } from './worker-messages';

/** Decoded pixels: three bytes of sRGB each, row by row. */
export interface RawPicture {
  readonly data: Buffer;
  readonly width: number;
  readonly height: number;
}

/**
 * Decodes a picture upright (EXIF orientation applied) into 8-bit sRGB, whatever profile, depth or ink it has; what is
 * transparent shows white paper. At most `maxSidePx` on the long side and never enlarged, so that the decoder can shrink
 * while it loads.
 *
 * @throws Refusal `damaged` when the pixels cannot all be read.
 */
export async function decodePicture(path: string, maxSidePx: number): Promise<RawPicture> {
  const upright = sharp(path, { limitInputPixels: MAX_PIXELS, failOn: 'error', sequentialRead: true }).autoOrient();
  try {
    return await toRaw(fitted(upright, maxSidePx).flatten({ background: '#ffffff' }).toColourspace('srgb'));
  } catch {
    throw new Refusal('damaged' satisfies PictureRefusal);
  }
}

/** A smaller copy from pixels that are decoded already. */
export const shrinkPicture = (picture: RawPicture, maxSidePx: number): Promise<RawPicture> =>
  toRaw(fitted(fromRaw(picture), maxSidePx));

export const fromRaw = ({ data, width, height }: RawPicture): Sharp => sharp(data, { raw: { width, height, channels: 3 } });

const fitted = (image: Sharp, maxSidePx: number): Sharp =>
  image.resize({ width: maxSidePx, height: maxSidePx, fit: 'inside', withoutEnlargement: true });

async function toRaw(image: Sharp): Promise<RawPicture> {
  const { data, info } = await image.raw({ depth: 'uchar' }).toBuffer({ resolveWithObject: true });
  if (info.channels !== 3) throw new Error(`Three channels expected, not ${info.channels}`);
  return { data, width: info.width, height: info.height };
}
