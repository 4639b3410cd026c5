import type { RequestHandler } from 'express';
import { Refusal } from './refusal.ts';

/**
 * Refuses a change that another site made a browser send. Browsers state where a request comes from in
 * Sec-Fetch-Site and Origin and no page can alter either; a script that sends neither is no browser.
 */
export const sameOrigin: RequestHandler = (request, _response, next) => {
  if (request.method === 'GET' || request.method === 'HEAD') return next();
  const site = request.get('sec-fetch-site');
  const origin = request.get('origin');
  const foreignSite = site !== undefined && site !== 'same-origin' && site !== 'none';
  const foreignOrigin = origin !== undefined && hostOf(origin) !== request.host;
  if (foreignSite || foreignOrigin)
    throw new Refusal(403, 'cross-site', 'Refused', 'Changes are taken only from pages of this address.');
  next();
};

function hostOf(origin: string): string | null {
  return URL.canParse(origin) ? new URL(origin).host : null;
}
