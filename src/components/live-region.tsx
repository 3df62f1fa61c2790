import { createContext, use, useCallback, useState, type ReactNode } from 'react';

const AnnounceContext = createContext<(words: string) => void>(() => undefined);

/** Says words to a screen reader. The same words twice are said twice. */
export const useAnnounce = (): ((words: string) => void) => use(AnnounceContext);

/** Holds the page's one polite live region. */
export function LiveRegion({ children }: { readonly children: ReactNode }) {
  const [said, setSaid] = useState({ words: '', times: 0 });
  const announce = useCallback((words: string) => setSaid(({ times }) => ({ words, times: times + 1 })), []);
  return (
    <AnnounceContext value={announce}>
      {children}
      {/* Two regions take turns, since an unchanged text would not be read again. */}
      <div className="sr-only" role="status" aria-live="polite">
        <p>{said.times % 2 === 1 ? said.words : ''}</p>
        <p>{said.times % 2 === 0 ? said.words : ''}</p>
      </div>
    </AnnounceContext>
  );
}
