import type { Hex } from '../model/ids';
import { hexToRgb, rgbToXyz } from './convert';

/** WCAG 2.2 relative luminance, 0–1: XYZ's Y. */
const luminance = (hex: Hex): number => rgbToXyz(...hexToRgb(hex))[1];

/** WCAG 2.2 contrast ratio of two colours, 1–21, in either order. */
export function contrastRatio(one: Hex, other: Hex): number {
  const [a, b] = [luminance(one), luminance(other)];
  return (Math.max(a, b) + 0.05) / (Math.min(a, b) + 0.05);
}

export const DARK_INK: Hex = '#1b1d22';
export const LIGHT_INK: Hex = '#fdfcf8';

/** Dark or light ink, whichever stands out more from a card. */
export const inkOn = (card: Hex): Hex => (contrastRatio(DARK_INK, card) >= contrastRatio(LIGHT_INK, card) ? DARK_INK : LIGHT_INK);
