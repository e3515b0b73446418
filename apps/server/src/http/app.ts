import { existsSync } from 'node:fs';
import { join } from 'node:path';
import express, { type Express, type Response } from 'express';
import { pinoHttp } from 'pino-http';
import type { Deps } from '../deps.ts';
import { onlyJson } from './middleware/only-json.ts';
import { answerProblems, BODY_LIMIT_KB, noSuchRoute } from './middleware/problems.ts';
import { sameOriginWrites } from './middleware/same-origin.ts';
import { neverStored, securityHeaders } from './middleware/security-headers.ts';
import { signInLimits } from './middleware/sign-in-limit.ts';
import { routes } from './routes.ts';
import { serveRoute } from './serve-route.ts';

/** The whole service over HTTP: the API under /api, the wall at /wall, the tablet everywhere else. */
export function makeApp(deps: Deps, { publicFolder }: { publicFolder: string }): Express {
  const app = express();
  app.disable('x-powered-by');
  app.set('trust proxy', deps.settings.proxies);
  app.use(requestLog(deps));
  app.use(securityHeaders(deps.settings.origin));
  app.use('/api', apiRouter(deps));
  app.use(pages(publicFolder));
  app.use(noSuchRoute);
  app.use(answerProblems(deps.log));
  return app;
}

function apiRouter(deps: Deps) {
  const router = express.Router();
  router.use(
    neverStored,
    sameOriginWrites(deps.settings.origin),
    onlyJson,
    express.json({ limit: `${BODY_LIMIT_KB}kb`, strict: false }),
  );
  router.post('/session', signInLimits());
  for (const route of routes) router[route.method](route.path.slice('/api'.length), serveRoute(deps, route));
  router.use(noSuchRoute);
  return router;
}

/** The built apps. Their scripts carry a hash in the name and never change; the pages are asked for each time. */
function pages(publicFolder: string) {
  const router = express.Router();
  const page = (name: 'wall' | 'tablet') => (_req: unknown, res: Response) => {
    res.set('Cache-Control', 'no-cache').sendFile(join(publicFolder, 'apps', name, 'index.html'));
  };
  if (!existsSync(publicFolder)) return router;
  router.use(
    '/assets',
    express.static(join(publicFolder, 'assets'), {
      immutable: true,
      maxAge: '1y',
      index: false,
      fallthrough: false,
    }),
  );
  router.use(express.static(publicFolder, { index: false, redirect: false }));
  router.get(['/wall', '/wall/*splat'], page('wall'));
  router.get(['/', '/*splat'], page('tablet'));
  return router;
}

/** One line a request: method, route, status, time. No address with an id's owner, no body, no name. */
function requestLog({ log }: Deps) {
  return pinoHttp({
    logger: log,
    serializers: {
      req: (req: { method: string }) => ({ method: req.method }),
      res: (res: { statusCode: number }) => ({ status: res.statusCode }),
    },
    customProps: (req) => ({ route: routeOf(req) }),
    customLogLevel: (_req, res, error) => (error || res.statusCode >= 500 ? 'error' : 'debug'),
    wrapSerializers: false,
  });
}

function routeOf(req: object): string | null {
  const route: unknown = 'route' in req ? req.route : null;
  return typeof route === 'object' && route !== null && 'path' in route && typeof route.path === 'string'
    ? route.path
    : null;
}
