import type { z } from 'zod';
import { ProblemError } from '#web/server/problem-error.ts';

export type FieldErrors = Record<string, string>;

/** First message of every field that a schema refuses, by path; empty when it takes the value. */
export function fieldErrors(schema: z.ZodType, value: unknown): FieldErrors {
  const parsed = schema.safeParse(value);
  if (parsed.success) return {};
  const errors: FieldErrors = {};
  for (const issue of parsed.error.issues) {
    errors[issue.path.join('.')] ??= isBlank(value, issue.path) ? 'Cannot be left empty.' : sentence(issue.message);
  }
  return errors;
}

function isBlank(value: unknown, path: readonly PropertyKey[]): boolean {
  let inner = value;
  for (const key of path) inner = typeof inner === 'object' && inner !== null ? Reflect.get(inner, key) : undefined;
  return typeof inner === 'string' && inner.trim() === '';
}

/** What the server refused at a field, for the same place in the form. */
export function serverFault(error: Error | null, path: string): string | undefined {
  const message = error instanceof ProblemError ? error.faultAt(path) : undefined;
  return message && sentence(message);
}

/** "must have at least 12 characters" → "Must have at least 12 characters." */
export function sentence(message: string): string {
  return `${message.charAt(0).toUpperCase()}${message.slice(1)}${/[.!?]$/.test(message) ? '' : '.'}`;
}
