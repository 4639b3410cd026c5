import type { ErrorRequestHandler, Response } from 'express';
import type { Logger } from 'pino';
import type { Problem } from '#core/contract/problem.ts';
import { sqlState } from '#db/transaction.ts';
import { invalid, Refusal, unavailable } from './refusal.ts';

/** Last handler: whatever was thrown becomes a problem document; nothing of the inside is told. */
export const answerProblems: ErrorRequestHandler = (error: unknown, request, response, next) => {
  if (response.headersSent) return next(error);
  const refusal = refusalOf(error);
  if (refusal.problem.status === 503) sayUnavailable(request.log, error);
  else if (refusal.problem.status >= 500) request.log.error({ err: error }, 'request failed');
  if (refusal.retryAfterSeconds !== null) response.set('Retry-After', String(refusal.retryAfterSeconds));
  sendProblem(response, { ...refusal.problem, instance: typeof request.id === 'string' ? request.id : '' });
};

const quietMs = 1000;
let lastSaid = 0;

/** Hundreds of requests meet the same outage in a second; one line of it is enough. */
function sayUnavailable(logger: Logger, error: unknown): void {
  if (Date.now() - lastSaid < quietMs) return;
  lastSaid = Date.now();
  logger.warn({ err: error }, 'a part of the service does not answer');
}

export function sendProblem(response: Response, problem: Problem): void {
  response.status(problem.status).set('Content-Type', 'application/problem+json; charset=utf-8');
  response.end(JSON.stringify(problem));
}

function refusalOf(error: unknown): Refusal {
  if (error instanceof Refusal) return error;
  const state = sqlState(error);
  if (state !== null) return ofSqlState(state);
  if (isConnectionFault(error)) return unavailable();
  const status = bodyStatus(error);
  if (status === 413)
    return new Refusal(413, 'too-large', 'Too large', 'The body is larger than the 5 MB that a request may have.');
  if (status !== null)
    return new Refusal(status, 'unreadable', 'Not readable', 'The request could not be read as it was sent.');
  return new Refusal(500, 'fault', 'Fault in the service', 'Something went wrong here. It has been logged.');
}

/** Classes of SQLSTATE: 22 data, 23 integrity, 08/57/53 connection, shutdown and resources, 40 broken tie. */
function ofSqlState(state: string): Refusal {
  if (state === '23505')
    return new Refusal(409, 'already-exists', 'Already there', 'Something with the same name exists already.');
  if (state === '23001') return new Refusal(409, 'frozen', 'Frozen', 'An issued revision never changes again.');
  if (/^2[23]/.test(state)) return invalid([{ path: '', message: 'holds a value that cannot be stored' }]);
  if (/^(08|57|53|40|55)/.test(state)) return unavailable();
  return new Refusal(500, 'fault', 'Fault in the service', 'Something went wrong here. It has been logged.');
}

function isConnectionFault(error: unknown): boolean {
  if (!(error instanceof Error)) return false;
  if (error.name === 'KnexTimeoutError') return true;
  if ('code' in error && /^E(CONN|HOST|NET|PIPE|TIMEDOUT)/.test(String(error.code))) return true;
  return /^(Connection terminated|Connection ended|timeout expired|Client has encountered)/.test(error.message);
}

/** Status that express and its body reader attach to a client's fault; null for anything else. */
function bodyStatus(error: unknown): number | null {
  if (!(error instanceof Error) || !('status' in error) || typeof error.status !== 'number') return null;
  return error.status >= 400 && error.status < 500 ? error.status : null;
}
