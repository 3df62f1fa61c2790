import type { Rect } from '../model/rect';
import type { Content } from '../model/spread';
import { layoutLettering } from '../scene/lettering';
import { settable } from '../scene/text';

export interface LetterCount {
  readonly letter: string;
  readonly count: number;
}

/** How many of each letter are to be cut, the most first, then in the order of the alphabet. Spaces are not cut. */
export function letterCounts(text: string): LetterCount[] {
  const counts = new Map<string, number>();
  for (const letter of settable(text)) {
    if (letter.trim() !== '') counts.set(letter, (counts.get(letter) ?? 0) + 1);
  }
  return [...counts]
    .map(([letter, count]) => ({ letter, count }))
    .sort((a, b) => b.count - a.count || (a.letter < b.letter ? -1 : 1));
}

/** What a title takes at its true letter widths, and what its place leaves for it, in Lengths. */
export interface TitleFit {
  readonly width: number;
  readonly height: number;
  readonly fits: boolean;
}

/** Measured with the shipped letter set (Young Serif), wrapped to the place's width. */
export function fitTitle(lettering: Extract<Content, { kind: 'lettering' }>, place: Rect): TitleFit {
  const { lines, overflows } = layoutLettering(lettering, place);
  const [first] = lines;
  return {
    width: Math.ceil(Math.max(0, ...lines.map(({ line }) => line.width))),
    height: first ? Math.ceil(lines.at(-1)!.baseline - first.baseline + lettering.letterHeight) : 0,
    fits: !overflows,
  };
}
