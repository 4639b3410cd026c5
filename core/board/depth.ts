/** Whether a JSON value nests no deeper than `limit`; iterative, so that a hostile value cannot exhaust the stack. */
export function isNestedWithin(value: unknown, limit: number): boolean {
  let level: unknown[] = [value];
  for (let depth = 0; level.length > 0; depth++) {
    if (depth > limit) return false;
    const next: unknown[] = [];
    for (const item of level) {
      if (item === null || typeof item !== 'object') continue;
      for (const child of Object.values(item)) if (child !== null && typeof child === 'object') next.push(child);
    }
    level = next;
  }
  return true;
}
