import type { Hex } from '../model/ids';
import { hexToOklch, type Oklch } from './convert';

/** Hue families: up to which OKLCH hue each goes, and what it is called when dark, middling and light. Our own words. */
const FAMILIES: readonly (readonly [upTo: number, dark: string, middling: string, light: string])[] = [
  [8, 'berry', 'rose', 'pink'],
  [26, 'wine', 'red', 'blush'],
  [40, 'rust', 'brick', 'coral'],
  [58, 'brown', 'copper', 'peach'],
  [75, 'umber', 'amber', 'apricot'],
  [101, 'bronze', 'mustard', 'gold'],
  [110, 'olive', 'olive', 'lemon'],
  [128, 'moss', 'lime', 'pear'],
  [150, 'pine', 'green', 'leaf'],
  [170, 'forest', 'emerald', 'mint'],
  [190, 'fir', 'jade', 'sea-foam'],
  [228, 'teal', 'teal', 'aqua'],
  [240, 'petrol', 'lagoon', 'sky'],
  [262, 'navy', 'blue', 'sky'],
  [282, 'midnight', 'cobalt', 'periwinkle'],
  [302, 'indigo', 'violet', 'lilac'],
  [325, 'plum', 'purple', 'mauve'],
  [345, 'aubergine', 'orchid', 'thistle'],
  [361, 'berry', 'rose', 'pink'],
];

/** Below this chroma a colour reads as a neutral; lighter colours need less of it to be seen. */
const NEUTRAL_CHROMA = 0.022;
const NEUTRALS: readonly (readonly [upTo: number, word: string, tinted: string])[] = [
  [0.24, 'black', 'black'],
  [0.4, 'charcoal', 'charcoal'],
  [0.56, 'slate', 'slate'],
  [0.72, 'grey', 'stone'],
  [0.86, 'silver', 'shingle'],
  [0.955, 'chalk', 'cream'],
  [1.01, 'white', 'white'],
];

/**
 * A colour in two plain words, such as `deep teal` or `warm cream`, from its OKLCH lightness, chroma and
 * hue. Near colours share a name; the words are no finer than the eye at a craft table.
 *
 * @throws RangeError where `hex` is not of the form #rrggbb.
 */
export function colorName(hex: Hex): string {
  const oklch = hexToOklch(hex);
  return oklch[1] < NEUTRAL_CHROMA ? neutralName(oklch) : hueName(oklch);
}

function neutralName([l, c, h]: Oklch): string {
  const [, plain, tinted] = NEUTRALS.find(([upTo]) => l < upTo)!;
  if (c < 0.005) return `${l < 0.24 ? 'true' : 'plain'} ${plain}`;
  const isWarm = h < 115 || h > 330;
  return isWarm ? `warm ${tinted}` : `cool ${plain}`;
}

/** Weak oranges are not called oranges: dark, middling and light. */
const EARTHS = ['', 'cocoa', 'clay', 'sand'] as const;
const isEarth = ([, c, h]: Oklch): boolean => c < 0.085 && h > 34 && h < 85;

function hueName(oklch: Oklch): string {
  const [l, c, h] = oklch;
  const [, dark, middling, light] = isEarth(oklch) ? EARTHS : FAMILIES.find(([upTo]) => h < upTo)!;
  if (l > 0.9) return `pale ${c < 0.05 && h > 40 && h < 115 ? 'cream' : light}`;
  if (l > 0.74) return `${c < 0.06 ? 'misty' : c > 0.15 ? 'bright' : 'soft'} ${light}`;
  if (l > 0.48) return `${c < 0.08 ? 'dusty' : c > 0.15 ? 'bright' : 'clear'} ${middling}`;
  if (l > 0.28) return `${c < 0.045 ? 'smoky' : c > 0.14 ? 'rich' : 'deep'} ${dark}`;
  return `${c > 0.1 ? 'inky' : 'darkest'} ${dark}`;
}
