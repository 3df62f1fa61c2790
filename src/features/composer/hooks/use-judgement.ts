import { useMemo } from 'react';
import type { Note, SpreadView } from '#shared/checks/check';
import { joinSettings } from '#shared/checks/join-settings';
import { runChecks } from '#shared/checks/run-checks';
import { viewSpread } from '#shared/checks/view-spread';
import { weighSpread } from '#shared/checks/weight';
import { useComposer } from './composer-context';

export interface Judgement {
  readonly view: SpreadView;
  readonly notes: readonly Note[];
  readonly left: number;
  readonly right: number;
}

/** The notes and weights of the spread as it stands at this moment, in the middle of a drag as well. */
export function useJudgement(): Judgement {
  const doc = useComposer((state) => state.doc);
  const prints = useComposer((state) => state.prints);
  const trim = useComposer((state) => state.trim);
  const usedElsewhere = useComposer((state) => state.usedElsewhere);
  const checks = useComposer((state) => state.checks);
  const settings = useMemo(() => joinSettings(checks.studio, checks.spread), [checks]);
  return useMemo(() => {
    const view = viewSpread({ doc, prints, trim, usedElsewhere });
    const { left, right } = weighSpread(view);
    return { view, notes: runChecks(view, settings), left, right };
  }, [doc, prints, trim, usedElsewhere, settings]);
}

/** The stop that speaks of this mat, if one does. */
export const stopOn = (notes: readonly Note[], matId: string): Note | undefined =>
  notes.find((note) => note.severity === 'stop' && note.matIds.includes(matId));
