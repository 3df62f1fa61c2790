import { Navigate, useLocation, useRouteError } from 'react-router-dom';
import { Button } from '@/components/button';
import { PlainPage } from '@/components/plain-page';
import { ApiError } from '@/lib/api';
import { NotFound } from './not-found';

/** What a screen shows when it could not be drawn or loaded. */
export const RouteError = () => <Failure hasBar />;

/** The same for one stage of a spread, under the spread's own bar: undo and the save state stay in reach. */
export const StageError = () => <Failure hasBar={false} />;

function Failure({ hasBar }: { readonly hasBar: boolean }) {
  const error = useRouteError();
  const { pathname, search } = useLocation();
  if (error instanceof ApiError && error.code === 'not-found') return <NotFound hasBar={hasBar} />;
  if (error instanceof ApiError && error.code === 'unauthenticated') {
    return <Navigate to={`/sign-in?next=${encodeURIComponent(pathname + search)}`} replace />;
  }
  return (
    <PlainPage hasBar={hasBar} title={error instanceof ApiError ? 'This could not be fetched' : 'Something slipped'}>
      <p>
        {error instanceof ApiError
          ? error.detail
          : 'This screen stopped because of a fault of ours. What was saved is safe; load the page again to go on.'}
      </p>
      <p className="mt-4">
        <Button variant="paper" onClick={() => window.location.reload()}>
          Load again
        </Button>
      </p>
    </PlainPage>
  );
}
