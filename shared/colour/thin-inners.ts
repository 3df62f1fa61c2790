import type { MatId } from '../model/ids';
import type { Mat, Scheme, SchemeRole } from '../model/spread';
import { MIN_REVEAL } from '../model/trim-settings';
import type { CardRole } from './assign-cards';
import type { CardUnit } from './card-units';

/** A light inner mat first, since it parts most photos from most card. */
const INNER_ORDER: readonly SchemeRole[] = ['base', 'second', 'accent', 'main'];

/**
 * What changes of a unit's inner mats once its card has a colour, by mat: a thin one where the card hides
 * the photo and an inner mat helps; the person's own one in a colour of the scheme where it hides the
 * photo; null where the last scheme's one is not needed any more; nothing where all stays.
 *
 * @param before - the mats as they are in the document.
 */
export function innersFor(unit: CardUnit, role: CardRole, scheme: Scheme, before: ReadonlyMap<MatId, Mat>): Record<MatId, Mat['inner']> {
  const inners: Record<MatId, Mat['inner']> = {};
  const helping = INNER_ORDER.find((candidate) => candidate !== role && unit.inner[candidate].fits);
  const needsThin = !unit.card[role].fits && unit.mayTakeInner && helping !== undefined;
  for (const mat of unit.mats) {
    const inner = wanted(mat, needsThin, helping, unit, scheme);
    const now = before.get(mat.id)?.inner ?? null;
    if (now?.color !== inner?.color || now?.reveal !== inner?.reveal) inners[mat.id] = inner;
  }
  return inners;
}

function wanted(mat: Mat, needsThin: boolean, helping: SchemeRole | undefined, unit: CardUnit, scheme: Scheme): Mat['inner'] {
  if (mat.inner) return unit.ownInnerHides && helping ? { ...mat.inner, color: scheme.colors[helping].hex } : mat.inner;
  return needsThin && helping ? { color: scheme.colors[helping].hex, reveal: MIN_REVEAL } : null;
}
