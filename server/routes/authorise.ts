import { AppError } from '../../shared/errors';
import type { Actor, Target } from '../../shared/model/people';
import { can, type Permission } from '../../shared/permissions';

/**
 * Turns `can`'s decision into an error. Guarded routes call it themselves; a handler calls it again only where
 * the body names a second thing.
 *
 * @throws AppError `unauthenticated` for nobody at all, `not-found` for outsiders, `forbidden` for members.
 */
export function authorise(actor: Actor, permission: Permission, target: Target): void {
  const decision = can(actor, permission, target);
  if (decision === 'allow') return;
  if (isNobody(actor)) throw new AppError('unauthenticated');
  throw new AppError(decision === 'forbid' ? 'forbidden' : 'not-found');
}

/** Neither signed in nor holding a grant. */
export const isNobody = (actor: Actor): boolean => actor.userId === null && actor.grants.length === 0;
