import { formatGiven } from '#core/format.ts';

export const notStated = 'not stated';

/** A given value with its unit, or the words that it is missing; for inputs, where a dash would hide the gap. */
export function stated(value: number | null | undefined, unit = ''): string {
  return value === null || value === undefined || !Number.isFinite(value) ? notStated : formatGiven(value, unit);
}

/** A table of current → value: "0.1 A: 0.8, 0.5 A: 1". */
export function statedTable(table: readonly (readonly [number, number])[] | undefined, unit: string): string {
  if (!table || table.length === 0) return notStated;
  return table.map(([current, value]) => `${stated(value, unit)} at ${stated(current, 'A')}`).join(', ');
}
