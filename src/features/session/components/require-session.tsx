import { useQuery } from '@tanstack/react-query';
import { Navigate, Outlet, useLocation } from 'react-router-dom';
import { SessionContext } from '@/lib/session';
import { sessionQuery } from '../api/session-queries';

/** Lets only signed-in people further; all others go to the sign-in page and come back after it. */
export function RequireSession() {
  const location = useLocation();
  const { data: session, error } = useQuery(sessionQuery);
  if (error !== null && session === undefined) throw error;
  if (session === undefined) return null;
  if (session === null) {
    const here = location.pathname + location.search;
    return <Navigate to={here === '/' ? '/sign-in' : `/sign-in?next=${encodeURIComponent(here)}`} replace />;
  }
  return (
    <SessionContext value={session}>
      <Outlet />
    </SessionContext>
  );
}
