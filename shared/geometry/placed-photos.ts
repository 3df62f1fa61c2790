import type { MatId, PaneGroupId, PrintId, Side } from '../model/ids';
import type { Print } from '../model/print';
import type { Rect } from '../model/rect';
import type { Mat, Placement, SpreadDocument } from '../model/spread';
import { contentRect } from './grid';
import { inverseTurn, turnedSize, turnInBox } from './paper';
import { paneWindow } from './panes';
import { movedBy } from './rects';
import { placedPaper, windowOnPaper } from './window';

/** One visible piece of a print on the spread. */
export interface PlacedPhoto {
  readonly matId: MatId;
  readonly page: Side;
  readonly printId: PrintId;
  readonly groupId: PaneGroupId | null;
  readonly placement: Placement;
  /** Where the photo lies, in page space. For a whole print the paper itself, centred; it may be larger than the mat. */
  readonly rect: Rect;
  /** The part of the upright paper that it shows, in Lengths; may leave the paper. */
  readonly window: Rect;
}

type PrintSizes = (id: PrintId) => Pick<Print, 'paperWidth' | 'paperHeight'> | undefined;

/**
 * Every piece of every print that the spread shows, in drawing order: prints on mats and the panes of
 * split prints. Prints that `printOf` does not know are left out. A whole print is centred on its mat
 * (rounded down to a unit) at its paper's size.
 */
export function placedPhotos(doc: SpreadDocument, printOf: PrintSizes): PlacedPhoto[] {
  const parts = paneParts(doc);
  return doc.mats.flatMap((mat): PlacedPhoto[] => {
    if (mat.content.kind === 'print') {
      const print = printOf(mat.content.printId);
      return print ? [placeOnMat(doc, mat, mat.content, print)] : [];
    }
    if (mat.content.kind === 'pane') {
      const part = parts.get(mat.id);
      const print = part && printOf(part.placement.printId);
      return print && part ? [{ ...part, matId: mat.id, page: mat.page, printId: part.placement.printId }] : [];
    }
    return [];
  });
}

function placeOnMat(doc: SpreadDocument, mat: Mat, placement: Placement, print: Pick<Print, 'paperWidth' | 'paperHeight'>): PlacedPhoto {
  const photo = contentRect(doc.format, doc.reveal, mat);
  const base = { matId: mat.id, page: mat.page, printId: placement.printId, groupId: null, placement };
  if (placement.mode === 'window') return { ...base, rect: photo, window: windowOnPaper(placement, photo) };
  const paper = placedPaper(print, placement);
  const size = turnedSize(paper, placement.turn);
  return {
    ...base,
    rect: {
      x: photo.x + Math.floor((photo.width - size.width) / 2),
      y: photo.y + Math.floor((photo.height - size.height) / 2),
      ...size,
    },
    window: { x: 0, y: 0, ...paper },
  };
}

interface PanePart {
  readonly groupId: PaneGroupId;
  readonly placement: Placement;
  readonly rect: Rect;
  readonly window: Rect;
}

function paneParts(doc: SpreadDocument): Map<MatId, PanePart> {
  const byId = new Map(doc.mats.map((mat) => [mat.id, mat]));
  const parts = new Map<MatId, PanePart>();
  for (const group of doc.panes) {
    const mats = group.matIds.flatMap((id) => byId.get(id) ?? []);
    if (!group.content || mats.length === 0) continue;
    const photos = mats.map((mat) => contentRect(doc.format, doc.reveal, mat));
    const { size, parts: windows } = paneWindow(photos, group.content.run);
    const { content } = group;
    mats.forEach((mat, i) => {
      // A part lies in the turned window; turning it back gives its place on the upright paper.
      const back = turnInBox(windows[i]!, size, inverseTurn(content.turn));
      parts.set(mat.id, {
        groupId: group.id,
        placement: content,
        rect: photos[i]!,
        window: movedBy(back, content),
      });
    });
  }
  return parts;
}

/**
 * The part of the picture that a piece shows, as a window on the print's own paper, for `toPicture`: a
 * scaled digital photo shows the same part as the unscaled one. Not rounded.
 */
export function windowAtOwnSize(print: Pick<Print, 'paperWidth'>, photo: Pick<PlacedPhoto, 'window' | 'placement'>): Rect {
  const { scaledWidth } = photo.placement;
  if (scaledWidth === null) return photo.window;
  const factor = print.paperWidth / scaledWidth;
  const { x, y, width, height } = photo.window;
  return { x: x * factor, y: y * factor, width: width * factor, height: height * factor };
}
