import { contentRect } from '../geometry/grid';
import { turnedSize } from '../geometry/paper';
import { area } from '../geometry/rects';
import { mustStayWhole } from '../geometry/smallest-mat';
import type { PrintId } from '../model/ids';
import type { Print } from '../model/print';
import type { Size } from '../model/rect';
import { defineCheck, type Finding, type SpreadView } from './check';
import { keepZoneOf, paperOf, withSpare } from './keep-zones';

/** A mat that carries nothing, once the pages are filled otherwise. Says how many prints of the table fit it. */
export const bareMat = defineCheck({
  id: 'bare-mat',
  severity: 'fix',
  basis: { kind: 'common-practice' },
  needsFilledPages: true,
  thresholds: {},
  find: (view) => {
    const ready = readyPrints(view);
    return view.doc.mats.flatMap((mat): Finding[] => {
      if (mat.content.kind !== 'bare') return [];
      const photo = contentRect(view.doc.format, view.doc.reveal, mat);
      const fitting = ready.filter((print) => fits(print, photo, view.trim.tolerance));
      return [
        {
          messageId: 'bare-mat',
          data: { fitting: fitting.length },
          matIds: [mat.id],
          remedies: () =>
            bestFirst(fitting, photo).map((print) => ({
              messageId: 'place-best-fit',
              data: { count: fitting.length },
              call: { id: 'prints.place', args: { printId: print.id, matId: mat.id } },
            })),
        },
      ];
    });
  },
});

/** Prints of the table of which a copy is left, in the table's order. */
function readyPrints({ doc, prints, usedElsewhere }: SpreadView): Print[] {
  const used = new Map<PrintId, number>();
  const placements = [...doc.mats.map((mat) => mat.content), ...doc.panes.map((group) => group.content)];
  for (const placement of placements) {
    if (placement && 'printId' in placement) used.set(placement.printId, (used.get(placement.printId) ?? 0) + 1);
  }
  return doc.table.flatMap((id) => {
    const print = prints.get(id);
    return print && (used.get(id) ?? 0) + (usedElsewhere[id] ?? 0) < print.copies ? [print] : [];
  });
}

/** True where the print's keep zone, or all of a print that must not be cut, fits the photo's place; turned only if it has no up. */
function fits(print: Print, photo: Size, tolerance: number): boolean {
  if (print.marks.digital) return true;
  const paper = paperOf(print, { scaledWidth: null });
  const keep = keepZoneOf(print, { scaledWidth: null });
  const least = mustStayWhole(print) ? paper : keep && withSpare(keep, paper, tolerance);
  const turns = print.marks.noUp ? ([0, 1] as const) : ([0] as const);
  return turns.some((turn) => {
    const needed = turnedSize(least ?? { width: 1, height: 1 }, turn);
    return needed.width <= photo.width && needed.height <= photo.height;
  });
}

/** The print of which the least is lost first: nearest in size to the photo; ties keep the table's order. */
function bestFirst(prints: readonly Print[], photo: Size): Print[] {
  const wanted = area({ x: 0, y: 0, ...photo });
  const distance = (print: Print): number => Math.abs(Math.log((print.paperWidth * print.paperHeight) / Math.max(1, wanted)));
  return [...prints].sort((a, b) => distance(a) - distance(b)).slice(0, 3);
}
