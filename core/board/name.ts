import { z } from 'zod';

/** Text without NUL, control characters or broken surrogates, so that every store and printer can hold it. */
function text(maximum: number, minimum = 1) {
  return z
    .string({ error: `must be text of ${minimum} to ${maximum} characters` })
    .min(minimum, { error: `must be text of ${minimum} to ${maximum} characters` })
    .max(maximum, { error: `must be text of ${minimum} to ${maximum} characters` })
    .refine((value) => !/\p{Cc}|\p{Cs}/u.test(value), {
      error: 'must not hold control characters or broken characters',
    });
}

/** Reference designator or object id: U1, p1, screw1. */
export const objectId = text(40);
/** Net, supply, layer, package or part key. */
export const name = text(80);
export const title = text(200);
/** Where a value comes from: document, revision, clause, or an honest "assumed". */
export const source = text(400);
