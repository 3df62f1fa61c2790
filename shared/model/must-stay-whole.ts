import type { Print } from './print';

/** Why a print must not be trimmed: its pack holds caustic paste, there is no other, or it must go back. */
export type WholeReason = 'instant-film' | 'one-of-a-kind' | 'borrowed';

/** The gravest reason why a print must not be trimmed at all, or null. A digital photo can be printed again. PRODUCT.md section 5. */
export function wholeReason({ marks }: Pick<Print, 'marks'>): WholeReason | null {
  if (marks.digital) return null;
  if (marks.instantFilm) return 'instant-film';
  if (marks.oneOfAKind) return 'one-of-a-kind';
  return marks.borrowedUntil === null ? null : 'borrowed';
}

export const mustStayWhole = (print: Pick<Print, 'marks'>): boolean => wholeReason(print) !== null;
