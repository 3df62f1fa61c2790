import { turnedSize } from '../geometry/paper';
import { inches } from '../model/length';
import { defineCheck, type Finding } from './check';
import { cardOf } from './keep-zone-remedies';
import { paperOf } from '../geometry/keep-zone';
import { piecesOf } from './pieces';

/** A whole print whose card shows much more beside it than above it, or the other way round. */
export const wholeLopsided = defineCheck({
  id: 'whole-lopsided',
  severity: 'consider',
  basis: { kind: 'common-practice' },
  needsFilledPages: false,
  yieldsTo: ['whole-overhangs'],
  thresholds: { difference: { default: inches(1 / 2), min: inches(1 / 8), max: inches(3), unit: 'length' } },
  find: (view, { difference }) =>
    piecesOf(view).flatMap((piece): Finding[] => {
      const mat = view.matById.get(piece.matIds[0]!);
      if (!mat || piece.placement.mode !== 'whole') return [];
      const paper = turnedSize(paperOf(piece.print, piece.placement), piece.placement.turn);
      const card = cardOf(view, mat);
      const beside = Math.floor((card.width - paper.width) / 2);
      const above = Math.floor((card.height - paper.height) / 2);
      if (Math.abs(beside - above) <= difference) return [];
      return [{ messageId: 'whole-lopsided', data: { title: piece.print.title, beside, above }, matIds: piece.matIds }];
    }),
});
