import { boardRoutes } from './board.routes';
import { linkRoutes } from './link.routes';
import { partRoutes } from './part.routes';
import { peopleRoutes } from './people.routes';
import { railRoutes } from './rail.routes';
import { revisionRoutes } from './revision.routes';
import type { Route } from './route';
import { sessionRoutes } from './session.routes';
import { siteRoutes } from './site.routes';

export const routes: readonly Route[] = [
  ...siteRoutes,
  ...sessionRoutes,
  ...linkRoutes,
  ...peopleRoutes,
  ...boardRoutes,
  ...railRoutes,
  ...partRoutes,
  ...revisionRoutes,
];
