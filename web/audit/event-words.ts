/** "revision.sent-back" → "Revision sent back". */
export function eventWords(kind: string): string {
  const words = kind.replace(/[._:-]+/g, ' ').trim();
  return words.charAt(0).toUpperCase() + words.slice(1);
}

/** "sketchVersion" → "sketch version"; a name with a unit keeps its letters. */
export function factWords(key: string): string {
  return key
    .replace(/([a-z])([A-Z])/g, (_, before: string, after: string) => `${before} ${after.toLowerCase()}`)
    .replace(/[._-]+/g, ' ');
}

/** A fact in one line: text as it is, yes and no, lists joined, the rest as JSON. */
export function factValue(value: unknown): string {
  if (value === null || value === undefined || value === '') return '–';
  if (typeof value === 'boolean') return value ? 'yes' : 'no';
  if (typeof value === 'string' || typeof value === 'number') return String(value);
  if (Array.isArray(value)) return value.length === 0 ? '–' : value.map(factValue).join(', ');
  return Object.entries(value)
    .map(([key, inner]) => `${factWords(key)}: ${factValue(inner)}`)
    .join('; ');
}

export type Fact = { name: string; before?: string; value: string };

/**
 * Facts of an event as lines. A pair of old and new value becomes one line, whether it is written
 * as `{ old, new }`, as `{ from, to }`, or as two lists of fields beside each other.
 */
export function factLines(facts: Record<string, unknown>): Fact[] {
  for (const [before, after] of pairs) {
    if (isRecord(facts[before]) && isRecord(facts[after])) {
      const { [before]: older, [after]: newer, ...rest } = facts;
      return [...changed(older as Record<string, unknown>, newer as Record<string, unknown>), ...factLines(rest)];
    }
    if (before in facts && after in facts) {
      const { [before]: older, [after]: newer, ...rest } = facts;
      return [{ name: 'change', before: factValue(older), value: factValue(newer) }, ...factLines(rest)];
    }
  }
  return Object.entries(facts).map(([key, value]) => {
    const pair = isRecord(value) ? pairs.find(([before, after]) => before in value && after in value) : undefined;
    if (pair && isRecord(value)) {
      return { name: factWords(key), before: factValue(value[pair[0]]), value: factValue(value[pair[1]]) };
    }
    return { name: factWords(key), value: factValue(value) };
  });
}

const pairs = [
  ['old', 'new'],
  ['from', 'to'],
  ['before', 'after'],
] as const;

function isRecord(value: unknown): value is Record<string, unknown> {
  return typeof value === 'object' && value !== null && !Array.isArray(value);
}

function changed(before: Record<string, unknown>, after: Record<string, unknown>): Fact[] {
  return [...new Set([...Object.keys(before), ...Object.keys(after)])]
    .map((key) => ({ name: factWords(key), before: factValue(before[key]), value: factValue(after[key]) }))
    .filter((fact) => fact.before !== fact.value);
}
