import { gridOf } from '../geometry/grid';
import { defineCheck, type Finding, type SpreadView } from './check';
import { weighedUnits, type WeighedUnit } from './focals';

/**
 * A mat so heavy that it acts as the focal though another is declared: it weighs more than `pull` times the
 * declared focal of its page or, on a page without one, of the spread. Says only the heaviest. Paper that
 * backs half a page or more is ground, and bare mats are noted as such.
 */
export const undeclaredFocal = defineCheck({
  id: 'undeclared-focal',
  severity: 'consider',
  basis: { kind: 'common-practice' },
  needsFilledPages: true,
  yieldsTo: ['focal-not-dominant'],
  thresholds: { pull: { default: 1.25, min: 1.05, max: 4, unit: 'ratio' } },
  find: (view, { pull }): Finding[] => {
    const units = weighedUnits(view).filter(({ page }) => view.doc.pages[page]);
    const focals = units.filter(({ isFocal }) => isFocal);
    if (focals.length === 0) return [];
    const reference = (unit: WeighedUnit): WeighedUnit => focals.find(({ page }) => page === unit.page) ?? heaviest(focals)!;
    const rival = heaviest(units.filter((unit) => !unit.isFocal && !isGround(view, unit) && unit.weight > pull * reference(unit).weight));
    if (!rival) return [];
    return [
      {
        messageId: 'undeclared-focal',
        data: {},
        matIds: [rival.mat.id, reference(rival).mat.id],
        remedies: () => [{ messageId: 'make-focal', data: { matId: rival.mat.id }, call: { id: 'mats.setFocal', args: { matId: rival.mat.id, focal: true } } }],
      },
    ];
  },
});

const heaviest = (units: readonly WeighedUnit[]): WeighedUnit | null => units.reduce<WeighedUnit | null>((a, b) => (a && a.weight >= b.weight ? a : b), null);

function isGround({ doc }: SpreadView, { mat }: WeighedUnit): boolean {
  const { columns, rows } = gridOf(doc.format);
  return mat.content.kind === 'bare' || (mat.content.kind === 'paper' && mat.w * mat.h >= (columns * rows) / 2);
}
