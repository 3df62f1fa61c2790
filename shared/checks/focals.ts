import { matRect } from '../geometry/grid';
import { area, boundingBox } from '../geometry/rects';
import { SIDES, type Side } from '../model/ids';
import type { Rect } from '../model/rect';
import type { Mat } from '../model/spread';
import type { SpreadView } from './check';
import { weighSpread } from './weight';

/** The mat that the eye lands on first on one page; for a pane, its whole split print. */
export interface Focal {
  readonly mat: Mat;
  readonly page: Side;
  /** In page space. */
  readonly rect: Rect;
}

/** The mats that somebody declared as focal, at most one per page, left first. */
export function declaredFocals({ doc }: SpreadView): Focal[] {
  return SIDES.flatMap((page) => {
    const mat = doc.mats.find((candidate) => candidate.focal && candidate.page === page);
    return mat ? [{ mat, page, rect: focalRect(doc, mat) }] : [];
  });
}

/** A mat's rectangle, or the bounding box of the split print that it is a pane of. */
export function focalRect(doc: SpreadView['doc'], mat: Mat): Rect {
  const own = matRect(doc.format, mat);
  if (mat.content.kind !== 'pane') return own;
  const { groupId } = mat.content;
  const members = doc.mats.filter(({ content }) => content.kind === 'pane' && content.groupId === groupId);
  return members.length === 0 ? own : boundingBox(members.map((member) => matRect(doc.format, member)));
}

/** Mats that carry a picture, the largest first; among equals the one in drawing order. */
export function picturesBySize({ doc }: SpreadView): readonly { readonly mat: Mat; readonly area: number }[] {
  const groups = new Map<string, number>();
  for (const mat of doc.mats) {
    if (mat.content.kind === 'pane') {
      const { groupId } = mat.content;
      groups.set(groupId, (groups.get(groupId) ?? 0) + area(matRect(doc.format, mat)));
    }
  }
  const seen = new Set<string>();
  return doc.mats
    .flatMap((mat) => {
      if (mat.content.kind === 'print') return [{ mat, area: area(matRect(doc.format, mat)) }];
      if (mat.content.kind !== 'pane' || seen.has(mat.content.groupId)) return [];
      seen.add(mat.content.groupId);
      return [{ mat, area: groups.get(mat.content.groupId)! }];
    })
    .sort((a, b) => b.area - a.area);
}

/** A mat, or all panes of one split print together, with its visual weight. */
export interface WeighedUnit {
  readonly mat: Mat;
  readonly page: Side;
  readonly isFocal: boolean;
  readonly weight: number;
}

/** Every mat and split print of the spread's pages, in drawing order of its first mat. */
export function weighedUnits(view: SpreadView): readonly WeighedUnit[] {
  const { mats: weights } = weighSpread(view);
  const units = new Map<string, { mat: Mat; page: Side; isFocal: boolean; weight: number }>();
  for (const mat of view.doc.mats) {
    const key = mat.content.kind === 'pane' ? mat.content.groupId : mat.id;
    const weight = weights.get(mat.id) ?? 0;
    const unit = units.get(key);
    if (!unit) units.set(key, { mat, page: mat.page, isFocal: mat.focal, weight });
    else {
      unit.weight += weight;
      unit.isFocal ||= mat.focal;
    }
  }
  return [...units.values()];
}
