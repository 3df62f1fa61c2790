import { createContext, use } from 'react';
import type { StashIndex } from '#shared/colour/snap';

const StashContext = createContext<StashIndex | null>(null);

/** The studio's sheets for the schemes; null until they are known, and for whoever may not see them. */
export const StashProvider = StashContext.Provider;

export const useStash = (): StashIndex | null => use(StashContext);
