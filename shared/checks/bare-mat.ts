import { contentRect } from '../geometry/grid';
import { neededOf, paperOf } from '../geometry/keep-zone';
import { turnedSize } from '../geometry/paper';
import { area } from '../geometry/rects';
import { canHold } from '../geometry/window';
import { mustStayWhole } from '../model/must-stay-whole';
import type { Print } from '../model/print';
import { copiesUsed } from '../model/print-use';
import type { Size } from '../model/rect';
import type { TrimSettings } from '../model/spread';
import { defineCheck, type Finding, type SpreadView } from './check';

/** A mat that carries nothing, once the pages are filled otherwise. Says how many prints of the table fit it. */
export const bareMat = defineCheck({
  id: 'bare-mat',
  severity: 'fix',
  basis: { kind: 'common-practice' },
  needsFilledPages: true,
  thresholds: {},
  find: (view) => {
    const bare = view.doc.mats.filter((mat) => mat.content.kind === 'bare');
    const ready = bare.length > 0 ? readyPrints(view) : [];
    return bare.map((mat): Finding => {
      const photo = contentRect(view.doc.format, view.doc.reveal, mat);
      const fitting = ready.filter((print) => fits(print, photo, view.trim));
      return {
        messageId: 'bare-mat',
        data: { fitting: fitting.length },
        matIds: [mat.id],
        remedies: () =>
          bestFirst(fitting, photo).map((print) => ({
            messageId: 'place-best-fit',
            data: { count: fitting.length },
            call: { id: 'prints.place', args: { printId: print.id, matId: mat.id } },
          })),
      };
    });
  },
});

/** Prints of the table of which a copy is left, in the table's order. */
function readyPrints({ doc, prints, trim, usedElsewhere }: SpreadView): Print[] {
  const used = copiesUsed(doc, trim.tolerance);
  return doc.table.flatMap((id) => {
    const print = prints.get(id);
    return print && (used.get(id) ?? 0) + (usedElsewhere[id] ?? 0) < print.copies ? [print] : [];
  });
}

/** True where the print's keep zone, or all of a print that must not be cut, fits the photo's place; turned only if it has no up. */
function fits(print: Print, photo: Size, trim: TrimSettings): boolean {
  if (print.marks.digital) return true;
  const paper = paperOf(print, AT_OWN_SIZE);
  const needed = mustStayWhole(print) ? paper : neededOf(print, AT_OWN_SIZE, trim.tolerance);
  const turns = print.marks.noUp ? ([0, 1] as const) : ([0] as const);
  return turns.some((turn) => !needed || canHold(needed, turnedSize(photo, turn), paper, trim.finestMark));
}

const AT_OWN_SIZE = { scaledWidth: null, detailId: null };

/** The print of which the least is lost first: nearest in size to the photo; ties keep the table's order. */
function bestFirst(prints: readonly Print[], photo: Size): Print[] {
  const wanted = area({ x: 0, y: 0, ...photo });
  const distance = (print: Print): number => Math.abs(Math.log((print.paperWidth * print.paperHeight) / Math.max(1, wanted)));
  return [...prints].sort((a, b) => distance(a) - distance(b)).slice(0, 3);
}
