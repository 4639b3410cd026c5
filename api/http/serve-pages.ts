import { join } from 'node:path';
import express, { Router } from 'express';

/** The built pages: assets with a hash in their name for ever, the page itself fresh every time, for every address. */
export function servePages(folder: string): Router {
  const router = Router();
  router.use(
    '/assets',
    express.static(join(folder, 'assets'), { immutable: true, maxAge: '1y', index: false, fallthrough: false }),
  );
  router.use(
    express.static(folder, {
      index: false,
      setHeaders: (response) => void response.setHeader('Cache-Control', 'no-cache'),
    }),
  );
  router.get('/{*path}', (_request, response, next) => {
    response.set('Cache-Control', 'no-cache');
    response.sendFile(join(folder, 'index.html'), { cacheControl: false }, (error: unknown) => {
      if (error) next(error);
    });
  });
  return router;
}
