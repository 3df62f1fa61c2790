import { inverseTurn, turnedSize, turnInBox } from '../geometry/paper';
import { intersection, movedBy } from '../geometry/rects';
import type { Rect } from '../model/rect';
import type { PhotoItem } from './scene';

/** White of photographic paper, seen where the paper reaches past the picture. */
export const PHOTO_PAPER = '#ffffff';

export interface PictureCover {
  /** The part of the photo's rectangle that the picture covers, in scene space. */
  readonly rect: Rect;
  /** What it shows, in fractional pixels of the oriented original; lies on the image. */
  readonly source: Rect;
  /** False where white paper shows beside the picture. */
  readonly isWhole: boolean;
}

/** Where the picture itself lies within a photo; null where only white paper is in view. */
export function pictureCover(photo: Omit<PhotoItem, 'kind' | 'key' | 'matId' | 'printId'>): PictureCover | null {
  const { rect, source, turns } = photo;
  const shown = intersection(source, { x: 0, y: 0, width: photo.imageWidth, height: photo.imageHeight });
  if (!shown) return null;
  // Sums of fractions can miss the image's edge by one part in 2^50; such a sliver is no border.
  const isWhole = shown.width > source.width - 1e-6 && shown.height > source.height - 1e-6;
  if (isWhole) return { rect, source: shown, isWhole };
  const box = turnedSize(rect, inverseTurn(turns));
  const scaleX = box.width / source.width;
  const scaleY = box.height / source.height;
  const upright = {
    x: (shown.x - source.x) * scaleX,
    y: (shown.y - source.y) * scaleY,
    width: shown.width * scaleX,
    height: shown.height * scaleY,
  };
  return { rect: movedBy(turnInBox(upright, box, turns), rect), source: shown, isWhole };
}
