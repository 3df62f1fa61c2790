import { hexToLab, hexToOklch, type Lab, type Oklch } from '../colour/convert';
import type { Hex } from '../model/ids';

/** Card comes in few colours; converted once each. */
const REMEMBERED = 512;

function remembered<T>(convert: (hex: Hex) => T): (hex: Hex) => T {
  const known = new Map<Hex, T>();
  return (hex) => {
    const found = known.get(hex);
    if (found !== undefined) return found;
    if (known.size >= REMEMBERED) known.clear();
    const made = convert(hex);
    known.set(hex, made);
    return made;
  };
}

export const oklchOf: (hex: Hex) => Oklch = remembered(hexToOklch);
export const labOf: (hex: Hex) => Lab = remembered(hexToLab);

/** Below this OKLCH chroma card reads as a neutral. Our own figure, the schemes' as well. */
export const NEUTRAL_CHROMA = 0.03;
export const isNeutral = (hex: Hex): boolean => oklchOf(hex)[1] < NEUTRAL_CHROMA;

/** Degrees between two hues, 0–180. */
export const hueDistance = (a: number, b: number): number => Math.abs(((a - b + 540) % 360) - 180);
