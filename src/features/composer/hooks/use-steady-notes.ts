import { useEffect, useState } from 'react';
import type { Note } from '#shared/checks/check';
import { NOTHING_SHOWN, steadyNotes } from '#shared/checks/steady-notes';

/** The notes without flicker while a hand holds something (`steadyNotes` has the rule), and as they are otherwise. */
export function useSteadyNotes(found: readonly Note[], isHeld: boolean): readonly Note[] {
  const [steady, setSteady] = useState(NOTHING_SHOWN);
  const { nextAt } = steady;
  useEffect(() => {
    const look = (): void => setSteady((last) => steadyNotes(last, found, { isHeld, atMs: performance.now() }));
    look();
    if (nextAt === null) return undefined;
    const timer = setTimeout(look, Math.max(0, nextAt - performance.now()));
    return () => clearTimeout(timer);
  }, [found, isHeld, nextAt]);
  return isHeld ? steady.shown : found;
}
