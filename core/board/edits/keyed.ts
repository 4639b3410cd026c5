/** The record under another key, in its old order; the very same record where the key is not in it. */
export function renamedKey(record: Record<string, number>, from: string, to: string): Record<string, number> {
  if (!(from in record)) return record;
  return Object.fromEntries(Object.entries(record).map(([key, value]) => [key === from ? to : key, value]));
}

/** The record without some keys; the very same record where none is in it. */
export function withoutKeys(record: Record<string, number>, gone: ReadonlySet<string>): Record<string, number> {
  const kept = Object.entries(record).filter(([key]) => !gone.has(key));
  return kept.length === Object.keys(record).length ? record : Object.fromEntries(kept);
}
