import type { z } from 'zod';
import { shown } from './quantity.ts';

/** Something wrong with an input: where, what was found, what is allowed. */
export type FieldFault = { path: string; message: string };

/** Path as a reader would write it: `stackup.copper[0].thicknessUm`; keys that are no identifiers in quotes. */
export function pathText(path: readonly PropertyKey[]): string {
  return path
    .map((step, index) => {
      if (typeof step === 'number') return `[${step}]`;
      const key = String(step);
      if (!/^[A-Za-z_]\w*$/.test(key)) return `[${JSON.stringify(key)}]`;
      return index === 0 ? key : `.${key}`;
    })
    .join('');
}

/** Every issue of a refused value as a fault; unknown fields are named one by one. Needs `reportInput` for what was found. */
export function faultsOf(error: z.ZodError): FieldFault[] {
  return error.issues.flatMap((issue) => {
    if (issue.code === 'unrecognized_keys') {
      return issue.keys.map((key) => ({ path: pathText([...issue.path, key]), message: 'is not a known field' }));
    }
    return [{ path: pathText(issue.path), message: message(issue) }];
  });
}

function message(issue: z.core.$ZodIssue): string {
  const missing = 'input' in issue && issue.input === undefined;
  // Messages of our own schemas begin in lower case and stay; only zod's own words are replaced.
  const own = !/^(Invalid|Too)/.test(issue.message);
  if (own) return missing ? `is missing; it ${issue.message.replace(/, found nothing$/, '')}` : issue.message;
  if (issue.code === 'invalid_value') {
    return `must be one of ${issue.values.map((value) => shown(value)).join(', ')}, found ${shown(issue.input)}`;
  }
  if (issue.code === 'invalid_type') {
    return missing
      ? `is missing; it must be ${kind(issue.expected)}`
      : `must be ${kind(issue.expected)}, found ${shown(issue.input)}`;
  }
  if (issue.code === 'invalid_union') return `has no valid kind: ${issue.message}`;
  if (issue.code === 'too_big') return `must have at most ${issue.maximum} entries`;
  if (issue.code === 'too_small') return `must have at least ${issue.minimum} entries`;
  return issue.message;
}

const kind = (expected: string) =>
  ({ object: 'an object', record: 'an object', array: 'a list', string: 'text', tuple: 'a list' })[expected] ??
  expected;
