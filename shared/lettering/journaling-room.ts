import type { Rect } from '../model/rect';
import type { Content } from '../model/spread';
import { layoutJournaling } from '../scene/journaling';

type Journaling = Pick<Extract<Content, { kind: 'journaling' }>, 'text' | 'lineHeight'>;

export interface JournalingRoom {
  /** Words written. */
  readonly words: number;
  /** Words of these, or of plain prose where there are too few to tell, that the place holds. */
  readonly capacity: number;
  readonly fits: boolean;
}

/** Prose of our own, with words of a common length (4.4 letters), to fill a place with. */
const PROSE = 'We walked out to the light before the tide came in and Nora counted every step aloud while the gulls went over us and nobody minded the wind at all ';
const countWords = (text: string): number => text.split(/\s+/).filter(Boolean).length;

/**
 * How many words a hand of this size gets onto a place, its lines ruled one `lineHeight` apart: the words
 * written so far and, after them, plain prose until the last rule is full.
 */
export function journalingRoom(journaling: Journaling, place: Rect): JournalingRoom {
  const words = countWords(journaling.text);
  const { overflow } = layoutJournaling(journaling, place);
  if (overflow.length > 0) return { words, capacity: words - countWords(overflow.join(' ')), fits: false };
  const lines = Math.floor(place.height / journaling.lineHeight);
  // A line of prose holds about one word for every 1.9 line heights; twice that fills any place.
  const wanted = Math.min(5000, Math.ceil((lines * place.width * 4) / Math.max(1, journaling.lineHeight)));
  const prose = PROSE.repeat(Math.ceil(wanted / countWords(PROSE)));
  const text = `${journaling.text.trimEnd()} ${prose}`;
  const full = layoutJournaling({ ...journaling, text }, place);
  return { words, capacity: full.lines.reduce((sum, { line }) => sum + countWords(line.text), 0), fits: true };
}
