import type { Mat, Page, PaneGroup, Scheme, SpreadDocument } from './spread';
import type { PrintId } from './ids';

export type PatchValue = Mat | Page | PaneGroup | Scheme | readonly PrintId[] | number | null;

/** What an edit did to one key; `null` means absent. */
export interface Change {
  readonly before: PatchValue;
  readonly after: PatchValue;
}

/**
 * What one edit changed, by document key: `page/left`, `page/right`, `reveal`, `table`, `scheme`, `mat/ID`, `panes/ID`.
 * MODEL.md 6. Undo is the same data with each pair swapped.
 */
export type Patch = Readonly<Record<string, Change>>;

/** The value at a key, or null where it is absent. @throws RangeError for a key that no document has. */
export function readKey(doc: SpreadDocument, key: string): PatchValue {
  if (key.startsWith('mat/')) return doc.mats.find((mat) => mat.id === key.slice(4)) ?? null;
  if (key.startsWith('panes/')) return doc.panes.find((group) => group.id === key.slice(6)) ?? null;
  switch (key) {
    case 'page/left':
      return doc.pages.left;
    case 'page/right':
      return doc.pages.right;
    case 'reveal':
      return doc.reveal;
    case 'table':
      return doc.table;
    case 'scheme':
      return doc.scheme;
    default:
      throw new RangeError(`no such document key: ${key}`);
  }
}

type HasId = { readonly id: string };
export const inIdOrder = (a: HasId, b: HasId): number => (a.id < b.id ? -1 : 1);

/** Drawing order: by z, then by id so that every machine agrees. */
export const inDrawingOrder = (a: Mat, b: Mat): number => a.z - b.z || inIdOrder(a, b);

/** The document with every `after` in place; mats stay in drawing order. Does not look at `before`. */
export function applyPatch(doc: SpreadDocument, patch: Patch): SpreadDocument {
  const keys = Object.keys(patch);
  if (keys.length === 0) return doc;
  const mats = new Map<string, Mat | null>();
  const panes = new Map<string, PaneGroup | null>();
  let next: SpreadDocument = doc;
  for (const key of keys) {
    const after = patch[key]!.after;
    if (key.startsWith('mat/')) mats.set(key.slice(4), after as Mat | null);
    else if (key.startsWith('panes/')) panes.set(key.slice(6), after as PaneGroup | null);
    else next = writeKey(next, key, after);
  }
  if (mats.size > 0) next = { ...next, mats: merge(next.mats, mats).sort(inDrawingOrder) };
  if (panes.size > 0) next = { ...next, panes: merge(next.panes, panes).sort(inIdOrder) };
  return next;
}

function writeKey(doc: SpreadDocument, key: string, after: PatchValue): SpreadDocument {
  switch (key) {
    case 'page/left':
      return { ...doc, pages: { ...doc.pages, left: after as Page | null } };
    case 'page/right':
      return { ...doc, pages: { ...doc.pages, right: after as Page | null } };
    case 'reveal':
      return { ...doc, reveal: after as number };
    case 'table':
      return { ...doc, table: (after ?? []) as readonly PrintId[] };
    case 'scheme':
      return { ...doc, scheme: after as Scheme | null };
    default:
      throw new RangeError(`no such document key: ${key}`);
  }
}

function merge<T extends HasId>(list: readonly T[], changes: Map<string, T | null>): T[] {
  const kept = list.flatMap((item) => {
    const changed = changes.get(item.id);
    return changed === undefined ? [item] : changed === null ? [] : [changed];
  });
  const known = new Set(list.map((item) => item.id));
  const added = [...changes].flatMap(([id, item]) => (item && !known.has(id) ? [item] : []));
  return [...kept, ...added];
}

/** The patch that undoes `patch`. */
export function invertPatch(patch: Patch): Patch {
  return Object.fromEntries(
    Object.entries(patch).map(([key, { before, after }]) => [key, { before: after, after: before }]),
  );
}

/** What leads from one document to another: every key whose value differs. */
export function diffDocuments(from: SpreadDocument, to: SpreadDocument): Patch {
  const keys = new Set<string>(['page/left', 'page/right', 'reveal', 'table', 'scheme']);
  for (const doc of [from, to]) {
    for (const mat of doc.mats) keys.add(`mat/${mat.id}`);
    for (const group of doc.panes) keys.add(`panes/${group.id}`);
  }
  const patch: Record<string, Change> = {};
  for (const key of keys) {
    const before = readKey(from, key);
    const after = readKey(to, key);
    if (before !== after && JSON.stringify(before) !== JSON.stringify(after)) patch[key] = { before, after };
  }
  return patch;
}

/** Two patches, one after the other, as one; a key that ends where it began falls out. */
export function composePatches(first: Patch, second: Patch): Patch {
  const out: Record<string, Change> = { ...first };
  for (const [key, change] of Object.entries(second)) {
    const earlier = out[key];
    const before = earlier ? earlier.before : change.before;
    if (JSON.stringify(before) === JSON.stringify(change.after)) delete out[key];
    else out[key] = { before, after: change.after };
  }
  return out;
}

/** Every key that one of these edits touches. */
export const touchedKeys = (edits: readonly { readonly patch: Patch }[]): Set<string> => new Set(edits.flatMap(({ patch }) => Object.keys(patch)));

/** The keys that edits on both sides touch, sorted. */
export function touchedByBoth(some: readonly { readonly patch: Patch }[], others: readonly { readonly patch: Patch }[]): string[] {
  const keys = touchedKeys(some);
  return [...touchedKeys(others)].filter((key) => keys.has(key)).sort();
}
