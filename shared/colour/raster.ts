import type { OklabRaster } from '../model/print';

/** Int8 triples as `OklabRaster` stores them, one per pixel, row by row. */
export interface DecodedRaster {
  readonly width: number;
  readonly height: number;
  readonly data: Int8Array;
}

const SCALE = 254;
const LIGHTNESS_OFFSET = 127;
const toInt8 = (v: number): number => Math.min(127, Math.max(-127, Math.round(v)));

/**
 * Packs OKLab triples (row by row) into the form that a print stores.
 *
 * @throws RangeError where the number of values is not 3 × width × height.
 */
export function encodeRaster(width: number, height: number, oklab: Float32Array | readonly number[]): OklabRaster {
  if (oklab.length !== width * height * 3) {
    throw new RangeError(`a raster of ${width} × ${height} needs ${width * height * 3} values, not ${oklab.length}`);
  }
  let bytes = '';
  for (let at = 0; at < oklab.length; at += 3) {
    bytes += byteOf(oklab[at]! * SCALE - LIGHTNESS_OFFSET) + byteOf(oklab[at + 1]! * SCALE) + byteOf(oklab[at + 2]! * SCALE);
  }
  return { width, height, data: btoa(bytes) };
}

const byteOf = (v: number): string => String.fromCharCode(toInt8(v) & 255);

/** A print's raster never changes, so its decoded form lives as long as the object does. */
const decoded = new WeakMap<OklabRaster, DecodedRaster>();

/** @throws RangeError where the data does not hold 3 × width × height bytes. */
export function decodeRaster(raster: OklabRaster): DecodedRaster {
  const known = decoded.get(raster);
  if (known) return known;
  const bytes = atob(raster.data);
  if (bytes.length !== raster.width * raster.height * 3) {
    throw new RangeError(`a raster of ${raster.width} × ${raster.height} does not have ${bytes.length} bytes`);
  }
  const data = new Int8Array(bytes.length);
  for (let i = 0; i < bytes.length; i++) data[i] = bytes.charCodeAt(i);
  const result = { width: raster.width, height: raster.height, data };
  decoded.set(raster, result);
  return result;
}

const BASE64 = 'ABCDEFGHIJKLMNOPQRSTUVWXYZabcdefghijklmnopqrstuvwxyz0123456789+/';
/** Value of each base64 character by its char code. */
const SEXTETS = new Uint8Array(128);
for (let i = 0; i < BASE64.length; i++) SEXTETS[BASE64.charCodeAt(i)] = i;

/**
 * One pixel as OKLab, read straight from the stored text: three bytes are four characters, so nothing has
 * to be decoded for a few pixels of a raster. Written to `out`.
 *
 * @param pixel - its index, row by row; must lie in the raster.
 */
export function readPixel({ data }: OklabRaster, pixel: number, out: [number, number, number]): void {
  const at = pixel * 4;
  const bits =
    (SEXTETS[data.charCodeAt(at) & 127]! << 18) |
    (SEXTETS[data.charCodeAt(at + 1) & 127]! << 12) |
    (SEXTETS[data.charCodeAt(at + 2) & 127]! << 6) |
    SEXTETS[data.charCodeAt(at + 3) & 127]!;
  // Shifting up and back down again carries a byte's sign.
  out[0] = (((bits << 8) >> 24) + LIGHTNESS_OFFSET) / SCALE;
  out[1] = ((bits << 16) >> 24) / SCALE;
  out[2] = ((bits << 24) >> 24) / SCALE;
}

