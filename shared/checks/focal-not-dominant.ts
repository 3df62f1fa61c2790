import { matRect } from '../geometry/grid';
import { area } from '../geometry/rects';
import { defineCheck, type Finding } from './check';
import { declaredFocals, picturesBySize } from './focals';

/** A declared focal that another picture of its page outweighs in size. */
export const focalNotDominant = defineCheck({
  id: 'focal-not-dominant',
  severity: 'consider',
  basis: { kind: 'common-practice' },
  needsFilledPages: true,
  thresholds: { dominance: { default: 1, min: 0.5, max: 3, unit: 'ratio' } },
  find: (view, { dominance }) =>
    declaredFocals(view).flatMap((focal): Finding[] => {
      const isSplit = focal.mat.content.kind === 'pane';
      const rival = picturesBySize(view).find(({ mat }) => mat.page === focal.page && mat.id !== focal.mat.id && !sharesGroup(mat, focal.mat));
      const own = isSplit ? area(focal.rect) : area(matRect(view.doc.format, focal.mat));
      if (!rival || own >= dominance * rival.area) return [];
      const { width, height } = focal.rect;
      return [
        {
          messageId: 'focal-not-dominant',
          data: { width, height },
          matIds: [focal.mat.id, rival.mat.id],
          remedies: () => [{ messageId: 'make-focal', data: { matId: rival.mat.id }, call: { id: 'mats.setFocal', args: { matId: rival.mat.id, focal: true } } }],
        },
      ];
    }),
});

function sharesGroup(a: { readonly content: { readonly kind: string; readonly groupId?: string } }, b: typeof a): boolean {
  return a.content.kind === 'pane' && b.content.kind === 'pane' && a.content.groupId === b.content.groupId;
}
