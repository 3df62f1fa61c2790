import { z } from 'zod';
import { instantSchema, idSchema, revisionSchema } from '#shared/contracts/common';
import { editSchema } from '#shared/contracts/edits';

/** Edits that the server has not confirmed, as the browser keeps them. */
export const draftSchema = z.object({
  spreadId: idSchema,
  /** The tab that made them, so that two tabs never write over each other's. */
  tabId: idSchema,
  baseRevision: revisionSchema,
  edits: z.array(editSchema),
  /** The last change. */
  at: instantSchema,
});
export type Draft = z.infer<typeof draftSchema>;

/** Where unsaved edits are kept. Writing is synchronous, so that a crash loses only what was not shown yet. */
export interface DraftStore {
  /** Every draft of the spread that can be read, the oldest first. */
  readonly list: (spreadId: string) => readonly Draft[];
  /** @returns false where the browser would not keep it (full, or storage blocked). */
  readonly write: (draft: Draft) => boolean;
  readonly clear: (spreadId: string, tabId: string) => void;
}

type WebStorage = Pick<Storage, 'getItem' | 'setItem' | 'removeItem' | 'key' | 'length'>;

const PREFIX = 'pairleaf.draft';
const keyOf = (spreadId: string, tabId: string): string => `${PREFIX}.${spreadId}.${tabId}`;

/** Drafts in the browser's own storage; what cannot be read there is skipped, never thrown. */
export function storedDrafts(storage: () => WebStorage): DraftStore {
  const attempt = <T>(work: (store: WebStorage) => T, otherwise: T): T => {
    try {
      return work(storage());
    } catch {
      // Storage may be full or blocked by the browser's settings; composing goes on without a draft.
      return otherwise;
    }
  };
  return {
    list: (spreadId) =>
      attempt((store) => {
        const keys = Array.from({ length: store.length }, (_, i) => store.key(i) ?? '');
        return keys
          .filter((key) => key.startsWith(`${PREFIX}.${spreadId}.`))
          .flatMap((key) => readDraft(store.getItem(key)))
          .sort((a, b) => (a.at < b.at ? -1 : 1));
      }, [] as Draft[]),
    write: (draft) =>
      attempt((store) => {
        store.setItem(keyOf(draft.spreadId, draft.tabId), JSON.stringify(draft));
        return true;
      }, false),
    clear: (spreadId, tabId) => attempt((store) => store.removeItem(keyOf(spreadId, tabId)), undefined),
  };
}

function readDraft(text: string | null): Draft[] {
  if (!text) return [];
  try {
    const parsed = draftSchema.safeParse(JSON.parse(text));
    return parsed.success ? [parsed.data] : [];
  } catch {
    return [];
  }
}
