import { millimetres } from '../model/length';
import type { Rect } from '../model/rect';
import type { Content } from '../model/spread';
import type { PlacedLine } from './lettering';
import { setLine, wrapText } from './text';

/** Of the distance between two rules: the hand's em size, its baseline above the rule, the rule's own thickness. */
const SIZE = 0.65;
const BASELINE = 0.28;
const RULE = 1 / 16;
/** Nobody rules nearer lines by hand, and a page of them would take long to draw. */
const NEAREST_RULES = millimetres(1);

export interface JournalingLayout {
  readonly size: number;
  readonly rules: readonly Rect[];
  readonly lines: readonly PlacedLine[];
  /** Lines for which the mat has no rule left, in order; empty where all fits. */
  readonly overflow: readonly string[];
}

/**
 * Handwriting on ruled lines over the whole of `rect`, left-aligned and wrapped to its width. Lines
 * beyond the last rule are not set but reported.
 */
export function layoutJournaling(journaling: Pick<Extract<Content, { kind: 'journaling' }>, 'text' | 'lineHeight'>, rect: Rect): JournalingLayout {
  const lineHeight = Math.max(journaling.lineHeight, NEAREST_RULES);
  const size = lineHeight * SIZE;
  const thickness = Math.round(lineHeight * RULE);
  const count = Math.floor(rect.height / lineHeight);
  const ruleY = (i: number): number => rect.y + (i + 1) * lineHeight - thickness;
  const texts = trimEnd(wrapText('atkinson-italic', size, journaling.text, rect.width, true));
  return {
    size,
    rules: Array.from({ length: count }, (_, i) => ({ x: rect.x, y: ruleY(i), width: rect.width, height: thickness })),
    lines: texts.slice(0, count).map((text, i) => ({
      line: setLine('atkinson-italic', size, text),
      x: rect.x,
      baseline: ruleY(i) - lineHeight * BASELINE,
    })),
    overflow: texts.slice(count),
  };
}

/** Empty lines at the end take no rule. */
function trimEnd(lines: readonly string[]): readonly string[] {
  const last = lines.findLastIndex((line) => line !== '');
  return lines.slice(0, last + 1);
}
