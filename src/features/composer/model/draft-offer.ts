import type { Edit, LoggedEdit, StaleSpread } from '#shared/contracts/edits';
import { findDocumentFaults } from '#shared/model/document-faults';
import { applyPatch, invertPatch, readKey, touchedByBoth } from '#shared/model/patch';
import type { SpreadDocument } from '#shared/model/spread';
import type { AutosaveDeps, Base } from './autosave';
import { applyEdits, foreignEdits } from './conflict';
import type { Draft } from './drafts';

/**
 * The oldest draft of an earlier visit that holds anything which the server has not got. A save may have
 * reached the server although its answer never came back; such drafts are cleared without a word.
 */
export async function findDraft(spreadId: string, ownTabId: string, deps: Pick<AutosaveDeps, 'drafts' | 'getEdits'>): Promise<Draft | null> {
  for (const draft of deps.drafts.list(spreadId)) {
    if (draft.tabId === ownTabId) continue;
    const log = await deps.getEdits(spreadId, draft.baseRevision).catch(() => []);
    if (unsavedEdits(draft, log).length > 0) return draft;
    deps.drafts.clear(draft.spreadId, draft.tabId);
  }
  return null;
}

const unsavedEdits = (draft: Draft, log: readonly LoggedEdit[]): Edit[] => {
  const saved = new Set(log.map(({ id }) => id));
  return draft.edits.filter(({ id }) => !saved.has(id));
};

export interface JoinedDraft {
  readonly base: Base;
  readonly edits: readonly Edit[];
  readonly conflict: StaleSpread | null;
}

/**
 * A draft put on top of the spread as it is now; or, where others have changed the same things since, on
 * the spread as it was, with the conflict that the person has to decide.
 *
 * @param log - all edits after the draft's base revision.
 */
export function joinDraft(now: Base, draft: Draft, log: readonly LoggedEdit[]): JoinedDraft {
  const edits = unsavedEdits(draft, log);
  const foreign = foreignEdits(log, draft.edits);
  if (joinsSoundly(now.doc, edits)) return { base: now, edits, conflict: null };
  const doc = [...foreign].reverse().reduce((before, { patch }) => applyPatch(before, invertPatch(patch)), now.doc);
  return {
    base: { doc, revision: draft.baseRevision },
    edits,
    conflict: { revision: now.revision, keys: touchedByBoth(edits, foreign), missed: foreign },
  };
}

function joinsSoundly(doc: SpreadDocument, edits: readonly Edit[]): boolean {
  let next = doc;
  for (const { patch } of edits) {
    const isAsItWas = Object.entries(patch).every(([key, { before }]) => JSON.stringify(readKey(next, key)) === JSON.stringify(before));
    if (!isAsItWas) return false;
    next = applyPatch(next, patch);
  }
  return findDocumentFaults(applyEdits(doc, edits)).length === 0;
}
