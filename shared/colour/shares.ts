import { contentRect, innerMatRect, matRect } from '../geometry/grid';
import { placedPhotos, type PlacedPhoto } from '../geometry/placed-photos';
import { area, intersection, right, bottom } from '../geometry/rects';
import { SIDES, type Hex, type MatId, type PrintId } from '../model/ids';
import type { Print } from '../model/print';
import type { Rect } from '../model/rect';
import type { Mat, Scheme, SchemeRole, SpreadDocument } from '../model/spread';

const ROLES: readonly SchemeRole[] = ['base', 'main', 'second', 'accent'];

/**
 * Share of the visible card, 0–1, that has each of the scheme's colours. Card is visible where no photo,
 * patterned paper, keepsake or other card lies on it; pages count as card. The shares add up to less
 * than 1 where some card has another colour, and are all 0 on a spread without pages.
 *
 * @param prints - sizes of prints mounted whole; a whole print that is not in it covers its photo's place.
 */
export function visibleShares(
  doc: SpreadDocument,
  scheme: Scheme,
  prints?: PrintSizes,
): Record<SchemeRole, number> {
  const shown = new Map<Hex, number>();
  for (const { color, area: units } of shownParts(doc, prints)) shown.set(color, (shown.get(color) ?? 0) + units);
  const total = [...shown.values()].reduce((sum, units) => sum + units, 0);
  const counted = new Set<Hex>();
  const shares: Record<SchemeRole, number> = { base: 0, main: 0, second: 0, accent: 0 };
  for (const role of ROLES) {
    const { hex } = scheme.colors[role];
    // Two roles of one colour: the area counts once, for the first.
    if (total > 0 && !counted.has(hex)) shares[role] = (shown.get(hex) ?? 0) / total;
    counted.add(hex);
  }
  return shares;
}

/** A piece of card that shows: of a page, of a mat, or of a mat's inner mat. */
interface ShownPart {
  readonly matId: MatId | null;
  readonly isInner: boolean;
  readonly color: Hex;
  /** Square Lengths. */
  readonly area: number;
}

type PrintSizes = ReadonlyMap<PrintId, Pick<Print, 'paperWidth' | 'paperHeight'>>;

/** Visible area (square Lengths) of each mat's own card, inner mats left out. */
export function shownCard(doc: SpreadDocument, prints?: PrintSizes): Map<MatId, number> {
  return new Map(shownParts(doc, prints).flatMap(({ matId, isInner, area: units }) => (matId && !isInner ? [[matId, units] as const] : [])));
}

function shownParts(doc: SpreadDocument, prints?: PrintSizes): ShownPart[] {
  const photos = new Map(placedPhotos(doc, (id) => prints?.get(id) ?? FITS_ANY_MAT).map((photo) => [photo.matId, photo]));
  const parts: ShownPart[] = [];
  for (const side of SIDES) {
    const page = doc.pages[side];
    if (!page) continue;
    const mats = doc.mats.filter((mat) => mat.page === side);
    const rects = mats.map((mat) => matRect(doc.format, mat));
    parts.push({ matId: null, isInner: false, color: page.color, area: uncovered({ x: 0, y: 0, width: doc.format.width, height: doc.format.height }, rects) });
    mats.forEach((mat, i) => {
      const over = rects.slice(i + 1);
      const inner = innerMatRect(doc.format, doc.reveal, mat);
      const carried = carriedRects(doc, mat, photos);
      if (inner) parts.push({ matId: mat.id, isInner: true, color: mat.inner!.color, area: uncovered(inner, [...carried, ...over]) });
      parts.push({ matId: mat.id, isInner: false, color: mat.color, area: uncovered(rects[i]!, inner ? [inner, ...over] : [...carried, ...over]) });
    });
  }
  return parts;
}

/** Stands in for an unknown print: as a whole print it covers all that its mat leaves for it. */
const FITS_ANY_MAT = { paperWidth: 1_000_000, paperHeight: 1_000_000 };

function carriedRects(doc: SpreadDocument, mat: Mat, photos: ReadonlyMap<MatId, PlacedPhoto>): Rect[] {
  const photo = photos.get(mat.id);
  const place = contentRect(doc.format, doc.reveal, mat);
  if (photo) return [intersection(photo.rect, place)].filter((rect) => rect !== null);
  if (mat.content.kind === 'paper') return [place];
  if (mat.content.kind !== 'keepsake') return [];
  const { width, height } = mat.content;
  return [{ x: place.x + (place.width - width) / 2, y: place.y + (place.height - height) / 2, width, height }];
}

/** Area of `rect` that none of `covers` hides, exactly: both are cut along all their edges. */
function uncovered(rect: Rect, covers: readonly Rect[]): number {
  const parts = covers.flatMap((cover) => intersection(cover, rect) ?? []);
  if (parts.length === 0) return area(rect);
  if (parts.length === 1) return area(rect) - area(parts[0]!);
  const xs = [...new Set(parts.flatMap((part) => [part.x, right(part)]))].sort((a, b) => a - b);
  const ys = [...new Set(parts.flatMap((part) => [part.y, bottom(part)]))].sort((a, b) => a - b);
  const column = new Map(xs.map((x, i) => [x, i]));
  const row = new Map(ys.map((y, i) => [y, i]));
  const hidden = new Uint8Array(xs.length * ys.length);
  for (const part of parts) {
    for (let r = row.get(part.y)!; r < row.get(bottom(part))!; r++) {
      hidden.fill(1, r * xs.length + column.get(part.x)!, r * xs.length + column.get(right(part))!);
    }
  }
  let covered = 0;
  for (let r = 0; r + 1 < ys.length; r++) {
    for (let c = 0; c + 1 < xs.length; c++) {
      if (hidden[r * xs.length + c]) covered += (xs[c + 1]! - xs[c]!) * (ys[r + 1]! - ys[r]!);
    }
  }
  return area(rect) - covered;
}
