import { Navigate } from 'react-router-dom';
import { lastStudioId, useSession } from '@/lib/session';
import { PlainPage } from '@/components/plain-page';

/** `/` goes to the studio that was open last, or to the first. */
export function Component() {
  const { studios } = useSession();
  const last = lastStudioId();
  const studio = studios.find(({ id }) => id === last) ?? studios[0];
  if (studio === undefined) {
    return (
      <PlainPage title="No studio yet">
        <p>Your account belongs to no studio. Ask an owner to add you, and it shows here.</p>
      </PlainPage>
    );
  }
  return <Navigate to={`/studios/${studio.id}`} replace />;
}
