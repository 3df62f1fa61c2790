import type { Rect } from '#shared/model/rect';
import { frameEdges, lineToPixels, thicknessToPixels, toPixels } from '#shared/scene/pixels';

/** Pixels back to units. */
const toUnits = (px: Rect, scale: number): Rect => ({
  x: px.x / scale,
  y: px.y / scale,
  width: px.width / scale,
  height: px.height / scale,
});

/** A rectangle with its edges on whole pixels, still in units; as it is where the scale is not known yet. */
export const onPixels = (rect: Rect, scale: number | null): Rect => (scale === null ? rect : toUnits(toPixels(rect, scale), scale));

/** As `onPixels`, for thin lines: at least one pixel thick, and all alike. */
export const lineOnPixels = (rect: Rect, scale: number | null): Rect => (scale === null ? rect : toUnits(lineToPixels(rect, scale), scale));

/** The path of a frame's four edges on whole pixels, in units. */
export function framePath(rect: Rect, thickness: number, scale: number | null): string {
  const edges =
    scale === null
      ? frameEdges(rect, thickness)
      : frameEdges(toPixels(rect, scale), thicknessToPixels(thickness, scale)).map((edge) => toUnits(edge, scale));
  return edges.map(({ x, y, width, height }) => `M${x} ${y}h${width}v${height}h${-width}z`).join('');
}
