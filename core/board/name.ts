import { z } from 'zod';
import { shown } from './quantity.ts';

/** Text without NUL, control characters or broken surrogates, so that every store and printer can hold it. */
function text(maximum: number, minimum = 1) {
  const error = (issue: { input?: unknown }) =>
    `must be text of ${minimum} to ${maximum} characters, found ${shown(issue.input)}`;
  return z
    .string({ error })
    .min(minimum, { error })
    .max(maximum, { error })
    .refine((value) => !/\p{Cc}|\p{Cs}/u.test(value), {
      error: 'must not hold control characters or broken characters',
    });
}

/** Text that also serves as a key; what every object answers to by itself is kept out. */
function keyText(maximum: number) {
  return text(maximum).refine((value) => !(value in Object.prototype), {
    error: (issue) => `must not be a word that JavaScript reserves, found ${shown(issue.input)}`,
  });
}

/** Reference designator or object id: U1, p1, screw1. */
export const objectId = keyText(40);
/** Net, supply, layer, package or part key. */
export const name = keyText(80);
export const title = text(200);
/** Where a value comes from: document, revision, clause, or an honest "assumed". */
export const source = text(400);
