import { createBrowserRouter } from 'react-router-dom';
import { RequireSession } from './features/session/components/require-session';
import { NotFound } from './routes/not-found';
import { Root } from './routes/root';
import { RouteError, StageError } from './routes/route-error';

/**
 * The routes. Every screen is its own chunk, so that whoever signs in does not fetch the editor. Each
 * level has an error boundary of its own: a fault inside a stage leaves the bar and the save state standing.
 */
export const createRouter = () =>
  createBrowserRouter([
    {
      Component: Root,
      ErrorBoundary: RouteError,
      HydrateFallback: () => null,
      children: [
        { path: 'sign-in', lazy: () => import('./routes/sign-in') },
        { path: 'sign-up', lazy: () => import('./routes/sign-up') },
        { path: 'help', lazy: () => import('./routes/help') },
        { path: 'help/weight', lazy: () => import('./routes/help-weight') },
        { path: 'help/checks/:checkId', lazy: () => import('./routes/help-check') },
        {
          Component: RequireSession,
          ErrorBoundary: RouteError,
          children: [
            { index: true, lazy: () => import('./routes/home') },
            { path: 'studios/:studioId', lazy: () => import('./routes/studio') },
            { path: 'studios/:studioId/prints', lazy: () => import('./routes/studio-prints') },
            { path: 'studios/:studioId/stash', lazy: () => import('./routes/studio-stash') },
            { path: 'albums/:albumId', lazy: () => import('./routes/album') },
            {
              path: 'spreads/:spreadId',
              lazy: () => import('./routes/spread'),
              ErrorBoundary: RouteError,
              children: [
                { index: true, lazy: () => import('./routes/spread-compose'), ErrorBoundary: StageError },
                { path: 'sort', lazy: () => import('./routes/spread-sort'), ErrorBoundary: StageError },
                { path: 'match', lazy: () => import('./routes/spread-match'), ErrorBoundary: StageError },
              ],
            },
          ],
        },
        { path: '*', Component: NotFound },
      ],
    },
  ]);
