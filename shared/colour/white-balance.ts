import type { Hex } from '../model/ids';
import { ciede2000 } from './ciede2000';
import { hexToLab, rgbToHex, type Lab } from './convert';

/** Linear light of the three channels, 0–1. */
export type LinearRgb = readonly [r: number, g: number, b: number];

/** What was measured inside a mark on the photo: the mean in linear light, and how even it was. */
export interface Patch {
  readonly mean: LinearRgb;
  /** How uneven it is: twice the mean CIEDE2000 of its pixels from their mean. */
  readonly spread: number;
  /** Share of pixels in which a channel is at its end, 0–1. */
  readonly clipped: number;
}

/** What the patch is in truth. Common practice for copier paper, and a photographer's grey card. */
export const REFERENCES = { white: 0.9, grey: 0.18 } as const;
export type Reference = keyof typeof REFERENCES;

export interface ReadColor {
  readonly hex: Hex;
  /** CIEDE2000 within which the true colour is taken to lie. */
  readonly uncertainty: number;
}

export type ReadingRefusal = 'patch-clipped' | 'patch-dark' | 'patch-uneven' | 'sheet-uneven' | 'patch-coloured';

/**
 * Best case of a reading: a camera's three filters are not the eye's, which no correction by one patch can mend.
 * Our own figure, from the synthetic chart in the tests: under strong casts the mean error is at most 1.9, the largest 4.5.
 */
export const LEAST_UNCERTAINTY = 4;
const MAX_CLIPPED = 0.02;
const MIN_PATCH_LIGHT = 0.02;
const MAX_SPREAD = 8;
/** The patch's brightest channel may be this many times its dimmest: beyond it is a coloured thing, no white under a lamp. */
const MAX_CAST = 6;

// Lindbloom, "Chromatic adaptation": the Bradford matrix of Lam (1985), and its inverse; sRGB as in CSS Color 4.
const RGB_TO_XYZ = [
  [0.41239079926595934, 0.357584339383878, 0.1804807884018343],
  [0.21263900587151027, 0.715168678767756, 0.07219231536073371],
  [0.01933081871559182, 0.11919477979462598, 0.9505321522496607],
] as const;
const XYZ_TO_RGB = [
  [3.2409699419045226, -1.537383177570094, -0.4986107602930034],
  [-0.9692436362808796, 1.8759675015077202, 0.04155505740717559],
  [0.05563007969699366, -0.20397695888897652, 1.0569715142428786],
] as const;
const BRADFORD = [
  [0.8951, 0.2664, -0.1614],
  [-0.7502, 1.7135, 0.0367],
  [0.0389, -0.0685, 1.0296],
] as const;
const BRADFORD_INVERSE = [
  [0.9869929, -0.1470543, 0.1599627],
  [0.4323053, 0.5183603, 0.0492912],
  [-0.0085287, 0.0400428, 0.9684867],
] as const;

type Matrix = readonly (readonly [number, number, number])[];
const multiply = (m: Matrix, [x, y, z]: LinearRgb): LinearRgb => {
  const row = (i: number): number => m[i]![0] * x + m[i]![1] * y + m[i]![2] * z;
  return [row(0), row(1), row(2)];
};
const toCone = (rgb: LinearRgb): LinearRgb => multiply(BRADFORD, multiply(RGB_TO_XYZ, rgb));

/** IEC 61966-2-1 encoding of one channel, to 0–255; what lies outside is held to the ends. */
const encode = (v: number): number => {
  const held = Math.min(1, Math.max(0, v));
  return 255 * (held <= 0.0031308 ? 12.92 * held : 1.055 * held ** (1 / 2.4) - 0.055);
};

/**
 * The colour as it would be under even white light: von Kries scaling in Bradford's cone space, which sends the
 * patch to a neutral of its true reflectance. Exposure and cast are corrected in one go.
 *
 * @param patch - linear light of the white or grey patch on the same photo.
 */
export function balance(color: LinearRgb, patch: LinearRgb, reference: Reference): LinearRgb {
  const reflectance = REFERENCES[reference];
  const seen = toCone(patch);
  const wanted = toCone([reflectance, reflectance, reflectance]);
  const [l, m, s] = toCone(color);
  const adapted: LinearRgb = [(l * wanted[0]) / seen[0], (m * wanted[1]) / seen[1], (s * wanted[2]) / seen[2]];
  return multiply(XYZ_TO_RGB, multiply(BRADFORD_INVERSE, adapted));
}

const toHex = (rgb: LinearRgb): Hex => rgbToHex(encode(rgb[0]), encode(rgb[1]), encode(rgb[2]));

/**
 * Reads a sheet's colour from two marks on one photo: the sheet, and a white or grey patch beside it.
 *
 * The uncertainty adds, as independent errors do (root of the sum of squares), the camera's own, how uneven both
 * marks are, and how much an over-exposed sheet hides.
 *
 * @returns the code of what makes a reading worthless where it would be.
 */
export function readSheetColor(sheet: Patch, patch: Patch, reference: Reference): ReadColor | ReadingRefusal {
  const brightest = Math.max(...patch.mean);
  if (patch.clipped > MAX_CLIPPED) return 'patch-clipped';
  if (brightest < MIN_PATCH_LIGHT) return 'patch-dark';
  if (brightest > MAX_CAST * Math.max(Math.min(...patch.mean), 1e-6)) return 'patch-coloured';
  if (patch.spread > MAX_SPREAD) return 'patch-uneven';
  if (sheet.spread > 2 * MAX_SPREAD) return 'sheet-uneven';
  const hidden = sheet.clipped * 20;
  const uncertainty = Math.hypot(LEAST_UNCERTAINTY, sheet.spread / 2, patch.spread / 2, hidden);
  return { hex: toHex(balance(sheet.mean, patch.mean, reference)), uncertainty: Math.round(uncertainty * 10) / 10 };
}

/**
 * Measures the pixels inside a mark.
 *
 * @param rgb - gamma-encoded sRGB, three bytes per pixel, at least one pixel.
 */
export function measurePatch(rgb: Uint8Array): Patch {
  const pixels = rgb.length / 3;
  const sum = [0, 0, 0];
  let clipped = 0;
  for (let at = 0; at < rgb.length; at += 3) {
    let isClipped = false;
    for (let c = 0; c < 3; c += 1) {
      const v = rgb[at + c]!;
      sum[c]! += decode(v);
      if (v >= 254) isClipped = true;
    }
    if (isClipped) clipped += 1;
  }
  const mean: LinearRgb = [sum[0]! / pixels, sum[1]! / pixels, sum[2]! / pixels];
  const middle = hexToLab(toHex(mean));
  let distance = 0;
  // A few hundred pixels say as well how even a mark is as all of them.
  const step = Math.max(1, Math.floor(pixels / 400));
  let sampled = 0;
  for (let i = 0; i < pixels; i += step, sampled += 1) distance += ciede2000(labOf(rgb, i * 3), middle);
  return { mean, spread: (2 * distance) / sampled, clipped: clipped / pixels };
}

const labOf = (rgb: Uint8Array, at: number): Lab => hexToLab(rgbToHex(rgb[at]!, rgb[at + 1]!, rgb[at + 2]!));

const decode = (value: number): number => {
  const v = value / 255;
  return v <= 0.04045 ? v / 12.92 : ((v + 0.055) / 1.055) ** 2.4;
};
