import { formatTime } from '../format-time.ts';
import type { RecordSection } from '../record-document.ts';
import type { RecordInput } from '../record-input.ts';

const meanings = {
  authored: 'Authored and submitted',
  reviewed: 'Reviewed and cleared',
  released: 'Released',
} as const;

export function signaturesSection({ revision, result }: RecordInput): RecordSection {
  if (!revision) {
    return {
      id: 'signatures',
      title: 'Signatures',
      blocks: [
        { kind: 'notice', text: 'Printed from a board document: it belongs to no revision and nobody has signed it.' },
      ],
    };
  }
  return {
    id: 'signatures',
    title: 'Signatures',
    blocks: [
      {
        kind: 'table',
        columns: [
          { title: 'Meaning', weight: 2 },
          { title: 'Name', weight: 2 },
          { title: 'Signed at (UTC)', weight: 2 },
        ],
        rows: revision.signatures.map(({ meaning, name, signedAt }) => [meanings[meaning], name, formatTime(signedAt)]),
        empty: 'Nobody has signed yet.',
      },
      {
        kind: 'text',
        text: `The signatures belong to revision ${revision.letter} with the content ${result.inputHash}. Any change of the content opens the next revision.`,
      },
    ],
  };
}
