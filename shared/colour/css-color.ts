import { ColorSpace, HSL, HSV, HWB, Lab_D65, Lab as LabD50, LCH, OKLab, OKLCH, P3, parse, serialize, sRGB, to, toGamut, XYZ_D50, XYZ_D65, type ColorConstructor } from 'colorjs.io/fn';
import type { Hex } from '../model/ids';
import type { Oklch } from './convert';

// The functional build knows only the spaces that are registered; these are what people type or copy from elsewhere.
for (const space of [XYZ_D65, XYZ_D50, sRGB, HSL, HSV, HWB, LabD50, Lab_D65, LCH, OKLab, OKLCH, P3]) ColorSpace.register(space);

function toHex(color: ColorConstructor): Hex {
  // CSS Color 4's gamut mapping: lightness and hue are kept, chroma gives way.
  const mapped = toGamut(to(color, sRGB), { space: sRGB, method: 'css' });
  return serialize({ ...mapped, alpha: 1 }, { format: 'hex', collapse: false }).toLowerCase();
}

/** Any CSS colour (`#1d4f5c`, `teal`, `oklch(40% 0.06 210)`, `rgb(29 79 92)`) as the stored form; null for anything else. Transparency is dropped. */
export function parseColor(text: string): Hex | null {
  try {
    return toHex(parse(text.trim()));
  } catch {
    return null;
  }
}

/** The nearest `#rrggbb` of an OKLCH colour, mapped into sRGB as CSS Color 4 says. */
export const oklchToHex = ([l, c, h]: Oklch): Hex => toHex({ spaceId: 'oklch', coords: [Math.min(1, Math.max(0, l)), c, h], alpha: 1 });
