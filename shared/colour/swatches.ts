import type { Hex } from '../model/ids';
import type { Swatch } from '../model/print';
import { hexToOklab, oklabDistance, oklabToOklch, rgbToHex, rgbToOklab, type Oklab } from './convert';
import { groupColors, type WeightedColor } from './group-colors';

/** A colour that somebody proposes for a picture's palette. */
export interface SwatchCandidate {
  readonly hex: Hex;
  readonly role: Swatch['role'];
}

/** At most so many of a palette's colours are our own area colours. */
const AREA_COLORS = 12;
/** Colours nearer than this in OKLab are one swatch: about CIEDE2000 4. */
const SAME_SWATCH = 0.04;
/** A pixel backs the nearest swatch within this OKLab distance, and none beyond it. */
const BACKING_DISTANCE = 0.12;
/** A candidate needs this share of the pixels … */
const MIN_BACKING = 0.001;
/** … within this OKLab distance: about CIEDE2000 3.5. */
const CLOSE_BACKING = 0.035;
const BINS = 1 << 15;

/**
 * A picture's palette with measured shares: the candidates that pixels back, and the picture's own area
 * colours. The share of a swatch is the share of pixels for which it is the nearest swatch and within
 * BACKING_DISTANCE, so shares add up to at most 1. A candidate that no pixel backs is dropped, and of
 * near-equal ones the first is kept. Same input, same palette; largest share first, then by hex.
 *
 * @param rgb - 8-bit sRGB triples; any pixels beyond a whole triple are left out.
 */
export function measureSwatches(rgb: Uint8Array, candidates: readonly SwatchCandidate[]): Swatch[] {
  const colors = histogram(rgb);
  const total = colors.reduce((sum, color) => sum + color.weight, 0);
  if (total === 0) return [];
  const backed = candidates
    .map(({ hex, role }): SwatchCandidate => ({ hex: hex.toLowerCase(), role }))
    .filter(({ hex }) => isBacked(hexToOklab(hex), colors, total));
  const areas = groupColors(colors, AREA_COLORS).map((group): SwatchCandidate => ({ hex: hexOf(group.nearest), role: 'area' }));
  const chosen = distinct([...backed, ...areas]);
  const weights = share(colors, chosen.map((swatch) => swatch.oklab));
  return chosen
    .map(({ hex, role, oklab }, i): Swatch => {
      // Rounded down, so that the sum stays at most 1.
      return { hex, role, oklch: oklabToOklch(oklab), share: Math.floor((weights[i]! / total) * 10_000) / 10_000 };
    })
    .filter((swatch) => swatch.share > 0)
    .sort((a, b) => b.share - a.share || (a.hex < b.hex ? -1 : 1));
}

interface BinColor extends WeightedColor {
  readonly rgb: readonly [number, number, number];
}

const hexOf = (color: BinColor): Hex => rgbToHex(...color.rgb);

/** One weighted colour (the mean of its pixels) per filled bin of 5 bits a channel. */
function histogram(rgb: Uint8Array): BinColor[] {
  const counts = new Uint32Array(BINS);
  const sums = new Float64Array(BINS * 3);
  for (let at = 0; at + 2 < rgb.length; at += 3) {
    const r = rgb[at]!;
    const g = rgb[at + 1]!;
    const b = rgb[at + 2]!;
    const bin = ((r >> 3) << 10) | ((g >> 3) << 5) | (b >> 3);
    counts[bin]!++;
    sums[bin * 3]! += r;
    sums[bin * 3 + 1]! += g;
    sums[bin * 3 + 2]! += b;
  }
  const colors: BinColor[] = [];
  for (let bin = 0; bin < BINS; bin++) {
    const weight = counts[bin]!;
    if (weight === 0) continue;
    const mean = [0, 1, 2].map((i) => Math.round(sums[bin * 3 + i]! / weight)) as [number, number, number];
    colors.push({ rgb: mean, oklab: rgbToOklab(...mean), weight });
  }
  return colors;
}

function isBacked(color: Oklab, colors: readonly BinColor[], total: number): boolean {
  let near = 0;
  for (const bin of colors) if (oklabDistance(color, bin.oklab) <= CLOSE_BACKING) near += bin.weight;
  return near >= total * MIN_BACKING;
}

function distinct(candidates: readonly SwatchCandidate[]): (SwatchCandidate & { oklab: Oklab })[] {
  const kept: (SwatchCandidate & { oklab: Oklab })[] = [];
  for (const candidate of candidates) {
    const oklab = hexToOklab(candidate.hex);
    if (kept.every((other) => oklabDistance(other.oklab, oklab) >= SAME_SWATCH)) kept.push({ ...candidate, oklab });
  }
  return kept;
}

/** Weight of the bins that each swatch is nearest to, within BACKING_DISTANCE. */
function share(colors: readonly BinColor[], swatches: readonly Oklab[]): number[] {
  const weights = swatches.map(() => 0);
  for (const { oklab, weight } of colors) {
    let best = -1;
    let least = BACKING_DISTANCE;
    swatches.forEach((swatch, i) => {
      const distance = oklabDistance(swatch, oklab);
      if (distance <= least) {
        least = distance;
        best = i;
      }
    });
    if (best >= 0) weights[best]! += weight;
  }
  return weights;
}
