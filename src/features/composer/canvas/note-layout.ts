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
/** From a note's top edge to the middle of its first line. */
const FIRST_LINE = 9;
/** The ring stands this far inside its mat. */
const RING_INSET = 12;

/** Where a leader ends, and the height at which it wants to leave its note. */
export interface Anchor {
  readonly ring: { readonly x: number; readonly y: number };
  readonly lineY: number;
}

/**
 * Where the leader to a mat ends. A mat at the page's outer side is reached straight from the margin; to any
 * other the leader runs in the gap above it and bends down into it, so that it crosses no picture.
 *
 * @param others - rectangles of the other mats.
 */
export function anchorOf(rect: Rect, others: readonly Rect[], side: 'left' | 'right'): Anchor {
  const x = side === 'left' ? rect.x + RING_INSET : rect.x + rect.width - RING_INSET;
  const straight = rect.y + Math.min(rect.height / 2, 40);
  const isBetween = (other: Rect): boolean =>
    other.y < straight && straight < other.y + other.height && (side === 'left' ? other.x + other.width <= rect.x + 1 : other.x >= rect.x + rect.width - 1);
  if (!others.some(isBetween)) return { ring: { x, y: straight }, lineY: straight };
  return { ring: { x, y: rect.y + RING_INSET }, lineY: rect.y - 3 };
}

/**
 * Places the notes of one margin beside the mats they mean: in the order of those mats, never overlapping
 * (pushed down, 24 px apart), the rest folded. Severity decides who gets a place when there is no room.
 *
 * @param anchor - where the leader to a mat ends, in px.
 * @param heightOf - a note's height in px.
 * @param bounds - top and bottom of the margin in px.
 */
export function layOutNotes(
  notes: readonly Note[],
  anchor: (matId: string) => Anchor | undefined,
  heightOf: (note: Note) => number,
  bounds: { readonly top: number; readonly bottom: number },
): NoteColumn {
  const kept = [...notes];
  const folded: Note[] = [];
  const total = (list: readonly Note[]): number => list.reduce((sum, note) => sum + heightOf(note) + SPACE_BETWEEN, -SPACE_BETWEEN);
  while (kept.length > 0 && total(kept) > bounds.bottom - bounds.top) folded.unshift(kept.pop()!);

  const wanted = kept
    .map((note) => ({ note, anchor: note.matIds.map(anchor).find((found) => found !== undefined) ?? null }))
    .sort((a, b) => (a.anchor?.lineY ?? -Infinity) - (b.anchor?.lineY ?? -Infinity));

  const tops: number[] = [];
  let next = bounds.top;
  for (const { note, anchor: at } of wanted) {
    const top = Math.max(next, at ? at.lineY - FIRST_LINE : bounds.top);
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
  return { placed: wanted.map(({ note, anchor: at }, i) => ({ note, ring: at?.ring ?? null, top: tops[i]! })), folded };
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
