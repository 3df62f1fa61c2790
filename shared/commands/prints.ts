import { isRefusal, refuse, type CommandRun, type Outcome } from './command';
import { carryPicture, dropPrint, frameAt, pictureAt, placeAt, placeId, putPicture } from './pictures';
import { changeMats } from './edit-mats';

export const placePrint: CommandRun<'prints.place'> = (doc, { printId, matId, detailId = null }, context) => {
  const place = placeAt(doc, matId);
  if (!place) return refuse('no-such-mat');
  const print = context.prints.get(printId);
  if (!print) return refuse('no-such-print');
  if (detailId !== null && !print.details.some(({ id }) => id === detailId)) return refuse('no-such-detail');
  return dropPrint(doc, place, print, context, detailId);
};

/** Whatever the mats carry changes places; a split print's panes take or give a picture as one. */
export const movePrint: CommandRun<'prints.move'> = (doc, { fromMatId, toMatId }, context) => {
  const from = placeAt(doc, fromMatId);
  const to = placeAt(doc, toMatId);
  if (!from || !to) return refuse('no-such-mat');
  if (placeId(from) === placeId(to)) return refuse('nothing-to-do');
  const bringsOther = [from, to].some((place) => place.mat && place.mat.content.kind !== 'bare' && place.mat.content.kind !== 'print');
  if (bringsOther && (from.group || to.group)) return refuse('not-for-prints');

  const fromContent = from.mat?.content;
  const toContent = to.mat?.content;
  const fromPhoto = frameAt(doc, from).photo;
  const toPhoto = frameAt(doc, to).photo;
  let next = carryPicture(doc, to, pictureAt(from), fromPhoto, context);
  next = carryPicture(next, from, pictureAt(to), toPhoto, context);
  if (bringsOther && fromContent && toContent) {
    if (toContent.kind !== 'print') next = changeMats(next, [fromMatId], (mat) => ({ ...mat, content: toContent }));
    if (fromContent.kind !== 'print') next = changeMats(next, [toMatId], (mat) => ({ ...mat, content: fromContent }));
  }
  return next;
};

export const liftPrints: CommandRun<'prints.lift'> = (doc, { matIds }) =>
  matIds.reduce<Outcome>((outcome, matId) => {
    if (isRefusal(outcome)) return outcome;
    const place = placeAt(outcome, matId);
    if (!place) return refuse('no-such-mat');
    return pictureAt(place) ? putPicture(outcome, place, null) : outcome;
  }, doc);
