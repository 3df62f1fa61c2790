import type { Note, Severity } from './check';

/** A note must be found for so long, without a break, before it appears under a moving hand. */
export const APPEARS_AFTER_MS = 250;
/** A note must be gone for so long, without a break, before it leaves under a moving hand. */
export const LEAVES_AFTER_MS = 500;

/** What is shown, and what is about to change. */
export interface SteadyNotes {
  readonly shown: readonly Note[];
  /** By note key: since when it is found and not shown, or shown and not found. */
  readonly since: ReadonlyMap<string, number>;
  /** When something changes although nobody moves; null where nothing is pending. */
  readonly nextAt: number | null;
}

export const NOTHING_SHOWN: SteadyNotes = { shown: [], since: new Map(), nextAt: null };

/**
 * Notes that do not flicker while something is dragged. The rule: while the hand holds something, a stop comes
 * and goes at once, since the hand must know what a drop would spoil; any other note comes after it was found
 * for 250 ms and goes after it was missing for 500 ms, both without a break, and a note that is about to go keeps
 * its last words but offers no remedy. When the hand lets go, the notes are what was found.
 *
 * @param found - the notes of the spread as it stands, in their order, which is kept.
 * @param atMs - any clock that only goes forward.
 */
export function steadyNotes(last: SteadyNotes, found: readonly Note[], { isHeld, atMs }: { readonly isHeld: boolean; readonly atMs: number }): SteadyNotes {
  if (!isHeld) return { shown: found, since: new Map(), nextAt: null };
  const shownBefore = new Set(last.shown.map((note) => note.key));
  const foundNow = new Set(found.map((note) => note.key));
  const since = new Map<string, number>();
  const isDue = (note: Note, delayMs: number): boolean => {
    if (note.severity === 'stop') return true;
    const from = last.since.get(note.key) ?? atMs;
    if (atMs - from >= delayMs) return true;
    since.set(note.key, from);
    return false;
  };
  const kept = found.filter((note) => shownBefore.has(note.key) || isDue(note, APPEARS_AFTER_MS));
  const leaving = last.shown.filter((note) => !foundNow.has(note.key) && !isDue(note, LEAVES_AFTER_MS));
  const waits = [...since].map(([key, from]) => from + (foundNow.has(key) ? APPEARS_AFTER_MS : LEAVES_AFTER_MS));
  return {
    shown: weave(kept, leaving.map((note) => ({ ...note, remedy: null }))),
    since,
    nextAt: waits.length > 0 ? Math.min(...waits) : null,
  };
}

const ORDER: Readonly<Record<Severity, number>> = { stop: 0, fix: 1, consider: 2 };

/** Leaving notes stand last within their severity. */
function weave(kept: readonly Note[], leaving: readonly Note[]): Note[] {
  return [...kept, ...leaving].sort((a, b) => ORDER[a.severity] - ORDER[b.severity]);
}
