import type { Assumption } from '#core/result/result.ts';
import { pathText } from './fault.ts';

/**
 * Every default that was used: what stands in the document as read but not as written. Empty lists and nulls assume
 * nothing and are left out.
 * @param written the document as it came, already accepted by the schema
 * @param read the same with its defaults filled in
 */
export function findAssumptions(written: unknown, read: unknown, path: readonly PropertyKey[] = []): Assumption[] {
  if (read === null || typeof read !== 'object') return [];
  if (Array.isArray(read)) {
    return read.flatMap((item, index) =>
      findAssumptions(Array.isArray(written) ? written[index] : undefined, item, [...path, index]),
    );
  }
  const given = written !== null && typeof written === 'object' ? (written as Record<string, unknown>) : {};
  return Object.entries(read).flatMap(([key, value]) => {
    const here = [...path, key];
    if (given[key] !== undefined) return findAssumptions(given[key], value, here);
    return isEmpty(value) ? [] : [{ path: pathText(here), value }];
  });
}

function isEmpty(value: unknown): boolean {
  return value === null || value === undefined || (typeof value === 'object' && Object.keys(value).length === 0);
}
