import type { Hex } from '../model/ids';
import { hexToRgb, rgbToHex } from './convert';

/** Ways of seeing colour other than the common one, each the whole absence of one kind of cone. */
export const VISIONS = ['protanopia', 'deuteranopia', 'tritanopia'] as const;
export type Vision = (typeof VISIONS)[number];

/**
 * What linear sRGB becomes, row by row, as seen without the long-, middle- or short-wave cones: Machado, Oliveira and
 * Fernandes, "A Physiologically-based Model for Simulation of Color Vision Deficiency", IEEE TVCG 15(6), 2009, the
 * published matrices for severity 1.0. Each row adds up to 1, so that greys stay grey.
 */
export const VISION_MATRICES: Readonly<Record<Vision, readonly number[]>> = {
  protanopia: [0.152286, 1.052583, -0.204868, 0.114503, 0.786281, 0.099216, -0.003882, -0.048116, 1.051998],
  deuteranopia: [0.367322, 0.860646, -0.227968, 0.280085, 0.672501, 0.047413, -0.01182, 0.04294, 0.968881],
  tritanopia: [1.255528, -0.076749, -0.178779, -0.078411, 0.930809, 0.147602, 0.004733, 0.691367, 0.3039],
};

/**
 * A colour as it is seen that way; what falls out of sRGB is clamped. The same sum as an SVG `feColorMatrix` in linear
 * RGB makes with `visionFilterValues`.
 *
 * @throws RangeError where `hex` is not of the form #rrggbb.
 */
export function seenAs(hex: Hex, vision: Vision): Hex {
  const linear = hexToRgb(hex).map((v) => decode(v / 255));
  const m = VISION_MATRICES[vision];
  const [r, g, b] = [0, 3, 6].map((row) => 255 * encode(m[row]! * linear[0]! + m[row + 1]! * linear[1]! + m[row + 2]! * linear[2]!)) as [number, number, number];
  return rgbToHex(r, g, b);
}

/** The matrix as the `values` of a `feColorMatrix`: four rows of five. */
export function visionFilterValues(vision: Vision): string {
  const m = VISION_MATRICES[vision];
  return [0, 3, 6].map((row) => `${m[row]} ${m[row + 1]} ${m[row + 2]} 0 0`).join(' ') + ' 0 0 0 1 0';
}

// IEC 61966-2-1.
const decode = (v: number): number => (v <= 0.04045 ? v / 12.92 : ((v + 0.055) / 1.055) ** 2.4);
function encode(linear: number): number {
  const v = Math.min(1, Math.max(0, linear));
  return v <= 0.0031308 ? 12.92 * v : 1.055 * v ** (1 / 2.4) - 0.055;
}
