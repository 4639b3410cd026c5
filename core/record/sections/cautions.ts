import type { RecordSection } from '../record-document.ts';
import type { RecordInput } from '../record-input.ts';

export function cautionsSection({ result }: RecordInput): RecordSection {
  return {
    id: 'cautions',
    title: 'Cautions',
    blocks: result.cautions.map((caution) => ({ kind: 'caution' as const, caution })),
  };
}
