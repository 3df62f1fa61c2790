import type { Rect, Size } from '../model/rect';
import { boundingBox } from './rects';

export interface PaneWindow {
  /** Size of the whole window over all panes, in page space. */
  readonly size: Size;
  /** Each pane's part of that window, in the order given. */
  readonly parts: readonly Rect[];
}

/**
 * How one picture lies over the photos of a pane group.
 *
 * `behind`: the picture runs on behind the gaps and reveals, which swallow that much of it; the window
 * is the photos' bounding box. `apart`: the picture is spread apart and nothing is lost; rows and
 * columns in which no pane has any photo are taken out.
 *
 * @param photos - the panes' photo rectangles in page space, in Lengths.
 * @throws RangeError for an empty list.
 */
export function paneWindow(photos: readonly Rect[], run: 'behind' | 'apart'): PaneWindow {
  const box = boundingBox(photos);
  if (run === 'behind') {
    return { size: box, parts: photos.map((r) => ({ ...r, x: r.x - box.x, y: r.y - box.y })) };
  }
  const coveredX = coverage(photos.map((r) => [r.x, r.x + r.width] as const));
  const coveredY = coverage(photos.map((r) => [r.y, r.y + r.height] as const));
  return {
    size: { width: coveredX(box.x + box.width), height: coveredY(box.y + box.height) },
    parts: photos.map((r) => ({ ...r, x: coveredX(r.x), y: coveredY(r.y) })),
  };
}

/** Returns a function that measures how much of the line before `at` the intervals cover. */
function coverage(intervals: readonly (readonly [number, number])[]): (at: number) => number {
  const merged: [number, number][] = [];
  for (const [start, end] of [...intervals].sort((a, b) => a[0] - b[0])) {
    const last = merged.at(-1);
    if (last && start <= last[1]) last[1] = Math.max(last[1], end);
    else merged.push([start, end]);
  }
  return (at) => merged.reduce((sum, [start, end]) => sum + Math.max(0, Math.min(at, end) - start), 0);
}
