import type { MatId } from '../model/ids';
import type { SceneItem } from './scene';

/** One mat's items, in drawing order. */
export interface MatItems {
  readonly matId: MatId;
  readonly items: readonly SceneItem[];
}

/** Items by mat, in the order in which the mats are drawn. A mat's items always stand together. */
export function itemsByMat(items: readonly SceneItem[]): MatItems[] {
  const groups: { matId: MatId; items: SceneItem[] }[] = [];
  for (const item of items) {
    const last = groups.at(-1);
    if (last?.matId === item.matId) last.items.push(item);
    else groups.push({ matId: item.matId, items: [item] });
  }
  return groups;
}

/** True where two mats would be drawn alike, so that a screen need not draw the second. */
export const drawAlike = (a: readonly SceneItem[], b: readonly SceneItem[]): boolean => isSame(a, b);

/** Structural equality of plain data; an absent property and an undefined one are the same. */
function isSame(a: unknown, b: unknown): boolean {
  if (Object.is(a, b)) return true;
  if (typeof a !== 'object' || typeof b !== 'object' || a === null || b === null) return false;
  if (Array.isArray(a) || Array.isArray(b)) {
    return Array.isArray(a) && Array.isArray(b) && a.length === b.length && a.every((value, i) => isSame(value, b[i]));
  }
  const left = a as Record<string, unknown>;
  const right = b as Record<string, unknown>;
  return Object.keys({ ...left, ...right }).every((key) => isSame(left[key], right[key]));
}
