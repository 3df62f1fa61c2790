import { createContext, useContext } from 'react';
import { useStore } from 'zustand';
import type { ComposerState, ComposerStore } from '@/features/composer/model/composer-store';

const ComposerContext = createContext<ComposerStore | null>(null);
export const ComposerProvider = ComposerContext.Provider;

/** The open spread's store. @throws Error outside a spread's layout. */
export function useComposerStore(): ComposerStore {
  const store = useContext(ComposerContext);
  if (!store) throw new Error('useComposerStore needs a ComposerProvider above it');
  return store;
}

/** A part of the open spread's state; renders again only when that part changes. */
export function useComposer<T>(select: (state: ComposerState) => T): T {
  return useStore(useComposerStore(), select);
}
