import { placedPhotos } from '../geometry/placed-photos';
import { SIDES } from '../model/ids';
import { inDrawingOrder } from '../model/patch';
import type { Mat, PaneGroup, SpreadDocument } from '../model/spread';
import type { CommandContext } from './command';
import { changeMats, matsInReadingOrder, withGroup } from './edit-mats';
import { carryPrint, frameOfGroup, frameOfMat, refitPlacement, type Frame } from './fit-print';
import { shownPrints } from './pictures';

/**
 * What follows from any command, in this order: pane groups lose members that are gone, and a group of
 * one becomes a print on its mat; windows are re-fitted to photos whose size changed; a page keeps one focal; every
 * print that came or went lies on the table's list; mats stand in drawing order.
 */
export function settle(before: SpreadDocument, next: SpreadDocument, context: CommandContext): SpreadDocument {
  if (next === before) return next;
  const grouped = settlePanes(before, next, context);
  const fitted = refitGroups(before, refitMats(before, grouped, context), context);
  const settled = settleTable(before, settleFocals(before, fitted));
  return { ...settled, mats: [...settled.mats].sort(inDrawingOrder) };
}

function settlePanes(before: SpreadDocument, next: SpreadDocument, context: CommandContext): SpreadDocument {
  if (next.panes === before.panes && next.mats === before.mats) return next;
  const panes: PaneGroup[] = [];
  let settled = next;
  for (const group of next.panes) {
    const members = next.mats
      .filter(({ id, content }) => group.matIds.includes(id) && content.kind === 'pane' && content.groupId === group.id)
      .sort(matsInReadingOrder);
    const matIds = members.map((mat) => mat.id);
    if (matIds.length > 1) panes.push(sameList(matIds, group.matIds) ? group : { ...group, matIds });
    else if (members[0]) settled = dissolve(before, settled, group, members[0], context);
  }
  return { ...settled, panes };
}

const sameList = (a: readonly string[], b: readonly string[]): boolean => a.length === b.length && a.every((id, i) => id === b[i]);

/** The last pane of a group carries the print by itself, its centre where the pane had it. */
function dissolve(before: SpreadDocument, next: SpreadDocument, group: PaneGroup, mat: Mat, context: CommandContext): SpreadDocument {
  const print = group.content && context.prints.get(group.content.printId);
  if (!group.content || !print) return changeMats(next, [mat.id], (last) => ({ ...last, content: { kind: 'bare' } }));
  const { run: _run, ...placement } = group.content;
  const pane = placedPhotos(before, (id) => context.prints.get(id)).find((photo) => photo.matId === mat.id);
  const frame = frameOfMat(next, mat);
  const from = pane ? { ...placement, x: pane.window.x, y: pane.window.y } : placement;
  const carried = carryPrint(from, print, pane?.rect ?? frame.photo, frame, context.trim);
  return changeMats(next, [mat.id], (last) => ({ ...last, content: { kind: 'print', ...carried } }));
}

const sameFrame = (a: Frame, b: Frame): boolean =>
  a.photo.width === b.photo.width && a.photo.height === b.photo.height && a.card?.width === b.card?.width && a.card?.height === b.card?.height;

/** Only where the command left the content as it was: what it has just put there, it has fitted itself. */
function refitMats(before: SpreadDocument, next: SpreadDocument, context: CommandContext): SpreadDocument {
  if (next.mats === before.mats && next.reveal === before.reveal) return next;
  const old = new Map(before.mats.map((mat) => [mat.id, mat]));
  const mats = next.mats.map((mat) => {
    const was = old.get(mat.id);
    if (mat.content.kind !== 'print' || was?.content !== mat.content) return mat;
    if (was === mat && next.reveal === before.reveal) return mat;
    const print = context.prints.get(mat.content.printId);
    const wasFrame = frameOfMat(before, was);
    const frame = frameOfMat(next, mat);
    if (!print || sameFrame(wasFrame, frame)) return mat;
    return { ...mat, content: { ...mat.content, ...refitPlacement(mat.content, print, wasFrame.photo, frame, context.trim) } };
  });
  return { ...next, mats };
}

function refitGroups(before: SpreadDocument, next: SpreadDocument, context: CommandContext): SpreadDocument {
  return next.panes.reduce((settled, group) => {
    const was = before.panes.find((old) => old.id === group.id)?.content;
    const print = group.content && context.prints.get(group.content.printId);
    // Another run of the same placement is a change of the frame; another placement is the command's own.
    if (!group.content || !was || !print || !samePlacement(was, group.content)) return settled;
    const wasFrame = frameOfGroup(before, before.panes.find((old) => old.id === group.id)!, was.run);
    const frame = frameOfGroup(next, group, group.content.run);
    if (!wasFrame || !frame || sameFrame(wasFrame, frame)) return settled;
    const fitted = refitPlacement(group.content, print, wasFrame.photo, frame, context.trim);
    return withGroup(settled, { ...group, content: { ...group.content, ...fitted, mode: 'window' } });
  }, next);
}

type GroupContent = NonNullable<PaneGroup['content']>;

const samePlacement = (a: GroupContent, b: GroupContent): boolean =>
  a === b || (a.printId === b.printId && a.x === b.x && a.y === b.y && a.turn === b.turn && a.scaledWidth === b.scaledWidth && a.detailId === b.detailId);

/** A mat that comes to a page with a focal of its own gives its mark up. */
function settleFocals(before: SpreadDocument, next: SpreadDocument): SpreadDocument {
  if (next.mats === before.mats) return next;
  return SIDES.reduce((settled, side) => {
    const focals = (doc: SpreadDocument): Mat[] => doc.mats.filter((mat) => mat.page === side && mat.focal);
    const now = focals(settled);
    if (now.length <= Math.max(1, focals(before).length)) return settled;
    const wasHere = new Set(focals(before).map((mat) => mat.id));
    const keeper = now.find((mat) => wasHere.has(mat.id)) ?? now[0]!;
    return changeMats(settled, now.filter((mat) => mat !== keeper).map((mat) => mat.id), (mat) => ({ ...mat, focal: false }));
  }, next);
}

/** The table lists every print chosen for the spread, so whatever is put on a mat or comes off one is on it. */
function settleTable(before: SpreadDocument, next: SpreadDocument): SpreadDocument {
  if (next.mats === before.mats && next.panes === before.panes) return next;
  const was = shownPrints(before);
  const is = shownPrints(next);
  const moved = [...was, ...is].filter((id) => was.has(id) !== is.has(id) && !next.table.includes(id));
  return moved.length > 0 ? { ...next, table: [...next.table, ...new Set(moved)] } : next;
}
