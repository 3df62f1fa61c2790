import type { Actor, Grant, Role, Target } from './model/people';

/**
 * Every permission with the roles that have it: PRODUCT.md section 8. `link`, `worktable` and
 * `attendee` are grants; they only ever reach the one thing that they name.
 */
export const PERMISSIONS = {
  'studio:see': ['owner', 'designer', 'reviewer', 'contributor'],
  'studio:edit': ['owner'],
  'studio:delete': ['owner'],
  'member:see': ['owner', 'designer', 'reviewer'],
  'member:edit': ['owner'],
  'grant:see': ['owner', 'designer'],
  'grant:edit': ['owner', 'designer'],
  'album:see': ['owner', 'designer', 'reviewer'],
  'album:edit': ['owner', 'designer'],
  'album:delete': ['owner'],
  'spread:see': ['owner', 'designer', 'reviewer', 'link', 'worktable'],
  /** What was there before, and who changed it: more than the spread itself shows. */
  'spread:history': ['owner', 'designer', 'reviewer'],
  'spread:edit': ['owner', 'designer'],
  'spread:comment': ['owner', 'designer', 'reviewer', 'commenting-link'],
  'spread:delete': ['owner'],
  'print:see': ['owner', 'designer', 'reviewer'],
  'print:add': ['owner', 'designer', 'contributor-shared-pile'],
  'print:edit': ['owner', 'designer'],
  'print:delete': ['owner'],
  'picture:see': ['owner', 'designer', 'reviewer', 'contributor-own', 'link', 'worktable'],
  'pile:see': ['owner', 'designer', 'reviewer', 'contributor-shared-pile'],
  'pile:edit': ['owner', 'designer'],
  'cut-size:see': ['owner', 'designer', 'reviewer'],
  'cut-size:edit': ['owner', 'designer'],
  'format:edit': ['owner', 'designer'],
  'stash:see': ['owner', 'designer', 'reviewer'],
  'stash:edit': ['owner', 'designer'],
  'check:see': ['owner', 'designer', 'reviewer'],
  'check:edit': ['owner', 'designer'],
  'export:make': ['owner', 'designer', 'reviewer'],
  'data:download': ['owner'],
} as const satisfies Record<string, readonly Holder[]>;

type Holder = Role | 'contributor-shared-pile' | 'contributor-own' | 'link' | 'commenting-link' | 'worktable';
export type Permission = keyof typeof PERMISSIONS;

/** `hide`: to this person the thing does not exist (404). `forbid`: they may see it, but not do this (403). */
export type Decision = 'allow' | 'forbid' | 'hide';

/** For each noun, what counts as seeing it: whoever may see it is told "forbidden", all others "not found". */
const SEES: Record<string, Permission> = {
  studio: 'studio:see',
  member: 'member:see',
  grant: 'grant:see',
  album: 'album:see',
  spread: 'spread:see',
  print: 'print:see',
  picture: 'picture:see',
  pile: 'pile:see',
  'cut-size': 'cut-size:see',
  format: 'cut-size:see',
  stash: 'stash:see',
  check: 'check:see',
  export: 'spread:see',
  data: 'studio:see',
};

/** The one decision function, on both sides of the wire. */
export function can(actor: Actor, permission: Permission, target: Target): Decision {
  if (isHeld(actor, permission, target)) return 'allow';
  return isHeld(actor, SEES[permission.split(':')[0]!]!, target) ? 'forbid' : 'hide';
}

function isHeld(actor: Actor, permission: Permission, target: Target): boolean {
  const role = actor.memberships.find((m) => m.studioId === target.studioId)?.role;
  return PERMISSIONS[permission].some((holder: Holder) => {
    switch (holder) {
      case 'contributor-shared-pile':
        return role === 'contributor' && target.sharedWithContributors === true;
      case 'contributor-own':
        return role === 'contributor' && actor.userId !== null && target.contributedBy === actor.userId;
      case 'link':
        return hasGrant(actor, target, ({ scope }) => scope.kind === 'spread-link' && scope.spreadId === target.spreadId);
      case 'commenting-link':
        return hasGrant(
          actor,
          target,
          ({ scope }) => scope.kind === 'spread-link' && scope.spreadId === target.spreadId && scope.mayComment,
        );
      case 'worktable':
        return hasGrant(actor, target, ({ scope }) => scope.kind === 'worktable' && scope.spreadId === target.spreadId);
      default:
        return role === holder;
    }
  });
}

const hasGrant = (actor: Actor, target: Target, fits: (grant: Grant) => boolean): boolean =>
  target.spreadId !== undefined && actor.grants.some((grant) => grant.studioId === target.studioId && fits(grant));
