import { assemblyRoutes } from './assemblies/assembly-routes.ts';
import { auditRoutes } from './audit/audit-routes.ts';
import type { Routes } from './http/route.ts';
import { libraryRoutes } from './library/library-routes.ts';
import { reviewRoutes } from './review/review-routes.ts';
import { serviceRoutes } from './service/service-routes.ts';
import { sessionRoutes } from './session/session-routes.ts';
import { sketchRoutes } from './sketch/sketch-routes.ts';
import { solvingRoutes } from './solving/solving-routes.ts';
import { teamRoutes } from './team/team-routes.ts';

/** One route for every entry of the endpoint table; the compiler misses none. */
export const routes: Routes = {
  ...serviceRoutes,
  ...sessionRoutes,
  ...teamRoutes,
  ...assemblyRoutes,
  ...sketchRoutes,
  ...solvingRoutes,
  ...reviewRoutes,
  ...libraryRoutes,
  ...auditRoutes,
};
