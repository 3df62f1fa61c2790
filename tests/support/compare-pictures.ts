import sharp, { type Sharp } from 'sharp';
import { ciede2000 } from '#shared/colour/ciede2000';
import { rgbToLab, type Lab } from '#shared/colour/convert';

export interface PictureDifference {
  /** CIEDE2000 over all pixels. */
  readonly mean: number;
  /** Share of pixels, 0–1, whose difference is under 8. */
  readonly shareUnder8: number;
  readonly worst: number;
}

type Picture = Buffer | string | Sharp;

/**
 * How much two pictures of the same size differ to the eye, pixel by pixel.
 *
 * @throws RangeError where their sizes differ.
 */
export async function comparePictures(a: Picture, b: Picture): Promise<PictureDifference> {
  const [first, second] = await Promise.all([pixelsOf(a), pixelsOf(b)]);
  if (first.width !== second.width || first.height !== second.height) {
    throw new RangeError(`pictures of ${first.width} × ${first.height} and ${second.width} × ${second.height} px cannot be compared`);
  }
  const lab = labCache();
  const count = first.width * first.height;
  let sum = 0;
  let under8 = 0;
  let worst = 0;
  for (let at = 0; at < first.data.length; at += 3) {
    const p = packed(first.data, at);
    const q = packed(second.data, at);
    const difference = p === q ? 0 : ciede2000(lab(p), lab(q));
    sum += difference;
    if (difference < 8) under8 += 1;
    worst = Math.max(worst, difference);
  }
  return { mean: sum / count, shareUnder8: under8 / count, worst };
}

async function pixelsOf(picture: Picture): Promise<{ data: Buffer; width: number; height: number }> {
  const pipeline = typeof picture === 'string' || Buffer.isBuffer(picture) ? sharp(picture) : picture.clone();
  const { data, info } = await pipeline.flatten().toColourspace('srgb').raw().toBuffer({ resolveWithObject: true });
  return { data, width: info.width, height: info.height };
}

const packed = (data: Buffer, at: number): number => (data[at]! << 16) | (data[at + 1]! << 8) | data[at + 2]!;

/** Drawn pictures repeat their colours, so each is converted once. */
function labCache(): (rgb: number) => Lab {
  const known = new Map<number, Lab>();
  return (rgb) => {
    let lab = known.get(rgb);
    if (!lab) known.set(rgb, (lab = rgbToLab((rgb >> 16) & 255, (rgb >> 8) & 255, rgb & 255)));
    return lab;
  };
}
