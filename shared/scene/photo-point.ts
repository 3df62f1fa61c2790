import type { PxRect } from '../model/print';
import type { Rect } from '../model/rect';
import type { PhotoItem } from './scene';

/** A point of the oriented original where the scene draws it; it may lie outside the photo. */
export function photoPoint({ rect, source, turns }: PhotoItem, x: number, y: number): { readonly x: number; readonly y: number } {
  const s = (x - source.x) / source.width;
  const t = (y - source.y) / source.height;
  const places = [
    [s, t],
    [1 - t, s],
    [1 - s, 1 - t],
    [t, 1 - s],
  ] as const;
  const [u, v] = places[turns];
  return { x: rect.x + u * rect.width, y: rect.y + v * rect.height };
}

/** A rectangle of the oriented original where the scene draws it, such as a keep zone; it may reach outside the photo. */
export function photoRect(photo: PhotoItem, { x, y, width, height }: PxRect): Rect {
  const a = photoPoint(photo, x, y);
  const b = photoPoint(photo, x + width, y + height);
  return { x: Math.min(a.x, b.x), y: Math.min(a.y, b.y), width: Math.abs(b.x - a.x), height: Math.abs(b.y - a.y) };
}
