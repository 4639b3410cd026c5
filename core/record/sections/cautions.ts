import type { RecordSection } from '../record-document.ts';
import type { RecordInput } from '../record-input.ts';

/** Hazards to people and property. An exceedance of a rule is no caution: it stands in the summary, as a notice. */
export function cautionsSection({ result }: RecordInput): RecordSection {
  return {
    id: 'cautions',
    title: 'Cautions',
    blocks:
      result.cautions.length > 0
        ? result.cautions.map((caution) => ({ kind: 'caution' as const, caution }))
        : [{ kind: 'text', text: 'None was found; that is no statement that the board may be touched.' }],
  };
}
