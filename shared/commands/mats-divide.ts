import { cellBox, type Cells } from '../geometry/cells';
import type { Mat, PaneGroup, SpreadDocument } from '../model/spread';
import { refuse, type CommandRun } from './command';
import { groupOf, matOf, matsInReadingOrder, matsOf, withGroup, withMats } from './edit-mats';
import { frameOfMat } from './fit-print';
import { carryPicture, frameAt, pictureAt, type Place } from './pictures';

/**
 * One mat as columns × rows of smaller ones, which differ by a step at most; the first piece is the old
 * mat. A print becomes a split print over all the pieces and a pane becomes so many panes; anything else
 * stays on the first piece.
 */
export const splitMat: CommandRun<'mats.split'> = (doc, { matId, columns, rows }, context) => {
  const mat = matOf(doc, matId);
  if (!mat) return refuse('no-such-mat');
  const pieces = divide(mat, Math.round(columns), Math.round(rows)).map(
    (cells, i): Mat => ({ ...mat, ...cells, trueSize: null, ...(i > 0 && { id: context.newId(), focal: false }) }),
  );
  if (pieces.length === 0) return refuse('too-small-to-split');
  if (pieces.length === 1) return refuse('nothing-to-do');

  const ids = pieces.map((piece) => piece.id);
  const put = (content: (i: number) => Mat['content']): SpreadDocument =>
    withMats(doc, [...doc.mats.filter((other) => other.id !== matId), ...pieces.map((piece, i) => ({ ...piece, content: content(i) }))]);

  const group = groupOf(doc, mat);
  if (group) return withGroup(put(() => mat.content), { ...group, matIds: [...group.matIds, ...ids.slice(1)] });
  if (mat.content.kind !== 'print') return put((i) => (i === 0 ? mat.content : { kind: 'bare' }));
  const split: PaneGroup = { id: context.newId(), matIds: ids, content: null };
  const next = withGroup(put(() => ({ kind: 'pane', groupId: split.id })), split);
  return carryPicture(next, { mat: null, group: split }, pictureAt({ mat, group: null }), frameOfMat(doc, mat).photo, context);
};

/** Columns × rows rectangles that fill the cells, row by row; empty where a piece would have no step. */
function divide(cells: Cells, columns: number, rows: number): Cells[] {
  if (!(columns >= 1 && rows >= 1 && columns <= cells.w && rows <= cells.h)) return [];
  const cut = (length: number, parts: number, i: number): number => Math.round((length * i) / parts);
  return Array.from({ length: columns * rows }, (_, i) => {
    const column = i % columns;
    const row = Math.floor(i / columns);
    const left = cut(cells.w, columns, column);
    const top = cut(cells.h, rows, row);
    return {
      x: cells.x + left,
      y: cells.y + top,
      w: cut(cells.w, columns, column + 1) - left,
      h: cut(cells.h, rows, row + 1) - top,
    };
  });
}

/**
 * Mats that together fill a rectangle become one: the largest of those that carry something (the first in
 * reading order where they are equal) takes the place of all. Panes that are a whole split print become
 * its print on one mat; prints on the others go back to the table.
 */
export const mergeMats: CommandRun<'mats.merge'> = (doc, { matIds }, context) => {
  const mats = matsOf(doc, matIds)?.sort(matsInReadingOrder);
  if (!mats) return refuse('no-such-mat');
  if (mats.length < 2) return refuse('too-few-mats');
  if (mats.some((mat) => mat.page !== mats[0]!.page)) return refuse('on-two-pages');
  const box = cellBox(mats);
  const cells = mats.reduce((sum, mat) => sum + mat.w * mat.h, 0);
  // Mats that are laid over may overlap, so that equal areas alone would not prove a rectangle.
  if (mats.some((mat) => mat.laidOver) || cells !== box.w * box.h) return refuse('not-a-rectangle');

  const keeper = [...mats].sort((a, b) => carries(b) - carries(a) || b.w * b.h - a.w * a.h || matsInReadingOrder(a, b))[0]!;
  const merged: Mat = { ...keeper, ...box, trueSize: null, focal: mats.some((mat) => mat.focal) };
  const others = doc.mats.filter((mat) => !mats.includes(mat));
  const group = groupOf(doc, keeper);
  const isWholeGroup = group?.matIds.every((id) => mats.some((mat) => mat.id === id));
  if (!group || !isWholeGroup) return withMats(doc, [...others, merged]);

  const mat: Mat = { ...merged, content: { kind: 'bare' } };
  const panes: Place = { mat: null, group };
  const next = withMats(doc, [...others, mat]);
  return carryPicture(next, { mat, group: null }, pictureAt(panes), frameAt(doc, panes).photo, context);
};

const carries = (mat: Mat): number => Number(mat.content.kind !== 'bare');
