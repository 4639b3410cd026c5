import { z } from 'zod';

/** What a numeric field of the board document may hold; travels with the schema into faults, forms and the JSON Schema. */
export type QuantityRange = { unit: string; minimum: number; maximum: number };

declare module 'zod' {
  interface GlobalMeta {
    /** Unit of the number, as printed: mm, µm, °C, K, W, K/W, … */
    unit?: string;
  }
}

/**
 * A finite number with an inclusive range and a unit.
 * @throws nothing; a number outside gives a fault that names value, range and unit.
 */
export function quantity(unit: string, minimum: number, maximum: number) {
  const outside = (issue: { input?: unknown }) =>
    `must be a number from ${minimum} to ${maximum} ${unit}`.trimEnd() + `, found ${shown(issue.input)}`;
  return z.number({ error: outside }).min(minimum, { error: outside }).max(maximum, { error: outside }).meta({ unit });
}

/** A whole number with an inclusive range. */
export function count(minimum: number, maximum: number) {
  const outside = (issue: { input?: unknown }) =>
    `must be a whole number from ${minimum} to ${maximum}, found ${shown(issue.input)}`;
  return z.int({ error: outside }).min(minimum, { error: outside }).max(maximum, { error: outside });
}

/** Value as printed in a fault, cut so that a hostile input cannot flood a message. */
export function shown(value: unknown): string {
  if (value === undefined) return 'nothing';
  const text = typeof value === 'number' ? String(value) : (JSON.stringify(value) ?? typeof value);
  return text.length > 60 ? `${text.slice(0, 57)}…` : text;
}
