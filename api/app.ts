import compression from 'compression';
import cookieParser from 'cookie-parser';
import express, { type Express, Router } from 'express';
import { endpoints, type EndpointName } from '#core/contract/endpoints.ts';
import type { Deps } from './deps.ts';
import { answerProblems } from './http/answer-problems.ts';
import { logRequests } from './http/log-requests.ts';
import { notFound } from './http/refusal.ts';
import type { AnyRoute } from './http/route.ts';
import { sameOrigin } from './http/same-origin.ts';
import { securityHeaders } from './http/security-headers.ts';
import { serveEndpoint } from './http/serve-endpoint.ts';
import { servePages } from './http/serve-pages.ts';
import { routes } from './routes.ts';

/** The whole application as one express app, not yet listening. */
export function createApp(deps: Deps): Express {
  const app = express();
  app.disable('x-powered-by');
  app.disable('etag');
  app.set('trust proxy', deps.trustProxy);
  app.set('query parser', 'simple');
  app.use(logRequests(deps.logger));
  app.use(securityHeaders(deps.publicUrl));
  app.use(compression());
  app.use('/api/v1', apiRouter(deps));
  app.use('/api', () => {
    throw notFound();
  });
  if (deps.webFolder) app.use(servePages(deps.webFolder));
  app.use(() => {
    throw notFound();
  });
  app.use(answerProblems);
  return app;
}

function apiRouter(deps: Deps): Router {
  const router = Router({ caseSensitive: true, strict: true });
  router.use((_request, response, next) => {
    response.set('Cache-Control', 'no-store');
    next();
  });
  router.use(sameOrigin, cookieParser());
  for (const name of Object.keys(endpoints) as EndpointName[]) {
    const endpoint = endpoints[name];
    const path = endpoint.path.replace(/\{(\w+)\}/g, ':$1');
    router[endpoint.method](path, serveEndpoint(deps, name, endpoint, routes[name] as AnyRoute));
  }
  return router;
}
