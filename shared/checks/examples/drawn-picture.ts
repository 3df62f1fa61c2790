import { hexToOklab, hexToOklch } from '../../colour/convert';
import { encodeRaster } from '../../colour/raster';
import type { Hex } from '../../model/ids';
import type { OklabRaster, Swatch } from '../../model/print';

/** One flat shape of a drawn picture, in its pixels. */
export type PictureShape =
  | { readonly kind: 'rect'; readonly x: number; readonly y: number; readonly width: number; readonly height: number; readonly fill: Hex }
  | { readonly kind: 'ellipse'; readonly cx: number; readonly cy: number; readonly rx: number; readonly ry: number; readonly fill: Hex }
  | { readonly kind: 'polygon'; readonly points: readonly (readonly [x: number, y: number])[]; readonly fill: Hex };

/** A picture made of flat shapes, the first of which fills it: drawn where no photograph is at hand. */
export interface DrawnPicture {
  readonly width: number;
  readonly height: number;
  /** Later ones lie over earlier ones. */
  readonly shapes: readonly PictureShape[];
}

const LONG_SIDE = 64;

/** The raster that a print of this picture would have, and the palette measured on it. */
export function readDrawn(picture: DrawnPicture): { readonly raster: OklabRaster; readonly palette: readonly Swatch[] } {
  const scale = LONG_SIDE / Math.max(picture.width, picture.height);
  const width = Math.max(1, Math.round(picture.width * scale));
  const height = Math.max(1, Math.round(picture.height * scale));
  const oklab: number[] = [];
  const counts = new Map<Hex, number>();
  for (let y = 0; y < height; y += 1) {
    for (let x = 0; x < width; x += 1) {
      const fill = fillAt(picture, ((x + 0.5) * picture.width) / width, ((y + 0.5) * picture.height) / height);
      oklab.push(...hexToOklab(fill));
      counts.set(fill, (counts.get(fill) ?? 0) + 1);
    }
  }
  const palette = [...counts]
    .sort((a, b) => b[1] - a[1])
    .map(([hex, count]): Swatch => ({ hex, oklch: hexToOklch(hex), share: count / (width * height), role: 'area' }));
  return { raster: encodeRaster(width, height, oklab), palette };
}

function fillAt({ shapes }: DrawnPicture, x: number, y: number): Hex {
  for (let i = shapes.length - 1; i > 0; i -= 1) if (covers(shapes[i]!, x, y)) return shapes[i]!.fill;
  return shapes[0]!.fill;
}

function covers(shape: PictureShape, x: number, y: number): boolean {
  switch (shape.kind) {
    case 'rect':
      return x >= shape.x && x < shape.x + shape.width && y >= shape.y && y < shape.y + shape.height;
    case 'ellipse':
      return ((x - shape.cx) / shape.rx) ** 2 + ((y - shape.cy) / shape.ry) ** 2 <= 1;
    case 'polygon':
      return isInside(shape.points, x, y);
  }
}

/** Crossings of a ray to the right: odd inside. */
function isInside(points: readonly (readonly [number, number])[], x: number, y: number): boolean {
  let inside = false;
  points.forEach(([ax, ay], i) => {
    const [bx, by] = points[(i + 1) % points.length]!;
    if (ay > y !== by > y && x < ax + ((y - ay) * (bx - ax)) / (by - ay)) inside = !inside;
  });
  return inside;
}
