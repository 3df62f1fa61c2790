import { ATKINSON } from './metrics/atkinson';
import { ATKINSON_ITALIC } from './metrics/atkinson-italic';
import { openFace, type Face } from './metrics/font-metrics';
import { YOUNG_SERIF } from './metrics/young-serif';
import type { FontId } from './scene';

/** The shipped fonts' measures; nothing but these decides where a line breaks. MODEL.md 15. */
export const FACES: Readonly<Record<FontId, Face>> = {
  'young-serif': openFace(YOUNG_SERIF),
  'atkinson-italic': openFace(ATKINSON_ITALIC),
  atkinson: openFace(ATKINSON),
};

/** Advance, in ems, of the empty box that stands for a character which a font cannot draw. */
const MISSING_ADVANCE_EM = 0.62;

/** One line of text, set from x = 0. Lengths as the size it was set in. */
export interface TextLine {
  /** The characters that the font has, in order. */
  readonly text: string;
  /** Left edge of each code point of `text`. */
  readonly xs: readonly number[];
  /** Left edges of the boxes for characters that the font cannot draw. */
  readonly missing: readonly number[];
  readonly width: number;
}

/** Em size at which a font's capitals are `height` tall. */
export function sizeForCapHeight(font: FontId, height: number): number {
  const { unitsPerEm, capHeight } = FACES[font].metrics;
  return (height * unitsPerEm) / capHeight;
}

export const capHeightOf = (font: FontId, size: number): number =>
  (FACES[font].metrics.capHeight * size) / FACES[font].metrics.unitsPerEm;

export const missingBoxWidth = (size: number): number => size * MISSING_ADVANCE_EM;

/**
 * Text as it can be set: composed characters (NFC), without characters that show nothing by
 * themselves (joiners, direction marks, variation selectors) and control characters other than line ends.
 */
export function settable(text: string): string {
  return text
    .normalize('NFC')
    .replace(/\r\n?|[\u0085\u2028\u2029]/g, '\n')
    .replace(/[\t\u1680\u2000-\u200a\u202f\u205f\u3000]/g, ' ')
    .replace(/[^\P{Cc}\n]|\p{Default_Ignorable_Code_Point}/gu, '');
}

/** Sets one line as it stands, with kerning. `size` is the em; the result is in its unit, unrounded. */
export function setLine(font: FontId, size: number, text: string): TextLine {
  const face = FACES[font];
  const scale = size / face.metrics.unitsPerEm;
  const xs: number[] = [];
  const missing: number[] = [];
  let known = '';
  let x = 0;
  let before: string | null = null;
  for (const character of text) {
    const advance = face.advance(character);
    if (advance === undefined) {
      missing.push(x);
      x += missingBoxWidth(size);
      before = null;
      continue;
    }
    if (before !== null) x += face.kern(before, character) * scale;
    // A renderer may fold neighbouring spaces into one, which would shift every later place.
    if (character !== ' ' || (known !== '' && !known.endsWith(' '))) {
      xs.push(x);
      known += character;
    }
    x += advance * scale;
    before = character;
  }
  if (known.endsWith(' ')) {
    known = known.slice(0, -1);
    xs.pop();
  }
  return { text: known, xs, missing, width: x };
}

/** Where a pen stands, in the em's unit, and what it wrote last; null where that kerns with nothing. */
interface Pen {
  readonly x: number;
  readonly before: string | null;
}

const LINE_START: Pen = { x: 0, before: null };

/** The pen after more text: what `setLine` adds up, from anywhere in a line, so that a longer line need not be begun anew. */
function write(font: FontId, size: number, pen: Pen, text: string): Pen {
  const face = FACES[font];
  const scale = size / face.metrics.unitsPerEm;
  let { x, before } = pen;
  for (const character of text) {
    const advance = face.advance(character);
    if (advance === undefined) {
      x += missingBoxWidth(size);
      before = null;
      continue;
    }
    if (before !== null) x += face.kern(before, character) * scale;
    x += advance * scale;
    before = character;
  }
  return { x, before };
}

export const widthOf = (font: FontId, size: number, text: string): number => write(font, size, LINE_START, text).x;

/**
 * Breaks text into lines no wider than `width`, at line ends and between words; an empty line stays a
 * line. A word wider than the line is broken within when `breakWords` is set, and otherwise stands on a
 * line of its own, wider than asked. Spaces are single, and none stands at either end of a line.
 */
export function wrapText(font: FontId, size: number, text: string, width: number, breakWords: boolean): string[] {
  return settable(text)
    .split('\n')
    .flatMap((paragraph) => wrapParagraph(font, size, paragraph.split(/ +/).filter(Boolean), width, breakWords));
}

function wrapParagraph(font: FontId, size: number, words: readonly string[], width: number, breakWords: boolean): string[] {
  const lines: string[] = [];
  let line = '';
  let pen = LINE_START;
  for (const word of words) {
    const more = line === '' ? word : ` ${word}`;
    const after = write(font, size, pen, more);
    if (after.x <= width) {
      line += more;
      pen = after;
      continue;
    }
    if (line !== '') lines.push(line);
    const pieces = breakWords ? breakWord(font, size, word, width) : [word];
    lines.push(...pieces.slice(0, -1));
    line = pieces.at(-1)!;
    pen = write(font, size, LINE_START, line);
  }
  return [...lines, line];
}

/** Pieces no wider than `width`, each of at least one character. */
function breakWord(font: FontId, size: number, word: string, width: number): string[] {
  const pieces: string[] = [];
  let piece = '';
  let pen = LINE_START;
  for (const character of word) {
    let after = write(font, size, pen, character);
    if (piece !== '' && after.x > width) {
      pieces.push(piece);
      piece = '';
      after = write(font, size, LINE_START, character);
    }
    piece += character;
    pen = after;
  }
  return [...pieces, piece];
}
