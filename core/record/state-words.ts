import type { RecordHeader } from './record-document.ts';

/** State of the record in words; `document`: printed from a board document that belongs to no revision. */
export const stateWords: Record<RecordHeader['state'], string> = {
  sketch: 'Sketch',
  'in review': 'In review',
  'sent back': 'Sent back',
  cleared: 'Cleared',
  issued: 'Issued',
  superseded: 'Superseded',
  withdrawn: 'Withdrawn',
  document: 'Printed from a document',
};

/** Mark that every page carries while the record is not the issued one; null for an issued record. */
export function pageMark(state: RecordHeader['state']): string | null {
  if (state === 'issued') return null;
  if (state === 'superseded') return 'Superseded: a later revision is issued';
  return `Not issued: ${stateWords[state].toLowerCase()}`;
}
