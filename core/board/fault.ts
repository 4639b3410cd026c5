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

/** Every issue of a refused value as a fault; unknown fields are named one by one. */
export function faultsOf(error: z.ZodError): FieldFault[] {
  return error.issues.flatMap((issue) => {
    if (issue.code === 'unrecognized_keys')
      return issue.keys.map((key) => ({ path: pathText([...issue.path, key]), message: 'is not a known field' }));
    return [{ path: pathText(issue.path), message: message(issue) }];
  });
}

function message(issue: z.core.$ZodIssue): string {
  if (issue.code === 'invalid_value')
    return issue.message.startsWith('Invalid')
      ? `must be one of ${issue.values.map((value) => shown(value)).join(', ')}, found ${shown(issue.input)}`
      : issue.message;
  if (issue.code === 'invalid_type' && issue.message.startsWith('Invalid'))
    return issue.input === undefined
      ? `is missing (${issue.expected})`
      : `must be ${issue.expected}, found ${shown(issue.input)}`;
  return issue.message;
}
