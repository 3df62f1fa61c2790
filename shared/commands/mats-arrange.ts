import { cellBox, mirrored } from '../geometry/cells';
import { clamp } from '../geometry/clamp';
import { cellRect, gridOf } from '../geometry/grid';
import { SIDES, type MatId, type Side } from '../model/ids';
import type { Mat, SpreadDocument } from '../model/spread';
import { refuse, type CommandRun } from './command';
import { changeMats, groupOf, matOf, matsOf } from './edit-mats';
import { frameOfMat } from './fit-print';
import { carryPicture, pictureAt, placeAt } from './pictures';

/** The mats and, where they change pages, all panes of their split prints: those stay on one page. */
function withPaneMates(doc: SpreadDocument, mats: readonly Mat[], page: Side): Mat[] {
  const ids = new Set<MatId>(mats.map((mat) => mat.id));
  for (const mat of mats) {
    if (mat.page === page) continue;
    for (const id of groupOf(doc, mat)?.matIds ?? []) ids.add(id);
  }
  return doc.mats.filter((mat) => ids.has(mat.id));
}

/** By whole steps; the mats together are kept on the page, so that none moves against another. */
export const moveMats: CommandRun<'mats.move'> = (doc, { matIds, dx, dy, page }) => {
  const named = matsOf(doc, matIds);
  if (!named) return refuse('no-such-mat');
  if (page && !doc.pages[page]) return refuse('no-such-page');
  const mats = page ? withPaneMates(doc, named, page) : named;
  const { columns, rows } = gridOf(doc.format);
  const box = cellBox(mats);
  const stepX = clamp(Math.round(dx), -box.x, columns - box.x - box.w);
  const stepY = clamp(Math.round(dy), -box.y, rows - box.y - box.h);
  return changeMats(doc, mats.map((mat) => mat.id), (mat) => ({ ...mat, page: page ?? mat.page, x: mat.x + stepX, y: mat.y + stepY }));
};

/** A die's true size is kept while the place still holds it; else the mat fills its place. */
export const resizeMat: CommandRun<'mats.resize'> = (doc, { matId, ...to }) => {
  if (!matOf(doc, matId)) return refuse('no-such-mat');
  const { columns, rows } = gridOf(doc.format);
  const x = clamp(Math.round(to.x), 0, columns - 1);
  const y = clamp(Math.round(to.y), 0, rows - 1);
  // What lies off the page is cut away, so that a handle pulled past the rim does not push the other side.
  const w = clamp(Math.round(to.x + to.w), x + 1, columns) - x;
  const h = clamp(Math.round(to.y + to.h), y + 1, rows) - y;
  return changeMats(doc, [matId], (mat) => keepTrueSize(doc, { ...mat, x, y, w, h }));
};

function keepTrueSize(doc: SpreadDocument, mat: Mat): Mat {
  const cells = cellRect(doc.format, mat);
  const holds = !mat.trueSize || (mat.trueSize.width <= cells.width && mat.trueSize.height <= cells.height);
  return holds ? mat : { ...mat, trueSize: null };
}

export const mirrorMats: CommandRun<'mats.mirror'> = (doc, { matIds, axis }) => {
  const mats = matsOf(doc, matIds);
  if (!mats) return refuse('no-such-mat');
  return SIDES.reduce((next, side) => {
    const onPage = mats.filter((mat) => mat.page === side);
    if (onPage.length === 0) return next;
    const box = cellBox(onPage);
    return changeMats(next, onPage.map((mat) => mat.id), (mat) => mirrored(mat, box, axis));
  }, doc);
};

/** Width and height change places about the top-left corner; a mat that would leave the page is moved back onto it. */
export const turnMat: CommandRun<'mats.turn'> = (doc, { matId }, context) => {
  const mat = matOf(doc, matId);
  if (!mat) return refuse('no-such-mat');
  const { columns, rows } = gridOf(doc.format);
  if (mat.h > columns || mat.w > rows) return refuse('off-page');
  const next = changeMats(doc, [matId], () => ({
    ...mat,
    x: Math.min(mat.x, columns - mat.h),
    y: Math.min(mat.y, rows - mat.w),
    w: mat.h,
    h: mat.w,
    trueSize: mat.trueSize && { width: mat.trueSize.height, height: mat.trueSize.width },
  }));
  const place = placeAt(next, matId);
  // Carried over and not only re-fitted, so that a print with no up turns with its mat.
  return place?.mat?.content.kind === 'print' ? carryPicture(next, place, pictureAt(place), frameOfMat(doc, mat).photo, context) : next;
};
