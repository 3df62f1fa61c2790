import { isAgainst, shapesOf } from './against-print';
import { defineCheck, type Finding } from './check';
import { piecesOf } from './pieces';
import { turnMat } from './shapes';

/** All photos of the spread lie the same way, flat or upright, though the prints do not. Squares, panes and whole prints do not count. */
export const orientationsAlike = defineCheck({
  id: 'orientations-alike',
  severity: 'consider',
  basis: { kind: 'common-practice' },
  needsFilledPages: true,
  yieldsTo: ['against-print'],
  thresholds: { photos: { default: 4, min: 2, max: 20, unit: 'count' } },
  find: (view, { photos: least }): Finding[] => {
    const pieces = piecesOf(view).flatMap((piece) => {
      const shapes = shapesOf(piece);
      return shapes && shapes.photo !== 'square' ? [{ piece, shapes }] : [];
    });
    const first = pieces[0];
    if (!first || pieces.length < least || !pieces.every(({ shapes }) => shapes.photo === first.shapes.photo)) return [];
    const against = pieces.filter(({ shapes }) => isAgainst(shapes));
    if (against.length === 0) return [];
    const mats = against.flatMap(({ piece }) => view.matById.get(piece.matIds[0]!) ?? []);
    return [
      {
        messageId: 'orientations-alike',
        data: { areUpright: first.shapes.photo === 'upright', others: against.length },
        matIds: mats.map((mat) => mat.id),
        remedies: () => mats.flatMap((mat) => turnMat(view, mat)),
      },
    ];
  },
});
