import { toPicture, type PaperFrame } from '../geometry/paper';
import type { Hex } from '../model/ids';
import type { OklabRaster, Print } from '../model/print';
import type { Rect } from '../model/rect';
import { ciede2000Each } from './ciede2000';
import { hexToLab, writeLab } from './convert';
import { readPixel } from './raster';

/** Under this CIEDE2000 difference a rim and its card are too close, unless their tones part them. */
export const RIM_DELTA_E = 12;
/** With a larger difference of lightness (L*) the tones alone part rim and card: tone comes before hue. */
export const RIM_TONE = 15;
/** A photo sinks into its mat where this share of its rim is too close. PRODUCT.md section 5. */
export const SINKING_SHARE = 1 / 3;

/** How a photo's rim stands against the card round it. */
export interface RimContrast {
  /** Share of the rim, 0–1, closer than both RIM_TONE and RIM_DELTA_E. */
  readonly closeShare: number;
  /** Median CIEDE2000 difference between rim and mat. */
  readonly medianDeltaE: number;
  /** Median difference of lightness (L*, never negative) between rim and mat. */
  readonly toneDifference: number;
}

type RimPrint = Pick<Print, 'raster' | 'imageWidth' | 'imageHeight'> & PaperFrame;

/**
 * The rim is read on rings at these depths, as a share of the window's shorter side: the outer few
 * percent, which the eye takes for the photo's edge. Common practice; the depths are our own.
 */
const RING_DEPTHS = [0.012, 0.045];
const POINTS_PER_RING = 32;
const SAMPLES = RING_DEPTHS.length * POINTS_PER_RING;

const rims = new WeakMap<OklabRaster, Map<string, Float64Array>>();
const contrasts = new WeakMap<Float64Array, Map<Hex, RimContrast>>();
/** Enough for a print's windows of some hundred drag steps, or for the colours of a picker; then it starts anew. */
const REMEMBERED = 256;

/**
 * How the rim of what `window` shows of a print stands against a mat of colour `matHex`. Reads the
 * stored raster, never the picture; what lies off the picture is white paper.
 *
 * @param window - on the upright paper, in Lengths; may leave the paper.
 */
export function rimContrast(print: RimPrint, window: Rect, matHex: Hex): RimContrast {
  const rim = rimOf(print, window);
  return remember(contrasts, rim, matHex, () => measure(rim, matHex));
}

/** True where the photo keeps its distance: neither a third of its rim nor its middle value is too close. */
export const standsOut = (contrast: RimContrast): boolean =>
  contrast.closeShare < SINKING_SHARE && contrast.medianDeltaE >= RIM_DELTA_E;

function measure(rim: Float64Array, matHex: Hex): RimContrast {
  const mat = hexToLab(matHex);
  const differences = ciede2000Each(rim, mat);
  const tones = new Float64Array(SAMPLES);
  let close = 0;
  for (let i = 0; i < SAMPLES; i++) {
    tones[i] = Math.abs(rim[i * 3]! - mat[0]);
    if (tones[i]! < RIM_TONE && differences[i]! < RIM_DELTA_E) close++;
  }
  return { closeShare: close / SAMPLES, medianDeltaE: median(differences), toneDifference: median(tones) };
}

function median(values: Float64Array): number {
  values.sort();
  const half = values.length / 2;
  return (values[half - 1]! + values[half]!) / 2;
}

/** Lab D65 triples along the window's rim. */
function rimOf(print: RimPrint, window: Rect): Float64Array {
  const shown = toPicture(print, window);
  const scaleX = print.raster.width / print.imageWidth;
  const scaleY = print.raster.height / print.imageHeight;
  const area = { x: shown.x * scaleX, y: shown.y * scaleY, width: shown.width * scaleX, height: shown.height * scaleY };
  const key = `${area.x} ${area.y} ${area.width} ${area.height}`;
  return remember(rims, print.raster, key, () => readRim(print.raster, area));
}

function readRim(raster: OklabRaster, area: Rect): Float64Array {
  const labs = new Float64Array(SAMPLES * 3);
  const pixel: [number, number, number] = [0, 0, 0];
  let at = 0;
  for (const depth of RING_DEPTHS) {
    const inset = Math.min(area.width, area.height) * depth;
    const width = area.width - 2 * inset;
    const height = area.height - 2 * inset;
    for (let i = 0; i < POINTS_PER_RING; i++) {
      const [dx, dy] = alongRing(((i + 0.5) / POINTS_PER_RING) * 2 * (width + height), width, height);
      const x = Math.floor(area.x + inset + dx);
      const y = Math.floor(area.y + inset + dy);
      if (x >= 0 && y >= 0 && x < raster.width && y < raster.height) {
        readPixel(raster, y * raster.width + x, pixel);
        writeLab(pixel[0], pixel[1], pixel[2], labs, at);
      } else {
        labs[at] = WHITE_PAPER;
      }
      at += 3;
    }
  }
  return labs;
}

/** L* of paper where there is no picture; a* and b* are 0. */
const WHITE_PAPER = 100;

/** A point that many units clockwise along a rectangle's outline from its top-left corner. */
function alongRing(distance: number, width: number, height: number): readonly [number, number] {
  if (distance < width) return [distance, 0];
  if (distance < width + height) return [width, distance - width];
  if (distance < 2 * width + height) return [2 * width + height - distance, height];
  return [0, 2 * (width + height) - distance];
}

function remember<Owner extends object, Key, Value>(
  cache: WeakMap<Owner, Map<Key, Value>>,
  owner: Owner,
  key: Key,
  make: () => Value,
): Value {
  let known = cache.get(owner);
  if (!known) cache.set(owner, (known = new Map<Key, Value>()));
  const found = known.get(key);
  if (found !== undefined) return found;
  if (known.size >= REMEMBERED) known.clear();
  const value = make();
  known.set(key, value);
  return value;
}
