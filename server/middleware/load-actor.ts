import type { RequestHandler } from 'express';
import type { DataSource } from 'typeorm';
import { GRANT_HEADER } from '../../shared/contracts/grants';
import type { Actor } from '../../shared/model/people';
import { MembershipEntity } from '../entities/membership-entity';
import type { GrantService } from '../services/grant-service';

export const NOBODY: Actor = { userId: null, memberships: [], grants: [] };

/** Builds who asks from the session and from a grant's token; what has ended is left out. */
export function loadActor(dataSource: DataSource, grants: GrantService): RequestHandler {
  return async (req, _res, next) => {
    const token = req.get(GRANT_HEADER);
    const [memberships, grant] = await Promise.all([
      req.user ? dataSource.manager.findBy(MembershipEntity, { userId: req.user.id }) : [],
      token ? grants.findLive(token) : null,
    ]);
    req.actor = {
      userId: req.user?.id ?? null,
      memberships: memberships.map(({ studioId, role }) => ({ studioId, role })),
      grants: grant ? [grant] : [],
    };
    next();
  };
}
