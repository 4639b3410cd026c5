import { formatTime } from '../format-time.ts';
import type { RecordSection } from '../record-document.ts';
import type { RecordInput } from '../record-input.ts';

const meanings = {
  authored: 'Authorship: authored and submitted for review',
  reviewed: 'Review: reviewed and cleared',
  released: 'Approval: released',
} as const;

/** Who signed, when, and what the signature means (the three things 21 CFR 11.50 asks a signature to show). */
export function signaturesSection({ revision, result }: RecordInput): RecordSection {
  if (!revision) {
    return {
      id: 'signatures',
      title: 'Signatures',
      blocks: [
        {
          kind: 'notice',
          text: 'Not issued: printed from a board document. It belongs to no revision and nobody has signed it.',
        },
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
          { title: 'Name', weight: 2 },
          { title: 'Meaning', weight: 2.4 },
          { title: 'Signed at (date, time, UTC offset)', weight: 2 },
        ],
        rows: revision.signatures.map(({ meaning, name, signedAt }) => [name, meanings[meaning], formatTime(signedAt)]),
        empty: 'Nobody has signed yet.',
      },
      {
        kind: 'text',
        text: `Each signature was given with the signer’s password and belongs to revision ${revision.letter} with the board content ${result.inputHash}. Any change of the content opens the next revision.`,
      },
    ],
  };
}
