import { formatTime } from './format-time.ts';
import { recordDigest } from './record-digest.ts';
import type { RecordDocument, RecordHeader } from './record-document.ts';
import type { RecordInput, RecordedRevision } from './record-input.ts';
import { assumptionsSection } from './sections/assumptions.ts';
import { cautionsSection } from './sections/cautions.ts';
import { conditionsSection } from './sections/conditions.ts';
import { findingsSection } from './sections/findings.ts';
import { heatSection } from './sections/heat.ts';
import { inputsSection } from './sections/inputs.ts';
import { laddersSection } from './sections/ladders.ts';
import { ledgerSection } from './sections/ledger.ts';
import { limitsSection } from './sections/limits.ts';
import { methodSection } from './sections/method.ts';
import { neighboursSection } from './sections/neighbours.ts';
import { resultsSection } from './sections/results.ts';
import { scopeSection } from './sections/scope.ts';
import { signaturesSection } from './sections/signatures.ts';
import { stackupSection } from './sections/stackup.ts';
import { summarySection } from './sections/summary.ts';
import { stateWords } from './state-words.ts';

/**
 * The derating record of a revision (or of a bare document). Pure: the same revision gives the same record, whenever it
 * is printed.
 */
export function buildRecord(input: RecordInput): RecordDocument {
  return {
    header: headerOf(input),
    sections: [
      summarySection(input),
      scopeSection(input),
      conditionsSection(input),
      stackupSection(input),
      inputsSection(input),
      limitsSection(input),
      resultsSection(input),
      laddersSection(input),
      ledgerSection(input),
      heatSection(input),
      neighboursSection(input),
      findingsSection(input),
      cautionsSection(input),
      assumptionsSection(input),
      methodSection(input),
      signaturesSection(input),
    ],
  };
}

function headerOf(input: RecordInput): RecordHeader {
  const { board, result, revision } = input;
  const digest = recordDigest(input);
  const state = revision?.state ?? 'document';
  return {
    assembly: revision ? `${revision.assemblyNumber} ${revision.assemblyTitle}` : 'Board document',
    title: board.title,
    letter: revision?.letter ?? null,
    state,
    verdict: result.verdict,
    inputHash: result.inputHash,
    digest,
    method: result.method,
    changedAt: revision?.changedAt ?? null,
    facts: [
      ['Board document', board.title],
      ['State', revision ? stateWords[state] : 'not issued: printed from a document that belongs to no revision'],
      ...(revision ? peopleOf(revision) : []),
      ['Content hash of the board', result.inputHash],
      ['Digest of this record', digest],
      ['Method version', result.method],
      ['Criteria', `${board.criteria.name}${board.criteria.version ? `, version ${board.criteria.version}` : ''}`],
    ],
  };
}

function peopleOf(revision: RecordedRevision): [string, string][] {
  const signed = (meaning: 'reviewed' | 'released') =>
    revision.signatures
      .filter((signature) => signature.meaning === meaning)
      .map(({ name }) => name)
      .join(', ') || 'nobody yet';
  return [
    ['Date of the revision', formatTime(revision.changedAt)],
    ['Authored by', revision.authors.join(', ') || 'nobody yet'],
    ['Reviewed and cleared by', signed('reviewed')],
    ['Released by', signed('released')],
  ];
}
