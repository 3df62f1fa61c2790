import type { Placement, SpreadDocument } from '../model/spread';
import { refuse, type CommandRun } from './command';
import { changeMats, groupOf, matsInReadingOrder, matsOf, withGroup } from './edit-mats';
import { carryPicture, dropPrint, frameAt, pictureAt, type Place } from './pictures';

/**
 * Makes mats of one page the panes of one split print. Without a print named, the picture that the first of
 * them carries is kept and runs on over all. Panes of other groups leave those.
 */
export const groupPanes: CommandRun<'panes.group'> = (doc, { matIds, printId }, context) => {
  const mats = matsOf(doc, matIds)?.sort(matsInReadingOrder);
  if (!mats) return refuse('no-such-mat');
  if (mats.length < 2) return refuse('too-few-mats');
  if (mats.some((mat) => mat.page !== mats[0]!.page)) return refuse('on-two-pages');
  const print = printId === null ? null : context.prints.get(printId);
  if (print === undefined) return refuse('no-such-print');

  const ids = mats.map((mat) => mat.id);
  const group = { id: context.newId(), matIds: ids, content: null };
  const place: Place = { mat: null, group };
  const grouped = withGroup(
    changeMats(withoutMembers(doc, ids), ids, (mat) => ({ ...mat, content: { kind: 'pane', groupId: group.id } })),
    group,
  );
  if (print) return dropPrint(grouped, place, print, context);
  const source = mats.map((mat): Place => asPlace(doc, mat)).find((from) => pictureAt(from) !== null);
  return source ? carryPicture(grouped, place, pictureAt(source), frameAt(doc, source).photo, context) : grouped;
};

function asPlace(doc: SpreadDocument, mat: SpreadDocument['mats'][number]): Place {
  const group = groupOf(doc, mat);
  return group ? { mat: null, group } : { mat, group: null };
}

function withoutMembers(doc: SpreadDocument, ids: readonly string[]): SpreadDocument {
  return {
    ...doc,
    panes: doc.panes.map((group) =>
      group.matIds.some((id) => ids.includes(id)) ? { ...group, matIds: group.matIds.filter((id) => !ids.includes(id)) } : group,
    ),
  };
}

/** The print goes to the largest pane (the first in reading order of equals); the others are bare. */
export const ungroupPanes: CommandRun<'panes.ungroup'> = (doc, { groupId }, context) => {
  const group = doc.panes.find((candidate) => candidate.id === groupId);
  if (!group) return refuse('no-such-group');
  const panes: Place = { mat: null, group };
  const largest = doc.mats.filter((mat) => group.matIds.includes(mat.id)).sort((a, b) => b.w * b.h - a.w * a.h || matsInReadingOrder(a, b))[0]!;
  const bared = changeMats({ ...doc, panes: doc.panes.filter((other) => other !== group) }, group.matIds, (mat) => ({ ...mat, content: { kind: 'bare' } }));
  const picture: Placement | null = pictureAt(panes);
  return carryPicture(bared, { mat: largest, group: null }, picture, frameAt(doc, panes).photo, context);
};

export const setRun: CommandRun<'panes.setRun'> = (doc, { groupId, run }) => {
  const group = doc.panes.find((candidate) => candidate.id === groupId);
  if (!group) return refuse('no-such-group');
  if (!group.content) return refuse('no-print-there');
  return withGroup(doc, { ...group, content: { ...group.content, run } });
};
