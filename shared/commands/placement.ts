import type { Print } from '../model/print';
import type { MatId } from '../model/ids';
import type { Placement, SpreadDocument } from '../model/spread';
import { refuse, type CommandContext, type CommandRun, type Outcome } from './command';
import { fitsWhole, fitWhole, refitPlacement, scalePlacement, slidePlacement, turnPlacement, type Frame } from './fit-print';
import { frameAt, pictureAt, placeAt, putPicture } from './pictures';

type Remount = (placement: Placement, print: Print, frame: Frame) => Placement | ReturnType<typeof refuse>;

/** Finds the picture on a mat or a pane's whole group and puts back what `remount` makes of it. */
function remount(doc: SpreadDocument, matId: MatId, context: CommandContext, change: Remount): Outcome {
  const place = placeAt(doc, matId);
  if (!place) return refuse('no-such-mat');
  const placement = pictureAt(place);
  if (!placement) return refuse('no-print-there');
  const print = context.prints.get(placement.printId);
  if (!print) return refuse('no-such-print');
  const next = change(placement, print, frameAt(doc, place));
  return 'refused' in next ? next : putPicture(doc, place, next);
}

export const slideWindowTo: CommandRun<'window.slide'> = (doc, { matId, x, y }, context) =>
  remount(doc, matId, context, (placement, print, { photo }) =>
    placement.mode === 'whole' ? refuse('is-whole') : slidePlacement(placement, print, photo, { x, y }, context.trim),
  );

export const setWhole: CommandRun<'placement.setWhole'> = (doc, { matId, whole }, context) =>
  remount(doc, matId, context, (placement, print, frame) => {
    if (!frame.card) return refuse('whole-panes');
    if ((placement.mode === 'whole') === whole) return placement;
    if (whole && !fitsWhole(print, frame, placement.turn)) return refuse('does-not-fit-whole');
    if (whole) return { ...fitWhole(print, frame, placement, context.trim), x: placement.x, y: placement.y };
    // Without a card to lie on, the print is cut: the fit that a frame of panes would give it.
    return refitPlacement(placement, print, frame.photo, { ...frame, card: null }, context.trim);
  });

export const turnPrint: CommandRun<'placement.turn'> = (doc, { matId, turn }, context) =>
  remount(doc, matId, context, (placement, print, frame) =>
    turn !== 0 && !print.marks.noUp ? refuse('has-an-up') : placement.turn === turn ? placement : turnPlacement(placement, print, frame, turn, context.trim),
  );

export const scalePrint: CommandRun<'placement.scale'> = (doc, { matId, scaledWidth }, context) =>
  remount(doc, matId, context, (placement, print, frame) => {
    if (!print.marks.digital) return refuse('not-digital');
    return placement.mode === 'whole' ? refuse('is-whole') : scalePlacement(placement, print, frame, scaledWidth, context.trim);
  });
