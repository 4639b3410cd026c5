import type { RecordSection } from '../record-document.ts';
import type { RecordInput } from '../record-input.ts';

/** Every default that stood in for a value that was not stated, alike ones of a list together. */
export function assumptionsSection({ result }: RecordInput): RecordSection {
  const grouped = new Map<string, number>();
  for (const { path, value } of result.assumptions) {
    const key = `${path.replace(/\[\d+\]/g, '[…]')} = ${JSON.stringify(value)}`;
    grouped.set(key, (grouped.get(key) ?? 0) + 1);
  }
  return {
    id: 'assumptions',
    title: 'Assumed where nothing was stated',
    blocks: [
      {
        kind: 'table',
        columns: [
          { title: 'Field and value', weight: 5 },
          { title: 'Times', weight: 1, align: 'right' },
        ],
        rows: [...grouped].map(([text, count]) => [text, String(count)]),
        empty: 'Everything was stated.',
      },
    ],
  };
}
