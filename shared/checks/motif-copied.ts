import { defineCheck, type Finding } from './check';
import { footprint, motifsOf } from './motifs';

/** The very same motif on both pages, in the same shape at the same place: an echo wants to be moved, turned or resized. */
export const motifCopied = defineCheck({
  id: 'motif-copied',
  severity: 'consider',
  basis: { kind: 'common-practice' },
  needsFilledPages: true,
  thresholds: {},
  find: (view) => {
    const motifs = motifsOf(view);
    const left = new Map(motifs.flatMap((motif) => (motif.page === 'left' ? [[`${motif.kind} ${footprint(motif)}`, motif] as const] : [])));
    return motifs.flatMap((motif): Finding[] => {
      const twin = motif.page === 'right' ? left.get(`${motif.kind} ${footprint(motif)}`) : undefined;
      if (!twin) return [];
      const matIds = [...twin.mats, ...motif.mats].map((mat) => mat.id);
      return [{ messageId: 'motif-copied', data: { motif: motif.kind }, matIds }];
    });
  },
});
