import { UNITS_PER_INCH } from '../model/length';
import { turnedSize } from '../geometry/paper';
import { placedPaper } from '../geometry/window';
import { defineCheck, type Finding } from './check';
import { piecesOf } from './pieces';

/** Below this a digital photo is noted; print files refuse one below 200 ppi. PRODUCT.md section 3; common practice of photo labs. */
const NOTED_PPI = 300;

/** A digital photo with too few pixels to the inch at the size at which it is placed. */
export const lowResolution = defineCheck({
  id: 'low-resolution',
  severity: 'consider',
  basis: { kind: 'common-practice' },
  needsFilledPages: false,
  thresholds: { ppi: { default: NOTED_PPI, min: 100, max: 600, unit: 'points' } },
  find: (view, { ppi }) =>
    piecesOf(view).flatMap((piece): Finding[] => {
      const { print, placement } = piece;
      if (!print.marks.digital) return [];
      const pixels = turnedSize(print.paperRect, print.turns);
      const found = Math.floor((pixels.width * UNITS_PER_INCH) / placedPaper(print, placement).width);
      return found < ppi ? [{ messageId: 'low-resolution', data: { title: print.title, ppi: found }, matIds: piece.matIds }] : [];
    }),
});
