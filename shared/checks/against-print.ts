import { paperOf } from '../geometry/keep-zone';
import { turnedSize } from '../geometry/paper';
import { area } from '../geometry/rects';
import type { Mat } from '../model/spread';
import { defineCheck, type Finding, type Remedy, type SpreadView } from './check';
import { piecesOf, type Piece } from './pieces';
import { shapeOf, swap, turnMat, type Shape } from './shapes';

/**
 * A flat print trimmed to an upright photo, or the other way round. A small piece of a print may well have
 * another shape than the whole: below `part` of the paper the check is silent. So it is for squares and panes.
 */
export const againstPrint = defineCheck({
  id: 'against-print',
  severity: 'consider',
  basis: { kind: 'common-practice' },
  needsFilledPages: false,
  yieldsTo: ['keep-zone-cut', 'never-cut', 'window-off-paper', 'print-smaller-than-photo'],
  thresholds: { part: { default: 0.4, min: 0.1, max: 0.9, unit: 'share' } },
  find: (view, { part }) =>
    piecesOf(view).flatMap((piece): Finding[] => {
      const mat = view.matById.get(piece.matIds[0]!);
      const shapes = mat && shapesOf(piece);
      if (!mat || !shapes || !isAgainst(shapes) || area(piece.window) < part * area(paperOf(piece.print, piece.placement))) return [];
      return [
        {
          messageId: 'against-print',
          data: { title: piece.print.title, isUpright: shapes.print === 'upright' },
          matIds: piece.matIds,
          remedies: () => [...turnPicture(piece, mat), ...turnMat(view, mat), ...swapBoth(view, mat, shapes)],
        },
      ];
    }),
});

interface Shapes {
  /** As it lies on the page. */
  readonly print: Shape;
  readonly photo: Shape;
}

/** Null for panes and for prints mounted whole. */
export function shapesOf({ placement, groupId, print, window }: Piece): Shapes | null {
  if (groupId !== null || placement.mode === 'whole') return null;
  return { print: shapeOf(turnedSize(paperOf(print, placement), placement.turn)), photo: shapeOf(turnedSize(window, placement.turn)) };
}

export const isAgainst = ({ print, photo }: Shapes): boolean => print !== 'square' && photo !== 'square' && print !== photo;

/** A picture that has no up is turned to suit its mat. */
function turnPicture({ print, placement }: Piece, mat: Mat): Remedy[] {
  if (!print.marks.noUp) return [];
  return [{ messageId: 'turn-picture', data: {}, call: { id: 'placement.turn', args: { matId: mat.id, turn: placement.turn === 0 ? 1 : 0 } } }];
}

/** A print on the same page that lies against its mat the other way: each has the other's place. */
function swapBoth(view: SpreadView, mat: Mat, { print, photo }: Shapes): Remedy[] {
  return piecesOf(view).flatMap((other): Remedy[] => {
    const shapes = shapesOf(other);
    const place = view.matById.get(other.matIds[0]!);
    const suits = shapes && place && place.id !== mat.id && shapes.print === photo && shapes.photo === print;
    return suits ? [swap(mat, place)] : [];
  });
}
