import { rgbToOklab } from '../../shared/colour/convert';
import { encodeRaster } from '../../shared/colour/raster';
import { measureSwatches } from '../../shared/colour/swatches';
import type { OklabRaster, Swatch } from '../../shared/model/print';
import { shrinkPicture, type RawPicture } from './raw-picture';
import { vibrantColours } from './vibrant-colours';

/** Long side of the raster that a print keeps. MODEL.md 3. */
export const RASTER_SIDE_PX = 64;

/** A picture's palette and raster, from a small copy of it (the 320 px size is enough). */
export async function measureColours(small: RawPicture): Promise<{ palette: Swatch[]; raster: OklabRaster }> {
  const [candidates, tiny] = await Promise.all([vibrantColours(small), shrinkPicture(small, RASTER_SIDE_PX)]);
  return { palette: measureSwatches(small.data, candidates), raster: rasterOf(tiny) };
}

function rasterOf({ data, width, height }: RawPicture): OklabRaster {
  const oklab = new Float32Array(data.length);
  for (let at = 0; at < data.length; at += 3) {
    oklab.set(rgbToOklab(data[at]!, data[at + 1]!, data[at + 2]!), at);
  }
  return encodeRaster(width, height, oklab);
}
