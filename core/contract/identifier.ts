import { z } from 'zod';

/** Row ids are UUIDs in text form. */
export const id = z.uuid({ error: 'must be a UUID' });
export const timestamp = z.iso.datetime();
/** Opaque token of the next page; null at the end. */
export const cursor = z.string().max(200);

/** Text typed by a person: no NUL, no control characters but line breaks and tabs, no broken surrogates. */
export function typedText(maximum: number, minimum = 1) {
  const error = `must be text of ${minimum} to ${maximum} characters without control characters`;
  return z
    .string({ error })
    .trim()
    .min(minimum, { error })
    .max(maximum, { error })
    .refine((value) => !/[^\P{Cc}\n\r\t]|\p{Cs}/u.test(value), { error });
}

/** As `typedText`, on one line: what may stand in the subject of a mail or in a file name. */
export function typedLine(maximum: number) {
  return typedText(maximum).refine((value) => !/[\n\r\t]/.test(value), { error: 'must be one line of text' });
}
