import { type FieldFault, pathText } from './fault.ts';

/** The deepest valid document nests 8 levels. */
const deepest = 32;

/**
 * What must be refused before any recursive code sees a value: nesting that exhausts the stack, and keys that reach an
 * object's prototype. Iterative, level by level.
 */
export function hostileShape(value: unknown): FieldFault | null {
  let level: { value: unknown; path: readonly PropertyKey[] }[] = [{ value, path: [] }];
  for (let depth = 0; level.length > 0; depth++) {
    if (depth > deepest) {
      const [first] = level[0]!.path;
      return { path: pathText([first!]), message: `must not nest deeper than ${deepest} levels` };
    }
    const next: typeof level = [];
    for (const item of level) {
      if (item.value === null || typeof item.value !== 'object') continue;
      if (Object.hasOwn(item.value, '__proto__')) {
        return { path: pathText([...item.path, '__proto__']), message: 'must not be used as a key' };
      }
      const isList = Array.isArray(item.value);
      for (const [key, child] of Object.entries(item.value)) {
        if (child !== null && typeof child === 'object') {
          next.push({ value: child, path: [...item.path, isList ? Number(key) : key] });
        }
      }
    }
    level = next;
  }
  return null;
}
