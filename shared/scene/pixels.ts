import type { Rect } from '../model/rect';

/**
 * The one rule by which lengths become pixels, on the screen as in a picture file: every edge goes to
 * its nearest pixel line by itself, so that rectangles which share an edge share its pixel line too.
 *
 * @param scale - pixels per unit.
 * @returns whole pixels; may be empty for a rectangle thinner than a pixel.
 */
export function toPixels(rect: Rect, scale: number): Rect {
  const x = Math.round(rect.x * scale);
  const y = Math.round(rect.y * scale);
  return {
    x,
    y,
    width: Math.round((rect.x + rect.width) * scale) - x,
    height: Math.round((rect.y + rect.height) * scale) - y,
  };
}

/** For thin lines: equal ones come out equally thick, wherever they lie, and never thinner than one pixel. */
export function lineToPixels(rect: Rect, scale: number): Rect {
  const px = toPixels(rect, scale);
  return rect.width > rect.height
    ? { ...px, height: thicknessToPixels(rect.height, scale) }
    : { ...px, width: thicknessToPixels(rect.width, scale) };
}

/** A line of text stands on a whole pixel line, where browsers would put it anyway; its glyphs keep their places along it. */
export const baselineOnPixels = (baseline: number, scale: number): number => Math.round(baseline * scale) / scale;

/** Thickness of a frame in whole pixels, at least one. */
export const thicknessToPixels = (thickness: number, scale: number): number => Math.max(1, Math.round(thickness * scale));

/** The four edges of a frame `thickness` wide inside `rect`, none overlapping another; all of a rectangle too small for them. */
export function frameEdges(rect: Rect, thickness: number): readonly Rect[] {
  const { x, y, width, height } = rect;
  const t = thickness;
  if (2 * t >= Math.min(width, height)) return [rect];
  return [
    { x, y, width, height: t },
    { x, y: y + height - t, width, height: t },
    { x, y: y + t, width: t, height: height - 2 * t },
    { x: x + width - t, y: y + t, width: t, height: height - 2 * t },
  ];
}
