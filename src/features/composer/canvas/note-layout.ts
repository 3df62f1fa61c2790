import type { Note } from '#shared/checks/check';
import type { Rect } from '#shared/model/rect';

export interface NotePlace {
  readonly note: Note;
  /** Top edge in px, from the same origin as the mats' rectangles. */
  readonly top: number;
  /** Where the leader's ring stands: just inside the first mat, on the side of the note. Null without a mat. */
  readonly ring: { readonly x: number; readonly y: number } | null;
}

export interface NoteColumn {
  readonly placed: readonly NotePlace[];
  /** Notes for which the margin has no room. */
  readonly folded: readonly Note[];
}

const SPACE_BETWEEN = 24;
const FIRST_LINE = 9;
/** The ring stands this far inside its mat. */
const RING_INSET = 12;

/**
 * Places the notes of one margin beside the mats they mean: in the order of those mats, never overlapping
 * (pushed down, 24 px apart), the rest folded. Severity decides who gets a place when there is no room.
 *
 * @param rectOf - a mat's rectangle in px.
 * @param heightOf - a note's height in px.
 * @param bounds - top and bottom of the margin in px.
 */
export function layOutNotes(
  notes: readonly Note[],
  side: 'left' | 'right',
  rectOf: (matId: string) => Rect | undefined,
  heightOf: (note: Note) => number,
  bounds: { readonly top: number; readonly bottom: number },
): NoteColumn {
  const kept = [...notes];
  const folded: Note[] = [];
  const total = (list: readonly Note[]): number => list.reduce((sum, note) => sum + heightOf(note) + SPACE_BETWEEN, -SPACE_BETWEEN);
  while (kept.length > 0 && total(kept) > bounds.bottom - bounds.top) folded.unshift(kept.pop()!);

  const wanted = kept
    .map((note) => {
      const rect = note.matIds.map(rectOf).find((r) => r !== undefined);
      const ringY = rect ? rect.y + Math.min(rect.height / 2, 40) : null;
      const ringX = rect ? (side === 'left' ? rect.x + RING_INSET : rect.x + rect.width - RING_INSET) : null;
      return { note, ring: ringX !== null && ringY !== null ? { x: ringX, y: ringY } : null };
    })
    .sort((a, b) => (a.ring?.y ?? -1) - (b.ring?.y ?? -1));

  const tops: number[] = [];
  let next = bounds.top;
  for (const { note, ring } of wanted) {
    const top = Math.max(next, ring ? ring.y - FIRST_LINE : bounds.top);
    tops.push(top);
    next = top + heightOf(note) + SPACE_BETWEEN;
  }
  // What was pushed past the foot is pushed back up, last first.
  let limit = bounds.bottom;
  for (let i = wanted.length - 1; i >= 0; i -= 1) {
    const height = heightOf(wanted[i]!.note);
    tops[i] = Math.min(tops[i]!, limit - height);
    limit = tops[i]! - SPACE_BETWEEN;
  }
  return { placed: wanted.map(({ note, ring }, i) => ({ note, ring, top: tops[i]! })), folded };
}

/**
 * A leader's path from the note's first line to its ring: horizontal, with one right angle at most. The
 * bend stands in the page margin when ring and line differ in height.
 */
export function leaderPath(from: { x: number; y: number }, ring: { x: number; y: number }): string {
  if (Math.abs(from.y - ring.y) < 1) return `M${from.x} ${from.y}H${ring.x}`;
  const stop = ring.y > from.y ? ring.y - 3 : ring.y + 3;
  return `M${from.x} ${from.y}H${ring.x}V${stop}`;
}
