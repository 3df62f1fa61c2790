import type { AlbumId, GrantId, PileId, SpreadId, StudioId, UserId } from './ids';

export const ROLES = ['owner', 'designer', 'reviewer', 'contributor'] as const;
export type Role = (typeof ROLES)[number];

export interface Membership {
  readonly studioId: StudioId;
  readonly role: Role;
}

/** A right without a membership: link holders, attendees and phones. MODEL.md 11. */
export interface Grant {
  readonly id: GrantId;
  readonly studioId: StudioId;
  readonly scope: GrantScope;
}

export type GrantScope =
  | { readonly kind: 'spread-link'; readonly spreadId: SpreadId; readonly mayComment: boolean }
  | { readonly kind: 'workshop'; readonly workshopId: string; readonly copyStudioId: StudioId | null }
  | { readonly kind: 'worktable'; readonly spreadId: SpreadId };

/** Who asks. Expired and withdrawn grants are left out when the actor is built. */
export interface Actor {
  readonly userId: UserId | null;
  readonly memberships: readonly Membership[];
  readonly grants: readonly Grant[];
}

/** What is asked about: always a studio, more exact where the thing is. */
export interface Target {
  readonly studioId: StudioId;
  readonly albumId?: AlbumId;
  readonly spreadId?: SpreadId;
  readonly pileId?: PileId | null;
  /** The pile is shared with contributors. */
  readonly sharedWithContributors?: boolean;
  /** The print was sent by this contributor. */
  readonly contributedBy?: UserId | null;
}
