import type { Rect } from '../model/rect';
import type { Content } from '../model/spread';
import { capHeightOf, setLine, sizeForCapHeight, wrapText, type TextLine } from './text';

/** From one baseline to the next, in em: close-set, as cut letters are. */
const LINE_EM = 1.04;

export interface PlacedLine {
  readonly line: TextLine;
  readonly x: number;
  readonly baseline: number;
}

export interface LetteringLayout {
  readonly size: number;
  readonly lines: readonly PlacedLine[];
  /** True where the letters at their true size reach past `rect`. */
  readonly overflows: boolean;
}

/**
 * Cut letters of a true height, wrapped to the width of `rect` and centred in it both ways (measured
 * by capitals). Letters never shrink: what is too large reaches past the rectangle.
 */
export function layoutLettering(lettering: Extract<Content, { kind: 'lettering' }>, rect: Rect): LetteringLayout {
  const size = sizeForCapHeight('young-serif', lettering.letterHeight);
  const lines = wrapText('young-serif', size, lettering.text, rect.width, false).map((text) => setLine('young-serif', size, text));
  const placed = centreLines('young-serif', size, size * LINE_EM, lines, rect);
  const first = placed[0];
  const height = first ? placed.at(-1)!.baseline - first.baseline + lettering.letterHeight : 0;
  return { size, lines: placed, overflows: height > rect.height || lines.some((line) => line.width > rect.width) };
}

/** Lines centred in a rectangle, the block's height being from the first line's capitals to the last baseline. */
export function centreLines(
  font: Parameters<typeof capHeightOf>[0],
  size: number,
  lineHeight: number,
  lines: readonly TextLine[],
  rect: Rect,
): PlacedLine[] {
  const capHeight = capHeightOf(font, size);
  const top = rect.y + (rect.height - capHeight - (lines.length - 1) * lineHeight) / 2;
  return lines.map((line, i) => ({
    line,
    x: rect.x + (rect.width - line.width) / 2,
    baseline: top + capHeight + i * lineHeight,
  }));
}
