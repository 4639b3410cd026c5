import type { Board } from '#core/board/document.ts';
import type { CheckResult } from '#core/result/result.ts';
import type { FindingReason } from '#core/review/guards.ts';
import type { RevisionState } from '#core/review/revision-state.ts';
import type { HeatField } from '#core/thermal/heat-field.ts';

/** All that a record is made from; `revision` null for a document checked on the command line. */
export type RecordInput = {
  board: Board;
  result: CheckResult;
  /** By condition name; a condition without one gets no drawing. */
  fields: ReadonlyMap<string, HeatField>;
  revision: RecordedRevision | null;
};

/** Facts of a revision as they stand in the database; times in ISO 8601. */
export type RecordedRevision = {
  assemblyNumber: string;
  assemblyTitle: string;
  letter: string;
  state: RevisionState;
  changedAt: string;
  authors: readonly string[];
  stateReason: string | null;
  reasons: readonly FindingReason[];
  signatures: readonly { name: string; meaning: 'authored' | 'reviewed' | 'released'; signedAt: string }[];
  comments: readonly { author: string; text: string; createdAt: string; resolvedBy: string | null }[];
};
