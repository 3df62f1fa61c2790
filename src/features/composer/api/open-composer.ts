import type { SpreadDetail } from '#shared/contracts/albums';
import { newId } from '@/lib/ids';
import { browserClock, browserDrafts, listenToPage } from '@/features/composer/model/browser';
import { createComposerStore, type ComposerStore } from '@/features/composer/model/composer-store';
import { getEdits, postEdits } from './spread-queries';

/** Opens the editor on a spread: its store, tied to this browser's page, clock and storage. */
export function openComposer(detail: SpreadDetail): { store: ComposerStore; close: () => void } {
  const store = createComposerStore(detail, { postEdits, getEdits, newId, clock: browserClock, drafts: browserDrafts, listenToPage });
  return { store, close: () => void store.getState().close() };
}
