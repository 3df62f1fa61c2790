import type { Edit, LoggedEdit, StaleSpread } from '#shared/contracts/edits';
import { findDocumentFaults } from '#shared/model/document-faults';
import type { MatId, Side } from '#shared/model/ids';
import { applyPatch, diffDocuments, readKey, touchedKeys, type Patch, type PatchValue } from '#shared/model/patch';
import type { SpreadDocument } from '#shared/model/spread';

/** Logged edits that are none of these (a repeated save is answered with the log, one's own edits included). */
export function foreignEdits(log: readonly LoggedEdit[], own: readonly Pick<Edit, 'id'>[]): LoggedEdit[] {
  const ids = new Set(own.map(({ id }) => id));
  return log.filter(({ id }) => !ids.has(id));
}

/** One thing that both sides changed. */
export interface Difference {
  readonly key: string;
  readonly kind: 'mat' | 'page' | 'panes' | 'reveal' | 'table' | 'scheme';
  readonly matIds: readonly MatId[];
  readonly page: Side | null;
  /** The value before either, mine now, and theirs now; null means that it is not there. */
  readonly before: PatchValue;
  readonly mine: PatchValue;
  readonly theirs: PatchValue;
}

export interface ConflictView {
  /** Names of those who made the other changes, the latest first. */
  readonly names: readonly string[];
  /** Time of their latest change. */
  readonly at: string | null;
  readonly differences: readonly Difference[];
  readonly mine: SpreadDocument;
  readonly theirs: SpreadDocument;
}

/**
 * What a person has to see before anything is overwritten. Where both changes are sound alone and not
 * together (two mats moved onto one place), no key is shared; then everything that they changed is shown.
 *
 * @param base - the document that both started from.
 */
export function describeConflict(base: SpreadDocument, mine: SpreadDocument, stale: StaleSpread): ConflictView {
  const theirs = applyEdits(base, stale.missed);
  const keys = stale.keys.length > 0 ? stale.keys : [...touchedKeys(stale.missed)].sort();
  const latestFirst = [...stale.missed].reverse();
  return {
    names: [...new Set(latestFirst.flatMap(({ userName }) => userName ?? []))],
    at: latestFirst[0]?.at ?? null,
    differences: keys.map((key) => describeKey(key, base, mine, theirs)).filter((difference) => !sameValue(difference.mine, difference.theirs)),
    mine,
    theirs,
  };
}

const sameValue = (a: PatchValue, b: PatchValue): boolean => JSON.stringify(a) === JSON.stringify(b);

export const applyEdits = (doc: SpreadDocument, edits: readonly { readonly patch: Patch }[]): SpreadDocument => edits.reduce((next, { patch }) => applyPatch(next, patch), doc);

function describeKey(key: string, base: SpreadDocument, mine: SpreadDocument, theirs: SpreadDocument): Difference {
  const values = { before: readKey(base, key), mine: readKey(mine, key), theirs: readKey(theirs, key) };
  const id = key.slice(key.indexOf('/') + 1);
  if (key.startsWith('mat/')) {
    const mat = [mine, base, theirs].flatMap((doc) => doc.mats.filter((candidate) => candidate.id === id))[0];
    return { key, kind: 'mat', matIds: [id], page: mat?.page ?? null, ...values };
  }
  if (key.startsWith('panes/')) {
    const groups = [mine, base, theirs].flatMap((doc) => doc.panes.filter((group) => group.id === id));
    return { key, kind: 'panes', matIds: groups[0]?.matIds ?? [], page: null, ...values };
  }
  if (key.startsWith('page/')) return { key, kind: 'page', matIds: [], page: id === 'left' ? 'left' : 'right', ...values };
  const kind = key === 'reveal' || key === 'table' ? key : 'scheme';
  return { key, kind, matIds: [], page: null, ...values };
}

export interface Resolution {
  /** Their document, and what leads from it to the one that is kept. */
  readonly theirs: SpreadDocument;
  readonly doc: SpreadDocument;
  readonly patch: Patch;
}

/**
 * Joins both sides. What only one side changed is kept from that side; what both changed comes from the
 * side chosen. Where the two do not make a sound spread together, the chosen side is kept whole.
 */
export function resolveConflict(base: SpreadDocument, mine: SpreadDocument, stale: StaleSpread, choice: 'mine' | 'theirs'): Resolution {
  const theirs = applyEdits(base, stale.missed);
  const own = diffDocuments(base, mine);
  const shared = touchedKeys(stale.missed);
  const kept = choice === 'mine' ? own : Object.fromEntries(Object.entries(own).filter(([key]) => !shared.has(key)));
  const joined = applyPatch(theirs, kept);
  const whole = choice === 'mine' ? mine : theirs;
  const doc = findDocumentFaults(joined).length === 0 ? joined : whole;
  return { theirs, doc, patch: diffDocuments(theirs, doc) };
}
