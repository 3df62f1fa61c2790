import type { z } from 'zod';
import type { Member, Session, Studio } from '../../shared/contracts/accounts';
import type { createdGrantSchema, grantSchema } from '../../shared/contracts/grants';
import type { Role } from '../../shared/model/people';
import type { GrantEntity } from '../entities/grant-entity';
import type { MembershipEntity } from '../entities/membership-entity';
import type { StudioEntity } from '../entities/studio-entity';
import type { UserEntity } from '../entities/user-entity';
import type { Mode } from '../config';
import type { StudioWithRole } from '../services/studio-service';

export const presentStudio = (studio: StudioEntity, role: Role): Studio => ({
  id: studio.id,
  name: studio.name,
  role,
  unit: studio.unit,
  trim: { tolerance: studio.tolerance, finestMark: studio.finestMark },
});

export const presentSession = (user: UserEntity, studios: readonly StudioWithRole[], mode: Mode): Session => ({
  user: { id: user.id, name: user.name, email: user.email },
  studios: studios.map(({ studio, role }) => presentStudio(studio, role)),
  mode,
});

/** Loaded with its `user`. */
export const presentMember = (membership: MembershipEntity): Member => ({
  userId: membership.userId,
  name: membership.user?.name ?? '',
  role: membership.role,
});

export const presentGrant = (grant: GrantEntity): z.output<typeof grantSchema> => ({
  id: grant.id,
  scope: grant.scope,
  expiresAt: grant.expiresAt?.toISOString() ?? null,
  withdrawnAt: grant.withdrawnAt?.toISOString() ?? null,
});

export const presentCreatedGrant = (grant: GrantEntity, token: string): z.output<typeof createdGrantSchema> => ({
  ...presentGrant(grant),
  token,
});
