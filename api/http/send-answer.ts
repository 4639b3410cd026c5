import { createHash } from 'node:crypto';
import type { Request, Response } from 'express';
import type { Endpoint } from '#core/contract/endpoint.ts';
import type { Deps } from '../deps.ts';
import type { AnyRoute } from './route.ts';
import { setSessionCookie } from './session-cookie.ts';

/** Writes what a route gave, as its endpoint says. */
export function sendAnswer(
  deps: Deps,
  request: Request,
  response: Response,
  endpoint: Endpoint,
  answer: Awaited<ReturnType<AnyRoute>>,
): void {
  if (answer.session !== undefined) setSessionCookie(response, deps.publicUrl, answer.session);
  if (answer.version !== undefined) response.set('ETag', `"${answer.version}"`);
  response.status(answer.status ?? endpoint.status);
  if (answer.pdf) return sendPdf(request, response, answer.pdf, answer.fileName ?? 'record.pdf');
  if (endpoint.answer === null) return void response.end();
  if (deps.checkAnswers && typeof endpoint.answer === 'object') endpoint.answer.parse(answer.body);
  // Written out here and not by express: a matching version must not hide a change of people or comments behind a 304.
  response.set('Content-Type', 'application/json; charset=utf-8').end(JSON.stringify(answer.body));
}

function sendPdf(request: Request, response: Response, pdf: Buffer, fileName: string): void {
  response.set('ETag', `"${createHash('sha256').update(pdf).digest('base64url')}"`);
  response.set('Cache-Control', 'private, no-cache');
  if (request.fresh) return void response.status(304).end();
  response.attachment(fileName).set('Content-Type', 'application/pdf').send(pdf);
}
