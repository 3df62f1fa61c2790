import { createContext, use } from 'react';
import type { Session, Studio } from '#shared/contracts/accounts';
import { can, type Permission } from '#shared/permissions';
import type { Target } from '#shared/model/people';

/** Who is signed in; null only outside the screens that ask for a session. */
export const SessionContext = createContext<Session | null>(null);

/** The signed-in person and their studios. @throws outside RequireSession. */
export function useSession(): Session {
  const session = use(SessionContext);
  if (session === null) throw new Error('useSession needs RequireSession above it');
  return session;
}

/** A studio of the signed-in person, or undefined where they are not a member. */
export function useStudio(studioId: string | undefined): Studio | undefined {
  return useSession().studios.find(({ id }) => id === studioId);
}

/**
 * Whether the signed-in person may do this, by the same table that the server asks. It only decides what
 * is shown; the server decides what is done.
 */
export function useMay(): (permission: Permission, target: Target) => boolean {
  const { user, studios } = useSession();
  return (permission, target) =>
    can(
      { userId: user.id, memberships: studios.map(({ id, role }) => ({ studioId: id, role })), grants: [] },
      permission,
      target,
    ) === 'allow';
}

const LAST_STUDIO = 'pairleaf.last-studio';

/** The studio that was open last in this browser; kept so that `/` goes back to it. */
export const lastStudioId = (): string | null => window.localStorage.getItem(LAST_STUDIO);
export const rememberStudio = (studioId: string): void => window.localStorage.setItem(LAST_STUDIO, studioId);
