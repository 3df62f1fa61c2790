import { defineCheck, type Finding } from './check';
import type { MotifKind } from './messages';
import { sharedAcross } from './shared-across';

/**
 * The very same motif on both pages, in the same shape at the same place, or the very same arrangement of all
 * mats: an echo wants to be moved, mirrored, turned or resized. Only what is `copied`, not what is `related`.
 */
export const motifCopied = defineCheck({
  id: 'motif-copied',
  severity: 'consider',
  basis: { kind: 'common-practice' },
  needsFilledPages: true,
  thresholds: { mats: { default: 2, min: 2, max: 12, unit: 'count' } },
  find: (view, { mats: least }) =>
    sharedAcross(view).flatMap(({ kind, relation, matIds }): Finding[] =>
      relation === 'copied' && matIds.length >= 2 * least && isMotif(kind) ? [{ messageId: 'motif-copied', data: { motif: kind }, matIds }] : [],
    ),
});

const isMotif = (kind: string): kind is MotifKind => kind !== 'size' && kind !== 'paper' && kind !== 'color';
