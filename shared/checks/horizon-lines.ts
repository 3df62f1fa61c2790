import type { MatId } from '../model/ids';
import { pageRects } from '../scene/page-rects';
import { photoItem } from '../scene/photo-item';
import { photoPoint } from '../scene/photo-point';
import type { PhotoItem } from '../scene/scene';
import type { Point } from './balance/centre-of-mass';
import type { SpreadView } from './check';

/** A print's horizon as it shows on the spread, in the scene's space. */
export interface HorizonLine {
  readonly matId: MatId;
  readonly from: Point;
  readonly to: Point;
}

/** The marked horizons of all photos, each drawn out to its photo's edges. A horizon that the window does not show is left out. */
export function horizonLines(view: SpreadView): HorizonLine[] {
  const pages = pageRects(view.doc);
  return view.photos.flatMap((placed): HorizonLine[] => {
    const print = view.prints.get(placed.printId);
    const page = pages[placed.page];
    const photo = print?.horizon && page && photoItem(placed, print, page);
    if (!photo || !print?.horizon) return [];
    const { x1, y1, x2, y2 } = print.horizon;
    const line = clip(photoPoint(photo, x1, y1), photoPoint(photo, x2, y2), photo);
    return line ? [{ matId: placed.matId, ...line }] : [];
  });
}

/** The part within the photo of the endless line through two points (Liang and Barsky 1984). */
function clip(a: Point, b: Point, { rect }: PhotoItem): { readonly from: Point; readonly to: Point } | null {
  const dx = b.x - a.x;
  const dy = b.y - a.y;
  if (dx === 0 && dy === 0) return null;
  let from = -Infinity;
  let to = Infinity;
  const sides = [
    [-dx, a.x - rect.x],
    [dx, rect.x + rect.width - a.x],
    [-dy, a.y - rect.y],
    [dy, rect.y + rect.height - a.y],
  ] as const;
  for (const [p, q] of sides) {
    if (p === 0 && q < 0) return null;
    if (p < 0) from = Math.max(from, q / p);
    if (p > 0) to = Math.min(to, q / p);
  }
  return from < to ? { from: { x: a.x + from * dx, y: a.y + from * dy }, to: { x: a.x + to * dx, y: a.y + to * dy } } : null;
}
