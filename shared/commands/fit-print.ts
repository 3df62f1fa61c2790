import { clamp } from '../geometry/clamp';
import { contentRect, innerMatRect, matRect } from '../geometry/grid';
import { paneWindow } from '../geometry/panes';
import { holdsZone, neededOf, paperOf, zoneOf } from '../geometry/keep-zone';
import { turnedSize } from '../geometry/paper';
import { intersection } from '../geometry/rects';
import { centreWindow, placedPaper, slideWindow, spareShavings, windowOnPaper } from '../geometry/window';
import type { DetailId, Turns } from '../model/ids';
import { mustStayWhole } from '../model/must-stay-whole';
import type { Print } from '../model/print';
import type { Size } from '../model/rect';
import type { Mat, PaneGroup, Placement, SpreadDocument, TrimSettings } from '../model/spread';

/** The place that waits for a print. */
export interface Frame {
  /** Size of the photo when it is trimmed, on the page. */
  readonly photo: Size;
  /** The card that an uncut print lies on; null for panes, which are always cut. */
  readonly card: Size | null;
}

export const frameOfMat = (doc: SpreadDocument, mat: Mat): Frame => ({
  photo: contentRect(doc.format, doc.reveal, mat),
  card: innerMatRect(doc.format, doc.reveal, mat) ?? matRect(doc.format, mat),
});

/** Frame of a split print, or null where none of its mats exists. */
export function frameOfGroup(doc: SpreadDocument, group: Pick<PaneGroup, 'matIds'>, run: 'behind' | 'apart'): Frame | null {
  const members = doc.mats.filter((mat) => group.matIds.includes(mat.id));
  if (members.length === 0) return null;
  return { photo: paneWindow(members.map((mat) => contentRect(doc.format, doc.reveal, mat)), run).size, card: null };
}

const holds = (outer: Size, inner: Size): boolean => inner.width <= outer.width && inner.height <= outer.height;

/** True where the print fits uncut on the card. A digital photo can be printed small enough for any. */
export function fitsWhole(print: Print, frame: Frame, turn: Turns): boolean {
  if (!frame.card) return false;
  return print.marks.digital || holds(frame.card, turnedSize(placedPaper(print, { scaledWidth: null }), turn));
}

/** Smallest paper width at which a digital photo covers the window. */
function coverWidth(print: Print, window: Size): number {
  return Math.max(window.width, Math.ceil((window.height * print.paperWidth) / print.paperHeight));
}

/** Largest paper width at which a whole digital photo stays inside the photo's place. */
function containWidth(print: Print, window: Size): number {
  return Math.max(1, Math.min(window.width, Math.floor((window.height * print.paperWidth) / print.paperHeight)));
}

/** How a print is wanted on its mat: which way round, and for which of its details (null for its keep zone). */
type Wish = Pick<Placement, 'turn' | 'detailId'>;

/** The print trimmed to the photo, its window centred on the zone that it is for and leaving no shavings. */
function fitWindow(print: Print, photo: Size, { turn, detailId }: Wish, trim: TrimSettings): Placement {
  const window = turnedSize(photo, turn);
  const scaledWidth = print.marks.digital ? coverWidth(print, window) : null;
  const placed = { scaledWidth, detailId };
  const paper = placedPaper(print, placed);
  const centred = centreWindow(window, paper, trim.finestMark, zoneOf(print, placed));
  const at = print.marks.digital ? centred : spareShavings(centred, window, paper, neededOf(print, placed, trim.tolerance), trim.finestMark);
  return { printId: print.id, mode: 'window', ...at, turn, scaledWidth, detailId };
}

export function fitWhole(print: Print, frame: Frame, wish: Wish, trim: TrimSettings): Placement {
  const trimmed = fitWindow(print, frame.photo, wish, trim);
  const scaledWidth = print.marks.digital ? containWidth(print, turnedSize(frame.photo, wish.turn)) : null;
  return { ...trimmed, mode: 'whole', scaledWidth };
}

/** How a print is mounted by default, for one turn: uncut where a cut would spoil it or there is nothing to cut. */
function fitTurned(print: Print, frame: Frame, wish: Wish, trim: TrimSettings): Placement {
  return staysWhole(print, frame, wish.turn) ? fitWhole(print, frame, wish, trim) : fitWindow(print, frame.photo, wish, trim);
}

function staysWhole(print: Print, frame: Frame, turn: Turns): boolean {
  if (print.marks.digital || !fitsWhole(print, frame, turn)) return false;
  return mustStayWhole(print) || holds(frame.photo, turnedSize({ width: print.paperWidth, height: print.paperHeight }, turn));
}

/**
 * How a print is mounted when it is dropped: window centred on the keep zone, on the trimmer's finest
 * mark and on the paper; whole where a cut would spoil it or where it is smaller than the photo; a digital
 * photo scaled to cover. A print with no up is quarter-turned where it suits the place better so.
 *
 * @param detailId - the detail that it is cut out for, which then counts in the keep zone's stead.
 */
export function fitPrint(print: Print, frame: Frame, trim: TrimSettings, detailId: DetailId | null): Placement {
  const upright = fitTurned(print, frame, { turn: 0, detailId }, trim);
  if (!print.marks.noUp) return upright;
  const turned = fitTurned(print, frame, { turn: 1, detailId }, trim);
  return isBetter(suits(print, frame, turned, trim), suits(print, frame, upright, trim)) ? turned : upright;
}

/** What speaks for a placement, the weightiest first: spared from a cut, keep zone held, paper shown, same orientation. */
function suits(print: Print, frame: Frame, placement: Placement, trim: TrimSettings): readonly number[] {
  const paper = paperOf(print, placement);
  const window = placement.mode === 'whole' ? paper : windowOnPaper(placement, frame.photo);
  const shown = intersection(window, paper) ?? { width: 0, height: 0 };
  return [
    Number(mustStayWhole(print) && placement.mode === 'whole'),
    Number(holdsZone(window, print, placement, trim.tolerance)),
    // A digital photo is scaled to cover, so what it shows is a share of its picture.
    (shown.width * shown.height) / (print.marks.digital ? paper.width * paper.height : 1),
    Number(isUpright(turnedSize(paper, placement.turn)) === isUpright(frame.photo)),
  ];
}

const isUpright = (size: Size): boolean => size.height > size.width;

function isBetter(a: readonly number[], b: readonly number[]): boolean {
  const at = a.findIndex((value, i) => value !== b[i]);
  return at >= 0 && a[at]! > b[at]!;
}

/**
 * The same print in a frame that changed its size: turned as it was, the centre of its window kept on
 * the paper (or on the keep zone, where it was centred there), on the finest mark and on the paper.
 *
 * @param photo - size of the photo before the change.
 */
export function refitPlacement(placement: Placement, print: Print, photo: Size, frame: Frame, trim: TrimSettings): Placement {
  const { turn } = placement;
  if (placement.mode === 'whole') {
    return fitsWhole(print, frame, turn) ? { ...fitWhole(print, frame, placement, trim), x: placement.x, y: placement.y } : fitWindow(print, frame.photo, placement, trim);
  }
  const fresh = fitTurned(print, frame, placement, trim);
  if (fresh.mode === 'whole' || isCentred(placement, print, photo, trim)) return fresh;
  return keepCentre(placement, print, photo, { ...fresh, scaledWidth: keptScale(placement, print, photo, fresh) }, frame.photo, trim);
}

/** A digital photo that only just covered still does; one that was larger stays so large while it covers. */
function keptScale(placement: Placement, print: Print, photo: Size, fresh: Placement): number | null {
  if (fresh.scaledWidth === null || placement.scaledWidth === null) return fresh.scaledWidth;
  const covered = placement.scaledWidth === coverWidth(print, turnedSize(photo, placement.turn));
  return covered ? fresh.scaledWidth : Math.max(placement.scaledWidth, fresh.scaledWidth);
}

function isCentred(placement: Placement, print: Print, photo: Size, trim: TrimSettings): boolean {
  const fresh = fitWindow(print, photo, placement, trim);
  return fresh.x === placement.x && fresh.y === placement.y && fresh.scaledWidth === placement.scaledWidth;
}

/** `next` with its window's centre where `placement` had it on the picture. */
function keepCentre(placement: Placement, print: Print, photo: Size, next: Placement, nextPhoto: Size, trim: TrimSettings): Placement {
  const before = windowOnPaper(placement, photo);
  const paper = placedPaper(print, next);
  const scale = paper.width / placedPaper(print, placement).width;
  const window = turnedSize(nextPhoto, next.turn);
  const at = slideWindow(
    (before.x + before.width / 2) * scale - window.width / 2,
    (before.y + before.height / 2) * scale - window.height / 2,
    window,
    paper,
    trim.finestMark,
  );
  return { ...next, ...at };
}

/**
 * A print that goes from one frame to another: mounted as if dropped there, except that a window which
 * the person had slid keeps its centre, and a print which they had left whole stays whole where it fits.
 */
export function carryPrint(placement: Placement, print: Print, photo: Size, frame: Frame, trim: TrimSettings): Placement {
  const fresh = fitPrint(print, frame, trim, placement.detailId);
  if (placement.mode === 'whole') return fitsWhole(print, frame, fresh.turn) ? fitWhole(print, frame, fresh, trim) : fresh;
  if (fresh.mode === 'whole' || isCentred(placement, print, photo, trim)) return fresh;
  return keepCentre(placement, print, photo, fresh, frame.photo, trim);
}

/** The window moved to (x, y) of the paper, on the finest mark and on the paper. */
export function slidePlacement(placement: Placement, print: Print, photo: Size, to: { x: number; y: number }, trim: TrimSettings): Placement {
  const at = slideWindow(to.x, to.y, turnedSize(photo, placement.turn), placedPaper(print, placement), trim.finestMark);
  return { ...placement, ...at };
}

/** Widest paper that a document's lengths can hold. */
const MAX_PAPER = 1_600_000;

/** A digital photo scaled, never so small that it no longer covers; its centre stays. */
export function scalePlacement(placement: Placement, print: Print, frame: Frame, width: number, trim: TrimSettings): Placement {
  const least = coverWidth(print, turnedSize(frame.photo, placement.turn));
  const most = Math.floor(Math.min(MAX_PAPER, (MAX_PAPER * print.paperWidth) / print.paperHeight));
  const scaledWidth = clamp(Math.round(width), least, most);
  return keepCentre(placement, print, frame.photo, { ...placement, mode: 'window', scaledWidth }, frame.photo, trim);
}

/** The piece turned on the page to `turn`, its centre kept. */
export function turnPlacement(placement: Placement, print: Print, frame: Frame, turn: Turns, trim: TrimSettings): Placement {
  const fresh = fitTurned(print, frame, { turn, detailId: placement.detailId }, trim);
  if (fresh.mode === 'whole' || placement.mode === 'whole') return fresh;
  return keepCentre(placement, print, frame.photo, fresh, frame.photo, trim);
}
