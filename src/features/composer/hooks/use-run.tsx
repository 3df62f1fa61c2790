import { createContext, use, useCallback, useEffect, useState, type ReactNode } from 'react';
import type { CommandCall } from '#shared/commands/calls';
import { reasonSentence } from '#shared/words/en/commands';
import { useComposerStore } from './composer-context';

const SHOWN_FOR_MS = 6000;

interface Refusals {
  readonly sentence: string | null;
  readonly tell: (sentence: string | null) => void;
}
const RefusalContext = createContext<Refusals>({ sentence: null, tell: () => undefined });

/** Holds the one sentence that says why the last command did nothing. */
export function RefusalProvider({ children }: { children: ReactNode }) {
  const [sentence, tell] = useState<string | null>(null);
  useEffect(() => {
    if (!sentence) return undefined;
    const timer = setTimeout(() => tell(null), SHOWN_FOR_MS);
    return () => clearTimeout(timer);
  }, [sentence]);
  return <RefusalContext value={{ sentence, tell }}>{children}</RefusalContext>;
}

/** Why the last command did nothing, said aloud and shown for a few seconds. */
export function RefusalLine() {
  const { sentence } = use(RefusalContext);
  return (
    <p className="refusal" role="status">
      {sentence}
    </p>
  );
}

/** Shows a sentence where refused commands are told; null takes it away. */
export const useTell = (): ((sentence: string | null) => void) => use(RefusalContext).tell;

/** Runs a command; where it can do nothing, says why instead of staying silent. */
export function useRun(): (call: CommandCall) => boolean {
  const store = useComposerStore();
  const { tell } = use(RefusalContext);
  return useCallback(
    (call) => {
      const reason = store.getState().whyNot(call);
      tell(reason && reason !== 'nothing-to-do' ? reasonSentence(reason) : null);
      return store.getState().run(call);
    },
    [store, tell],
  );
}
