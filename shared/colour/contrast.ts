import type { Hex } from '../model/ids';
import { hexToRgb, rgbToXyz } from './convert';

/** WCAG 2.2 contrast ratio of two colours, 1–21, in either order. Relative luminance is XYZ's Y. */
export function contrastRatio(one: Hex, other: Hex): number {
  const [a, b] = [one, other].map((hex) => rgbToXyz(...hexToRgb(hex))[1]) as [number, number];
  return (Math.max(a, b) + 0.05) / (Math.min(a, b) + 0.05);
}
