import type { Board } from '#core/board/document.ts';
import type { RevisionState } from '#core/review/revision-state.ts';
import type { Caution, Ladder, Verdict } from '#core/result/result.ts';
import type { HeatField } from '#core/thermal/heat-field.ts';

/** The derating record as data: what it says and in which order, not how it is laid out. */
export type RecordDocument = { header: RecordHeader; sections: RecordSection[] };

export type RecordHeader = {
  assembly: string;
  title: string;
  /** Revision letter; null for a document that belongs to no revision. */
  letter: string | null;
  state: RevisionState | 'document';
  verdict: Verdict;
  inputHash: string;
  method: string;
  /** ISO 8601, UTC; null for a document. All dates of the record are those of the revision, so that it prints alike for ever. */
  changedAt: string | null;
  authors: readonly string[];
};

export type RecordSection = { id: string; title: string; blocks: RecordBlock[] };

export type RecordCell = string | { verdict: Verdict };

export type RecordColumn = {
  title: string;
  /** Share of the width. */
  weight: number;
  align?: 'left' | 'right';
};

export type RecordBlock =
  | { kind: 'heading'; text: string }
  | { kind: 'text'; text: string }
  /** Something that exceeds a limit or is not issued: property and information only. */
  | { kind: 'notice'; text: string }
  /** A hazard to people. */
  | { kind: 'caution'; caution: Caution }
  | { kind: 'pairs'; rows: readonly (readonly [string, string])[] }
  | { kind: 'table'; columns: readonly RecordColumn[]; rows: readonly (readonly RecordCell[])[]; empty: string }
  | { kind: 'ladders'; ladders: readonly RecordLadder[] }
  | { kind: 'drawing'; drawing: RecordDrawing };

export type RecordLadder = {
  ref: string;
  condition: string;
  ambientC: number;
  steps: Ladder;
  junctionC: number;
  uncertaintyK: number;
  limitC: number | null;
  verdict: Verdict;
};

export type RecordDrawing = {
  condition: string;
  board: Board;
  field: HeatField;
  /** Layer whose temperatures are shown. */
  layer: string;
  airC: number;
  limits: readonly { label: string; valueC: number }[];
  junctions: readonly { ref: string; junctionC: number; verdict: Verdict }[];
};
