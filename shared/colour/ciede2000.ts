import type { Lab } from './convert';

const RADIANS = Math.PI / 180;
const TURN = 2 * Math.PI;
const POW_25_7 = 25 ** 7;

const pow7 = (v: number): number => {
  const square = v * v;
  return square * square * square * v;
};

/** Several times faster than Math.hypot, which guards against overflow that no Lab value comes near. */
const length = (x: number, y: number): number => Math.sqrt(x * x + y * y);

/** Hue angle in radians, 0–2π; 0 for a grey, as the paper sets it. */
function hueAngle(a: number, b: number): number {
  if (a === 0 && b === 0) return 0;
  const angle = Math.atan2(b, a);
  return angle < 0 ? angle + TURN : angle;
}

/**
 * The CIEDE2000 colour difference of two Lab colours (same white; here D65), with kL = kC = kH = 1.
 * Symmetric, 0 for equal colours; about 1 is just noticeable.
 *
 * G. Sharma, W. Wu, E. N. Dalal (2005), "The CIEDE2000 color-difference formula", Color Res. Appl. 30(1).
 */
export function ciede2000(p: Lab, q: Lab): number {
  return difference(p[0], p[1], p[2], q[0], q[1], q[2]);
}

/**
 * The CIEDE2000 differences of many Lab colours (triples, one after the other) from one colour.
 *
 * @param out - takes one difference per triple; made when left out.
 */
export function ciede2000Each(labs: Float64Array | Float32Array, from: Lab, out = new Float64Array(labs.length / 3)): Float64Array {
  const [l, a, b] = from;
  for (let i = 0, at = 0; at < labs.length; i++, at += 3) {
    out[i] = difference(labs[at]!, labs[at + 1]!, labs[at + 2]!, l, a, b);
  }
  return out;
}

// The names follow the paper: C, h and their means after the correction G of a*.
function difference(l1: number, a1: number, b1: number, l2: number, a2: number, b2: number): number {
  const meanC7 = pow7((length(a1, b1) + length(a2, b2)) / 2);
  const g = 1 + 0.5 * (1 - Math.sqrt(meanC7 / (meanC7 + POW_25_7)));
  const c1 = length(a1 * g, b1);
  const c2 = length(a2 * g, b2);
  const h1 = hueAngle(a1 * g, b1);
  const h2 = hueAngle(a2 * g, b2);

  const bothColoured = c1 * c2 !== 0;
  let deltaHue = bothColoured ? h2 - h1 : 0;
  if (deltaHue > Math.PI) deltaHue -= TURN;
  else if (deltaHue < -Math.PI) deltaHue += TURN;
  const deltaL = l2 - l1;
  const deltaC = c2 - c1;
  const deltaH = 2 * Math.sqrt(c1 * c2) * Math.sin(deltaHue / 2);

  const meanL = (l1 + l2) / 2;
  const meanC = (c1 + c2) / 2;
  let meanH = h1 + h2;
  if (bothColoured) {
    if (Math.abs(h1 - h2) > Math.PI) meanH += meanH < TURN ? TURN : -TURN;
    meanH /= 2;
  }

  const t =
    1 -
    0.17 * Math.cos(meanH - 30 * RADIANS) +
    0.24 * Math.cos(2 * meanH) +
    0.32 * Math.cos(3 * meanH + 6 * RADIANS) -
    0.2 * Math.cos(4 * meanH - 63 * RADIANS);
  const fromMiddle = (meanL - 50) * (meanL - 50);
  const sl = 1 + (0.015 * fromMiddle) / Math.sqrt(20 + fromMiddle);
  const sc = 1 + 0.045 * meanC;
  const sh = 1 + 0.015 * meanC * t;
  const bump = (meanH / RADIANS - 275) / 25;
  const meanCorrectedC7 = pow7(meanC);
  const rc = 2 * Math.sqrt(meanCorrectedC7 / (meanCorrectedC7 + POW_25_7));
  const rt = -Math.sin(60 * RADIANS * Math.exp(-bump * bump)) * rc;
  const l = deltaL / sl;
  const c = deltaC / sc;
  const h = deltaH / sh;
  // Rounding can leave a sum of squares just under 0 for equal colours.
  return Math.sqrt(Math.max(0, l * l + c * c + h * h + rt * c * h));
}
