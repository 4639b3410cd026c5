import { role, roleNames } from '#core/review/role.ts';

/** "revision.sent-back" → "Revision sent back". */
export function eventWords(kind: string): string {
  const words = kind.replace(/[._:-]+/g, ' ').trim();
  return words.charAt(0).toUpperCase() + words.slice(1);
}

/** "sketchHash" → "sketch hash". */
function factWords(key: string): string {
  return key.replace(/([a-z])([A-Z])/g, (_, before: string, after: string) => `${before} ${after.toLowerCase()}`);
}

/** A fact in one line: text as it is, roles and yes or no in words, lists joined, long hashes by their beginning. */
function factValue(value: unknown): string {
  if (value === null || value === undefined || value === '') return '–';
  if (typeof value === 'boolean') return value ? 'yes' : 'no';
  if (typeof value === 'number') return String(value);
  if (typeof value === 'string') return textValue(value);
  if (Array.isArray(value)) return value.length === 0 ? '–' : value.map(factValue).join(', ');
  return Object.entries(value)
    .filter(([, inner]) => inner !== null)
    .map(([key, inner]) => `${factWords(key)} ${factValue(inner)}`)
    .join(', ');
}

function textValue(text: string): string {
  const known = role.safeParse(text);
  if (known.success) return roleNames[known.data].toLowerCase();
  return text.replace(/\b((?:sha256:)?[0-9a-f]{12})[0-9a-f]{52}\b/g, '$1…');
}

export type Fact = { name: string; before?: string; value: string };

/** Facts of an event as lines; `{ from, to }` becomes one line with the old and the new value. */
export function factLines(facts: Record<string, unknown>): Fact[] {
  const given = Object.entries(facts).filter(([, value]) => value !== null && value !== undefined);
  return given.map(([key, value]) => {
    const name = factWords(key);
    if (typeof value === 'object' && value !== null && 'from' in value && 'to' in value) {
      return { name, before: factValue(value.from), value: factValue(value.to) };
    }
    return { name, value: factValue(value) };
  });
}
