import { randomUUID } from 'node:crypto';
import type { RequestHandler } from 'express';
import type { Logger } from 'pino';
import { pinoHttp } from 'pino-http';

/** One line per request, with an id that the answer carries too; no cookies, no bodies, no links that let in. */
export function logRequests(logger: Logger): RequestHandler {
  return pinoHttp({
    logger,
    genReqId: (request, response) => {
      const given = request.headers['x-request-id'];
      const id = typeof given === 'string' && /^[\w-]{8,64}$/.test(given) ? given : randomUUID();
      response.setHeader('X-Request-Id', id);
      return id;
    },
    customLogLevel: (_request, response, error) => {
      // A part that is away is told once a second by whoever answers for it, not once per request.
      if (response.statusCode === 503) return 'debug';
      if (error || response.statusCode >= 500) return 'error';
      return response.statusCode >= 400 ? 'info' : 'debug';
    },
    serializers: {
      req: (request: { id: unknown; method: string; url: string; remoteAddress: string }) => ({
        id: request.id,
        method: request.method,
        url: request.url.replace(/^\/(invitations|password-reset)\/.*/, '/$1/…'),
        address: request.remoteAddress,
      }),
      res: (response: { statusCode: number }) => ({ status: response.statusCode }),
    },
  });
}
