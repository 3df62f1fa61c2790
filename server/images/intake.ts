import { join } from 'node:path';
import { PICTURE_SIZES, type PictureSize } from '../../shared/contracts/prints';
import type { OklabRaster, Swatch } from '../../shared/model/print';
import { identifyPicture, type Identified } from './identify-picture';
import { measureColours } from './measure-colours';
import { decodePicture, fromRaw, shrinkPicture, type RawPicture } from './raw-picture';

export interface IntakeTask {
  readonly sourcePath: string;
  /** An empty folder for the sizes made. */
  readonly outputFolder: string;
}

export interface IntakeResult extends Identified {
  readonly pictures: Readonly<Record<PictureSize, string>>;
  readonly palette: Swatch[];
  readonly raster: OklabRaster;
}

/** Visually lossless at these sizes; more effort doubles the time for a few per cent of the bytes. Measured by bench. */
export const WEBP_OPTIONS = { quality: 82, effort: 3 } as const;

/**
 * Everything that a picture's arrival needs, from one decoding: each smaller size is made from the larger one's pixels.
 * Nothing but pixels passes from the source to the sizes, so no location or device metadata can.
 *
 * @throws Refusal with a `PictureRefusal` code.
 */
export async function intake({ sourcePath, outputFolder }: IntakeTask): Promise<IntakeResult> {
  const identified = await identifyPicture(sourcePath);
  const large = await decodePicture(sourcePath, PICTURE_SIZES.large);
  const medium = await shrinkPicture(large, PICTURE_SIZES.medium);
  const small = await shrinkPicture(medium, PICTURE_SIZES.small);

  const write = async (picture: RawPicture, size: PictureSize): Promise<string> => {
    const path = join(outputFolder, `${size}.webp`);
    await fromRaw(picture).webp(WEBP_OPTIONS).toFile(path);
    return path;
  };
  const [largePath, mediumPath, smallPath, colours] = await Promise.all([
    write(large, 'large'),
    write(medium, 'medium'),
    write(small, 'small'),
    measureColours(small),
  ]);
  return { ...identified, pictures: { large: largePath, medium: mediumPath, small: smallPath }, ...colours };
}
