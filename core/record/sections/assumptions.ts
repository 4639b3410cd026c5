import type { RecordSection } from '../record-document.ts';
import type { RecordInput } from '../record-input.ts';

/** Every default that stood in for a value that was not stated, alike ones of a list together. */
export function assumptionsSection({ result }: RecordInput): RecordSection {
  const grouped = new Map<string, { field: string; value: string; count: number }>();
  for (const { path, value } of result.assumptions) {
    const field = path.replace(/\[\d+\]/g, '[…]');
    const text = typeof value === 'string' ? value : JSON.stringify(value);
    const key = `${field} ${text}`;
    grouped.set(key, { field, value: text, count: (grouped.get(key)?.count ?? 0) + 1 });
  }
  return {
    id: 'assumptions',
    title: 'Assumptions',
    blocks: [
      {
        kind: 'text',
        text: 'Values that the document leaves out, and what was taken in their place. The unit is in the name of the field.',
      },
      {
        kind: 'table',
        columns: [
          { title: 'Field', weight: 4 },
          { title: 'Taken as', weight: 2 },
          { title: 'Times', weight: 0.8, align: 'right' },
        ],
        rows: [...grouped.values()].map(({ field, value, count }) => [field, value, String(count)]),
        empty: 'Everything was stated.',
      },
    ],
  };
}
