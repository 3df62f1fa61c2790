import type { Hex } from '../model/ids';

/** CIE Lab under D65: L* 0–100, a*, b*. */
export type Lab = readonly [l: number, a: number, b: number];
/** OKLab: L 0–1, a and b about ±0.4. */
export type Oklab = readonly [l: number, a: number, b: number];
/** OKLCH: L 0–1, chroma, hue in degrees 0–360 (0 when the colour is grey). */
export type Oklch = readonly [l: number, c: number, h: number];
/** Gamma-encoded sRGB, 0–255. */
export type Rgb = readonly [r: number, g: number, b: number];

/** Below this OKLCH chroma a hue is noise: one step of one 8-bit channel moves a grey by about as much. */
export const GREY_CHROMA = 0.004;

// Matrices and constants: CSS Color 4 (W3C), sample code "conversions.js"; D65 is x 0.3127, y 0.3290.
const RGB_TO_XYZ = [
  0.41239079926595934, 0.357584339383878, 0.1804807884018343, 0.21263900587151027, 0.715168678767756,
  0.07219231536073371, 0.01933081871559182, 0.11919477979462598, 0.9505321522496607,
] as const;
const XYZ_TO_LMS = [
  0.819022437996703, 0.3619062600528904, -0.1288737815209879, 0.0329836539323885, 0.9292868615863434,
  0.0361446663506424, 0.0481771893596242, 0.2642395317527308, 0.6335478284694309,
] as const;
const LMS_TO_XYZ = [
  1.2268798758459243, -0.5578149944602171, 0.2813910456659647, -0.0405757452148008, 1.112286803280317,
  -0.0717110580655164, -0.0763729366746601, -0.4214934332022432, 1.5869240198367816,
] as const;
const LMS_TO_OKLAB = [
  0.210454268309314, 0.7936177747023054, -0.0040720430116193, 1.9779985324311684, -2.42859224204858,
  0.450593709617411, 0.0259040424655478, 0.7827717124575296, -0.8086757549230774,
] as const;
const OKLAB_TO_LMS = [
  1, 0.3963377773761749, 0.2158037573099136, 1, -0.1055613458156586, -0.0638541728258133, 1, -0.0894841775298119,
  -1.2914855480194092,
] as const;
const WHITE_X = 0.3127 / 0.329;
const WHITE_Z = (1 - 0.3127 - 0.329) / 0.329;
/** CIE 15: the rational forms of Lab's constants. */
const EPSILON = 216 / 24389;
const KAPPA = 24389 / 27;

type Matrix = readonly [number, number, number, number, number, number, number, number, number];
type Triple = [number, number, number];

function multiply(m: Matrix, x: number, y: number, z: number): Triple {
  return [m[0] * x + m[1] * y + m[2] * z, m[3] * x + m[4] * y + m[5] * z, m[6] * x + m[7] * y + m[8] * z];
}

/** IEC 61966-2-1 decoding of one 8-bit channel. */
const LINEAR = Float64Array.from({ length: 256 }, (_, value) => {
  const v = value / 255;
  return v <= 0.04045 ? v / 12.92 : ((v + 0.055) / 1.055) ** 2.4;
});

/** Channels of `#rrggbb`, 0–255. @throws RangeError for any other text. */
export function hexToRgb(hex: Hex): Rgb {
  if (!/^#[0-9a-f]{6}$/i.test(hex)) throw new RangeError(`not a colour of the form #rrggbb: ${hex}`);
  const value = parseInt(hex.slice(1), 16);
  return [value >> 16, (value >> 8) & 255, value & 255];
}

/** `#rrggbb` of channels 0–255, rounded and clamped. */
export function rgbToHex(r: number, g: number, b: number): Hex {
  const byte = (v: number): number => Math.min(255, Math.max(0, Math.round(v)));
  return `#${((byte(r) << 16) | (byte(g) << 8) | byte(b)).toString(16).padStart(6, '0')}`;
}

/** XYZ relative to D65 (white has Y 1) of integer channels 0–255. */
export const rgbToXyz = (r: number, g: number, b: number): Triple =>
  multiply(RGB_TO_XYZ, LINEAR[r]!, LINEAR[g]!, LINEAR[b]!);

/** Ottosson's OKLab of XYZ relative to D65. */
export function xyzToOklab(x: number, y: number, z: number): Triple {
  const [l, m, s] = multiply(XYZ_TO_LMS, x, y, z);
  return multiply(LMS_TO_OKLAB, Math.cbrt(l), Math.cbrt(m), Math.cbrt(s));
}

function xyzToLab(x: number, y: number, z: number): Triple {
  const fx = labCurve(x / WHITE_X);
  const fy = labCurve(y);
  const fz = labCurve(z / WHITE_Z);
  return [116 * fy - 16, 500 * (fx - fy), 200 * (fy - fz)];
}

const cube = (v: number): number => v * v * v;

const labCurve = (t: number): number => (t > EPSILON ? Math.cbrt(t) : (KAPPA * t + 16) / 116);

export const rgbToOklab = (r: number, g: number, b: number): Oklab => xyzToOklab(...rgbToXyz(r, g, b));
export const hexToOklab = (hex: Hex): Oklab => rgbToOklab(...hexToRgb(hex));
export const rgbToLab = (r: number, g: number, b: number): Lab => xyzToLab(...rgbToXyz(r, g, b));
export const hexToLab = (hex: Hex): Lab => rgbToLab(...hexToRgb(hex));
export const hexToOklch = (hex: Hex): Oklch => oklabToOklch(hexToOklab(hex));

/** Lab D65 of an OKLab colour, written to three places of `out` from `at` on: the checks ask for thousands while a mat is dragged. */
export function writeLab(l: number, a: number, b: number, out: Float64Array | Triple, at: number): void {
  const n = OKLAB_TO_LMS;
  const m = LMS_TO_XYZ;
  const p = cube(l + n[1] * a + n[2] * b);
  const q = cube(l + n[4] * a + n[5] * b);
  const r = cube(l + n[7] * a + n[8] * b);
  const fx = labCurve((m[0] * p + m[1] * q + m[2] * r) / WHITE_X);
  const fy = labCurve(m[3] * p + m[4] * q + m[5] * r);
  const fz = labCurve((m[6] * p + m[7] * q + m[8] * r) / WHITE_Z);
  out[at] = 116 * fy - 16;
  out[at + 1] = 500 * (fx - fy);
  out[at + 2] = 200 * (fy - fz);
}

export function oklabToOklch([l, a, b]: Oklab): Oklch {
  const chroma = Math.hypot(a, b);
  if (chroma < GREY_CHROMA) return [l, chroma, 0];
  const hue = (Math.atan2(b, a) * 180) / Math.PI;
  return [l, chroma, hue < 0 ? hue + 360 : hue];
}

/** Euclidean distance in OKLab: good enough to sort colours into groups; differences that people read use CIEDE2000. */
export const oklabDistance = (p: Oklab, q: Oklab): number => Math.hypot(p[0] - q[0], p[1] - q[1], p[2] - q[2]);
