import { z } from 'zod';
import { openApi } from './open-api.ts';
import { type Route, session } from './route.ts';
import { boardRoutes } from './routes/board-routes.ts';
import { fleetRoutes } from './routes/fleet-routes.ts';
import { readinessRoutes } from './routes/readiness-routes.ts';
import { sessionRoutes } from './routes/session-routes.ts';
import { setUpRoutes } from './routes/set-up-routes.ts';
import { shiftRoutes } from './routes/shift-routes.ts';
import { stayRoutes } from './routes/stay-routes.ts';
import { surveillanceRoutes } from './routes/surveillance-routes.ts';

/** Every route of the service, the description of them all among them. */
export const routes: Route[] = [
  ...sessionRoutes,
  ...boardRoutes,
  ...stayRoutes,
  ...readinessRoutes,
  ...surveillanceRoutes,
  ...shiftRoutes,
  ...fleetRoutes,
  ...setUpRoutes,
  session({
    method: 'get',
    path: '/api/openapi.json',
    summary: 'This description',
    needs: 'nobody',
    response: z.looseObject({}),
    handle: async ({ deps }) => openApi(routes, deps.version),
  }),
];
