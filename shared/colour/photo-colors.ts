import { clamp } from '../geometry/clamp';
import { toPicture } from '../geometry/paper';
import { placedPhotos, windowAtOwnSize } from '../geometry/placed-photos';
import { area } from '../geometry/rects';
import type { MatId, PrintId } from '../model/ids';
import type { Print } from '../model/print';
import type { Rect } from '../model/rect';
import type { SpreadDocument } from '../model/spread';
import { oklabToOklch, type Oklab, type Oklch } from './convert';
import { groupColors, type WeightedColor } from './group-colors';
import { decodeRaster } from './raster';

/** A colour of the photos, with how much of it is seen. */
export interface PhotoColor {
  /** The occurring colour nearest to the group's mean. */
  readonly oklch: Oklch;
  /** The group's strongest occurring colour that is not a stray: what the eye takes as its accent. */
  readonly vivid: Oklch;
  /** Share of all that is seen of the photos, 0–1. */
  readonly weight: number;
  /** Prints it comes from, strongest first. */
  readonly printIds: readonly PrintId[];
}

export interface PhotoColorOptions {
  /** Skin in marked faces counts like any other colour; left out unless asked. */
  readonly withSkin?: boolean;
}

interface SeenPart {
  readonly print: Print;
  /** In fractional pixels of the oriented original. */
  readonly source: Rect;
  /** Seen area in square Lengths. */
  readonly weight: number;
}

interface SeenColor extends WeightedColor {
  readonly byPrint: ReadonlyMap<PrintId, number>;
}

/** At most so many groups of colours are told apart. */
const MOST_GROUPS = 12;
/** Raster pixels read per photo: enough for groups, few enough for forty photos at once. */
const SAMPLES_PER_PHOTO = 500;
/** Colours are first gathered into cubes of 8 of the raster's 254 levels. */
const CUBE_BITS = 3;
/** A print counts as a source where it gives at least this share of what the strongest one gives. */
const SOURCE_SHARE = 0.2;
/** A group's vivid colour must carry this share of the group's weight with those at least as vivid. */
const VIVID_SHARE = 0.15;

/**
 * The colours of all photos that the spread shows, weighed by the area seen in their windows; of the
 * prints lying ready, by paper area, where none is placed. Heaviest first; empty without prints. The
 * result depends only on the prints' rasters and windows.
 */
export function photoColors(doc: SpreadDocument, prints: ReadonlyMap<PrintId, Print>, { withSkin = false }: PhotoColorOptions = {}): PhotoColor[] {
  const colors = gather(seenParts(doc, prints), withSkin);
  const total = colors.reduce((sum, { weight }) => sum + weight, 0);
  if (total === 0) return [];
  return groupColors(colors, MOST_GROUPS).map((group) => ({
    oklch: oklabToOklch(group.nearest.oklab),
    vivid: vividOf(group.members),
    weight: group.weight / total,
    printIds: sourcesOf(group.members),
  }));
}

function seenParts(doc: SpreadDocument, prints: ReadonlyMap<PrintId, Print>): SeenPart[] {
  const placed = placedPhotos(doc, (id) => prints.get(id)).flatMap((photo): (SeenPart & { readonly matId: MatId })[] => {
    const print = prints.get(photo.printId);
    return print ? [{ matId: photo.matId, print, source: toPicture(print, windowAtOwnSize(print, photo)), weight: area(photo.rect) }] : [];
  });
  // By id, so that a mirrored spread adds up its photos in the same order.
  if (placed.length > 0) return placed.sort((a, b) => (a.matId < b.matId ? -1 : 1));
  return doc.table.flatMap((id): SeenPart[] => {
    const print = prints.get(id);
    return print ? [{ print, source: print.paperRect, weight: print.paperWidth * print.paperHeight }] : [];
  });
}

function gather(parts: readonly SeenPart[], withSkin: boolean): SeenColor[] {
  const cubes = new Map<number, { sum: [number, number, number]; weight: number; byPrint: Map<PrintId, number> }>();
  for (const { print, source, weight } of parts) {
    const pixels = decodeRaster(print.raster);
    const scaleX = pixels.width / print.imageWidth;
    const scaleY = pixels.height / print.imageHeight;
    const left = clamp(Math.floor(source.x * scaleX), 0, pixels.width - 1);
    const top = clamp(Math.floor(source.y * scaleY), 0, pixels.height - 1);
    const endX = Math.max(left + 1, Math.min(pixels.width, Math.ceil((source.x + source.width) * scaleX)));
    const endY = Math.max(top + 1, Math.min(pixels.height, Math.ceil((source.y + source.height) * scaleY)));
    const stride = Math.max(1, Math.ceil(Math.sqrt(((endX - left) * (endY - top)) / SAMPLES_PER_PHOTO)));
    const faces = withSkin ? [] : print.faces.map(({ rect }) => ({ left: rect.x * scaleX, top: rect.y * scaleY, right: (rect.x + rect.width) * scaleX, bottom: (rect.y + rect.height) * scaleY }));
    const each = weight / (Math.ceil((endX - left) / stride) * Math.ceil((endY - top) / stride));
    for (let y = top; y < endY; y += stride) {
      for (let x = left; x < endX; x += stride) {
        const at = 3 * (y * pixels.width + x);
        const l = pixels.data[at]!;
        const a = pixels.data[at + 1]!;
        const b = pixels.data[at + 2]!;
        if (faces.length > 0 && mayBeSkin(a, b) && faces.some((face) => x + 1 > face.left && x < face.right && y + 1 > face.top && y < face.bottom)) continue;
        const key = (((l + 128) >> CUBE_BITS) << 12) | (((a + 128) >> CUBE_BITS) << 6) | ((b + 128) >> CUBE_BITS);
        let cube = cubes.get(key);
        if (!cube) cubes.set(key, (cube = { sum: [0, 0, 0], weight: 0, byPrint: new Map<PrintId, number>() }));
        cube.sum[0] += (l + 127) * each;
        cube.sum[1] += a * each;
        cube.sum[2] += b * each;
        cube.weight += each;
        cube.byPrint.set(print.id, (cube.byPrint.get(print.id) ?? 0) + each);
      }
    }
  }
  return [...cubes]
    .sort(([a], [b]) => a - b)
    .filter(([, cube]) => cube.weight > 0)
    .map(([, { sum, weight, byPrint }]) => ({ oklab: sum.map((v) => v / weight / 254) as unknown as Oklab, weight, byPrint }));
}

/** Within a marked face every skin, pale to dark, is of a red to yellow hue: a and b as the raster stores them. */
const mayBeSkin = (a: number, b: number): boolean => a > 0 && b > 0 && b < 5 * a;

/** The members by falling chroma; the first at which enough of the group's weight has gone by. */
function vividOf(members: readonly SeenColor[]): Oklch {
  const byChroma = members
    .map(({ oklab, weight }) => ({ oklch: oklabToOklch(oklab), weight }))
    .sort((a, b) => b.oklch[1] - a.oklch[1]);
  let left = VIVID_SHARE * members.reduce((sum, { weight }) => sum + weight, 0);
  return (byChroma.find(({ weight }) => (left -= weight) <= 0) ?? byChroma[0]!).oklch;
}

function sourcesOf(members: readonly SeenColor[]): PrintId[] {
  const byPrint = new Map<PrintId, number>();
  for (const member of members) {
    for (const [id, weight] of member.byPrint) byPrint.set(id, (byPrint.get(id) ?? 0) + weight);
  }
  const sorted = [...byPrint].sort(([idA, a], [idB, b]) => b - a || (idA < idB ? -1 : 1));
  const strongest = sorted[0]?.[1] ?? 0;
  return sorted.filter(([, weight]) => weight >= strongest * SOURCE_SHARE).map(([id]) => id);
}
