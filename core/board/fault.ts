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
  // Messages of our own schemas begin in lower case and stay; only zod's own words are replaced.
  const own = !/^(Invalid|Too)/.test(issue.message);
  const input = 'discriminator' in issue ? fieldOf(issue.input, String(issue.discriminator)) : issue.input;
  if (input === undefined) {
    return `is missing; it ${own ? issue.message.replace(/, found nothing$/, '') : allowed(issue)}`;
  }
  if (own) return issue.message;
  const found = issue.code === 'too_big' || issue.code === 'too_small' ? '' : `, found ${shown(input)}`;
  return allowed(issue) + found;
}

const fieldOf = (value: unknown, key: string): unknown =>
  value !== null && typeof value === 'object' ? (value as Record<string, unknown>)[key] : value;

function allowed(issue: z.core.$ZodIssue): string {
  switch (issue.code) {
    case 'invalid_value':
      return `must be ${oneOf(issue.values)}`;
    case 'invalid_type':
      return `must be ${kind(issue.expected)}`;
    case 'invalid_union':
      return 'options' in issue && Array.isArray(issue.options)
        ? `must be ${oneOf(issue.options)}`
        : 'has no valid form';
    case 'too_big':
      return `must have at most ${issue.maximum} ${issue.maximum === 1 ? 'entry' : 'entries'}`;
    case 'too_small':
      return `must have at least ${issue.minimum} ${issue.minimum === 1 ? 'entry' : 'entries'}`;
    default:
      return issue.message;
  }
}

const oneOf = (values: readonly unknown[]) =>
  values.length === 1 ? shown(values[0]) : `one of ${values.map((value) => shown(value)).join(', ')}`;

const kind = (expected: string) =>
  ({
    object: 'an object',
    record: 'an object',
    array: 'a list',
    string: 'text',
    tuple: 'a list',
    boolean: 'true or false',
  })[expected] ?? expected;
