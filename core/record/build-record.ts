import type { RecordDocument } from './record-document.ts';
import type { RecordInput } from './record-input.ts';
import { assumptionsSection } from './sections/assumptions.ts';
import { cautionsSection } from './sections/cautions.ts';
import { conditionsSection } from './sections/conditions.ts';
import { drawingsSection } from './sections/drawings.ts';
import { findingsSection } from './sections/findings.ts';
import { inputsSection } from './sections/inputs.ts';
import { laddersSection } from './sections/ladders.ts';
import { limitsSection } from './sections/limits.ts';
import { methodSection } from './sections/method.ts';
import { neighboursSection } from './sections/neighbours.ts';
import { resultsSection } from './sections/results.ts';
import { signaturesSection } from './sections/signatures.ts';
import { stackupSection } from './sections/stackup.ts';
import { summarySection } from './sections/summary.ts';

/** The derating record of a revision (or of a bare document): pure, so that the same revision gives the same record. */
export function buildRecord(input: RecordInput): RecordDocument {
  const { board, result, revision } = input;
  return {
    header: {
      assembly: revision ? `${revision.assemblyNumber} ${revision.assemblyTitle}` : 'Board document',
      title: board.title,
      letter: revision?.letter ?? null,
      state: revision?.state ?? 'document',
      verdict: result.verdict,
      inputHash: result.inputHash,
      method: result.method,
      changedAt: revision?.changedAt ?? null,
      authors: revision?.authors ?? [],
    },
    sections: [
      summarySection(input),
      cautionsSection(input),
      drawingsSection(input),
      conditionsSection(input),
      stackupSection(input),
      inputsSection(input),
      limitsSection(input),
      resultsSection(input),
      laddersSection(input),
      neighboursSection(input),
      findingsSection(input),
      assumptionsSection(input),
      methodSection(input),
      signaturesSection(input),
    ],
  };
}
