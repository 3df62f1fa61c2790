import { placedPhotos } from '../geometry/placed-photos';
import { SIDES, type MatId, type PrintId } from '../model/ids';
import { inches } from '../model/length';
import type { Print } from '../model/print';
import type { SpreadDocument } from '../model/spread';
import { matItems } from './mat-items';
import { pageRects, type PageRects } from './page-rects';
import { photoItem } from './photo-item';
import type { PhotoItem, Scene, Shade } from './scene';

/** Width of the line where two facing pages meet. */
const FOLD_WIDTH = inches(1 / 44);

/**
 * The drawn spread: pages, then every mat with what it carries, in the document's drawing order. Mats
 * of a page that the spread does not have are left out, and so are prints that `prints` does not know:
 * their mats stay bare.
 */
export function buildScene(doc: SpreadDocument, prints: ReadonlyMap<PrintId, Print>): Scene {
  const pages = pageRects(doc);
  const photos = photoItems(doc, prints, pages);
  return {
    width: pages.width,
    height: pages.height,
    pages: SIDES.flatMap((side) => {
      const page = doc.pages[side];
      const rect = pages[side];
      return page && rect ? [{ side, rect, color: page.color }] : [];
    }),
    fold: foldOf(pages),
    items: doc.mats.flatMap((mat) => {
      const page = pages[mat.page];
      return page ? matItems(doc, mat, photos.get(mat.id) ?? null, page) : [];
    }),
  };
}

function photoItems(doc: SpreadDocument, prints: ReadonlyMap<PrintId, Print>, pages: PageRects): Map<MatId, PhotoItem> {
  const items = new Map<MatId, PhotoItem>();
  for (const placed of placedPhotos(doc, (id) => prints.get(id))) {
    const print = prints.get(placed.printId);
    const page = pages[placed.page];
    const item = print && page && photoItem(placed, print, page);
    if (item) items.set(placed.matId, item);
  }
  return items;
}

function foldOf({ left, right, height }: PageRects): Shade | null {
  if (!left || !right || right.x > left.width) return null;
  return { rect: { x: right.x - Math.floor(FOLD_WIDTH / 2), y: 0, width: FOLD_WIDTH, height }, fill: '#1b1d22', opacity: 0.35 };
}
