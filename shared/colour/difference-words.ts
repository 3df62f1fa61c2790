/** How two colours compare to the eye, from the least difference to the greatest. */
export const DIFFERENCES = ['indistinguishable', 'close', 'near', 'different'] as const;
export type Difference = (typeof DIFFERENCES)[number];

/** CIEDE2000 under which each word holds; about 1 is just noticeable side by side. The steps above it are common practice. */
export const DIFFERENCE_LIMITS = { indistinguishable: 1, close: 3, near: 6 } as const;

/**
 * The word for a CIEDE2000 difference, no finer than what is known: with a colour known to ±4 nothing can be told
 * apart from *near*, so it is never called *indistinguishable*.
 *
 * @param uncertainty - of the two colours together, in CIEDE2000; 0 where both are exact.
 */
export function differenceWord(deltaE: number, uncertainty = 0): Difference {
  const told = Math.max(deltaE, uncertainty);
  if (told < DIFFERENCE_LIMITS.indistinguishable) return 'indistinguishable';
  if (told < DIFFERENCE_LIMITS.close) return 'close';
  return told < DIFFERENCE_LIMITS.near ? 'near' : 'different';
}
