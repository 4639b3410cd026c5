import type { Problem } from '#core/contract/problem.ts';

type Extras = Pick<Problem, 'faults' | 'reasons' | 'current'> & { retryAfterSeconds?: number };

/** A request that is answered with a problem document instead of an act; thrown anywhere below a route. */
export class Refusal extends Error {
  readonly problem: Problem;
  readonly retryAfterSeconds: number | null;

  constructor(status: number, code: string, title: string, detail: string, extras: Extras = {}) {
    super(detail);
    this.name = 'Refusal';
    const { retryAfterSeconds, ...rest } = extras;
    this.retryAfterSeconds = retryAfterSeconds ?? null;
    this.problem = { type: `urn:dropwatt:problem:${code}`, title, status, code, detail, ...rest };
  }
}

export const signedOut = () =>
  new Refusal(401, 'signed-out', 'Not signed in', 'Sign in first; the session may have ended.');

export const notFound = (what = 'This address') =>
  new Refusal(404, 'not-found', 'Not found', `${what} does not exist, or not in your team.`);

export const roleRefused = (detail = 'None of your roles may do this.') =>
  new Refusal(403, 'role', 'Not allowed', detail);

export const invalid = (faults: NonNullable<Problem['faults']>) =>
  new Refusal(422, 'invalid', 'Not valid', `${faults.length} field(s) were refused. Nothing was stored.`, { faults });

export const guarded = (reasons: NonNullable<Problem['reasons']>) =>
  new Refusal(422, 'guards', 'Not yet possible', 'Something stands in the way. Nothing was changed.', { reasons });

export const unavailable = () =>
  new Refusal(503, 'unavailable', 'Not available now', 'A part of the service does not answer. Try again shortly.', {
    retryAfterSeconds: 2,
  });
