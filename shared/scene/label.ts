import { inches } from '../model/length';
import type { Rect } from '../model/rect';
import { centreLines, type PlacedLine } from './lettering';
import { setLine, wrapText } from './text';

/** A name written on a drawn thing, at the first of these sizes at which all of it fits. */
const SIZES = [5 / 32, 1 / 8, 3 / 32].map((size) => inches(size));
const LINE_EM = 1.2;

export interface LabelLayout {
  readonly size: number;
  readonly lines: readonly PlacedLine[];
}

/** The name centred in `rect`, on as many lines as it takes; null where it does not fit at any size. */
export function layoutLabel(name: string, rect: Rect): LabelLayout | null {
  for (const size of SIZES) {
    const lines = wrapText('atkinson', size, name, rect.width, false).map((text) => setLine('atkinson', size, text));
    const fits = lines.length * size * LINE_EM <= rect.height && lines.every((line) => line.width <= rect.width);
    if (fits) return { size, lines: centreLines('atkinson', size, size * LINE_EM, lines, rect) };
  }
  return null;
}
