import type { Pile } from '#shared/contracts/prints';
import type { Print } from '#shared/model/print';

export interface PileGroup {
  /** Null for the prints that lie in no pile. */
  readonly id: string | null;
  readonly name: string;
  readonly prints: readonly Print[];
  readonly sharedWithContributors: boolean;
}

const byPosition = (a: { readonly position: number; readonly id: string }, b: { readonly position: number; readonly id: string }): number =>
  a.position - b.position || (a.id < b.id ? -1 : 1);

/** The piles in their order with their prints in theirs; the loose prints last. A pile that is gone counts as none. */
export function groupByPile(piles: readonly Pile[], prints: readonly Print[]): PileGroup[] {
  const known = new Set(piles.map(({ id }) => id));
  const pileOf = ({ pileId }: Print): string | null => (pileId !== null && known.has(pileId) ? pileId : null);
  const inPile = (id: string | null): Print[] => prints.filter((print) => pileOf(print) === id).sort(byPosition);
  return [
    ...[...piles].sort(byPosition).map(({ id, name, sharedWithContributors }) => ({ id, name, sharedWithContributors, prints: inPile(id) })),
    { id: null, name: 'Loose', prints: inPile(null), sharedWithContributors: false },
  ];
}

/**
 * The pile that a typed letter means: the first whose name begins with it, after the one that the print is in,
 * so that the same letter again goes on to the next such pile.
 */
export function pileByLetter(groups: readonly PileGroup[], letter: string, currentId: string | null): PileGroup | undefined {
  const fits = groups.filter(({ name }) => name.toLowerCase().startsWith(letter.toLowerCase()));
  const current = fits.findIndex(({ id }) => id === currentId);
  const next = fits[(current + 1) % Math.max(1, fits.length)];
  return next?.id === currentId ? undefined : next;
}
