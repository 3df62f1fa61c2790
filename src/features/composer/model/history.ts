import { findDocumentFaults } from '#shared/model/document-faults';
import { applyPatch, invertPatch, type Patch } from '#shared/model/patch';
import type { SpreadDocument } from '#shared/model/spread';

/** One step of the person's own, of whatever size: a press, a key, or a whole drag. */
export interface HistoryEntry {
  /** The command's id, such as `mats.move`. */
  readonly command: string;
  readonly patch: Patch;
}

/** Steps that can be taken back and steps that were, each with the latest last. Nothing is ever cut off. */
export interface History {
  readonly done: readonly HistoryEntry[];
  readonly undone: readonly HistoryEntry[];
}

export const EMPTY_HISTORY: History = { done: [], undone: [] };

/** A new step; what had been undone before it can no longer be redone. */
export const record = (history: History, entry: HistoryEntry): History => ({ done: [...history.done, entry], undone: [] });

export interface Step {
  readonly history: History;
  readonly entry: HistoryEntry;
  /** What the step does to the document now. */
  readonly patch: Patch;
}

/** The next step back, or null. Entries that others' edits have made impossible fall out on the way. */
export function stepBack(history: History, doc: SpreadDocument): Step | null {
  const found = lastPossible(history.done, doc, (entry) => invertPatch(entry.patch));
  return found && { ...found, history: { done: found.rest, undone: [...history.undone, found.entry] } };
}

/** The next step forward again, or null. */
export function stepForward(history: History, doc: SpreadDocument): Step | null {
  const found = lastPossible(history.undone, doc, (entry) => entry.patch);
  return found && { ...found, history: { done: [...history.done, found.entry], undone: found.rest } };
}

function lastPossible(entries: readonly HistoryEntry[], doc: SpreadDocument, patchOf: (entry: HistoryEntry) => Patch) {
  for (let i = entries.length - 1; i >= 0; i -= 1) {
    const entry = entries[i]!;
    const patch = patchOf(entry);
    if (findDocumentFaults(applyPatch(doc, patch)).length === 0) return { entry, patch, rest: entries.slice(0, i) };
  }
  return null;
}

/**
 * The history after others changed these keys: undo takes back only one's own, so what they have touched
 * since falls out of every step, and a step with nothing left goes.
 */
export function forgetKeys(history: History, keys: Iterable<string>): History {
  const gone = new Set(keys);
  if (gone.size === 0) return history;
  const keep = (entries: readonly HistoryEntry[]): HistoryEntry[] =>
    entries.flatMap((entry) => {
      const left = Object.entries(entry.patch).filter(([key]) => !gone.has(key));
      if (left.length === 0) return [];
      return left.length === Object.keys(entry.patch).length ? [entry] : [{ ...entry, patch: Object.fromEntries(left) }];
    });
  return { done: keep(history.done), undone: keep(history.undone) };
}
