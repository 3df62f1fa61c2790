import { movedBy } from '../geometry/rects';
import type { Side } from '../model/ids';
import type { Rect, Size } from '../model/rect';
import type { SpreadDocument } from '../model/spread';

export interface PageRects extends Size {
  readonly left: Rect | null;
  readonly right: Rect | null;
}

/**
 * Where the pages lie in a scene: the left one at 0, the right one after it and the binding's visible
 * gap. A single page lies at 0, whichever it is.
 */
export function pageRects(doc: Pick<SpreadDocument, 'format' | 'binding' | 'pages'>): PageRects {
  const { width, height } = doc.format;
  const page = (x: number): Rect => ({ x, y: 0, width, height });
  if (!doc.pages.left) return { width, height, left: null, right: doc.pages.right && page(0) };
  if (!doc.pages.right) return { width, height, left: page(0), right: null };
  const x = width + doc.binding.gap;
  return { width: x + width, height, left: page(0), right: page(x) };
}

/** A rectangle in page space, moved to the scene; null where the spread has no such page. */
export function toScene(pages: PageRects, side: Side, rect: Rect): Rect | null {
  const page = pages[side];
  return page && movedBy(rect, page);
}
