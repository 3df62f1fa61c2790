import type { SchemeRole } from '../model/spread';
import type { CardUnit } from './card-units';
import { improvePlacement } from './improve-placement';
import { CARD_ROLES, placementProblem } from './placement-cost';
import { provePlacement } from './prove-placement';

/** Which of the scheme's colours a mat's card takes. */
export type CardRole = SchemeRole;

export interface Assignment {
  /** One per unit, in order. */
  readonly roles: readonly CardRole[];
  /** True where no cheaper placement exists; false where the search was bounded. */
  readonly isOptimal: boolean;
}

/**
 * The role of every unit that costs least under `placementCost`: found by local search, and for small spreads
 * proven by branch and bound. Same units in the same order, same roles; no clock is read.
 */
export function assignCards(units: readonly CardUnit[]): Assignment {
  const problem = placementProblem(units);
  const found = improvePlacement(problem);
  const { roles, isOptimal } = provePlacement(problem, found);
  return { roles: [...roles].map((role) => CARD_ROLES[role]!), isOptimal };
}
