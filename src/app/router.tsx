import { createBrowserRouter } from 'react-router-dom';
import { SiteLayout } from './layouts/site-layout';
import { requireSession } from './require-session';
import { RouteError } from './route-error';

/** Nothing is shown while the first page's module is on its way. */
const HydrateFallback = () => null;

/** A route module is fetched when it is first visited; each exports its page as `Component`. */
export const router = createBrowserRouter([
  { path: '/sign-in', lazy: () => import('./routes/sign-in'), HydrateFallback, ErrorBoundary: RouteError },
  {
    path: '/invitation/:token',
    lazy: () => import('./routes/invitation'),
    HydrateFallback,
    ErrorBoundary: RouteError,
  },
  { path: '/reset', lazy: () => import('./routes/forgotten'), HydrateFallback, ErrorBoundary: RouteError },
  { path: '/reset/:token', lazy: () => import('./routes/reset'), HydrateFallback, ErrorBoundary: RouteError },
  {
    path: '/',
    Component: SiteLayout,
    loader: requireSession,
    ErrorBoundary: RouteError,
    HydrateFallback,
    children: [
      {
        ErrorBoundary: RouteError,
        children: [
          { index: true, lazy: () => import('./routes/boards') },
          { path: 'boards/new', lazy: () => import('./routes/new-board') },
          { path: 'boards/:boardId', lazy: () => import('./routes/board') },
          { path: 'boards/:boardId/people', lazy: () => import('./routes/board-people') },
          { path: 'boards/:boardId/stack-up', lazy: () => import('./routes/setup') },
          { path: 'boards/:boardId/rails/new', lazy: () => import('./routes/new-rail') },
          { path: 'boards/:boardId/rails/:railId', lazy: () => import('./routes/bench') },
          {
            path: 'boards/:boardId/rails/:railId/specification',
            lazy: () => import('./routes/specification'),
          },
          { path: 'boards/:boardId/revisions', lazy: () => import('./routes/revisions') },
          { path: 'boards/:boardId/revisions/:letter', lazy: () => import('./routes/revision') },
          { path: 'boards/:boardId/placement', lazy: () => import('./routes/placement') },
          { path: 'parts', lazy: () => import('./routes/parts') },
          { path: 'parts/new', lazy: () => import('./routes/new-part') },
          { path: 'parts/:partId', lazy: () => import('./routes/part') },
          { path: 'people', lazy: () => import('./routes/people') },
          { path: 'mail', lazy: () => import('./routes/mail') },
          { path: 'account', lazy: () => import('./routes/account') },
          { path: '*', lazy: () => import('./routes/not-found') },
        ],
      },
    ],
  },
]);
