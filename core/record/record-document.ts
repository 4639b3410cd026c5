import type { Board } from '#core/board/document.ts';
import type { HeatScale } from '#core/drawing/heat-scale.ts';
import type { Caution, Ladder, Verdict } from '#core/result/result.ts';
import type { RevisionState } from '#core/review/revision-state.ts';
import type { HeatField } from '#core/thermal/heat-field.ts';

/** The derating record as data: what it says and in which order, not how it is laid out. */
export type RecordDocument = { header: RecordHeader; sections: RecordSection[] };

export type RecordHeader = {
  /** Number and title of the assembly; "Board document" for a document that belongs to no revision. */
  assembly: string;
  title: string;
  /** Revision letter; null for a document that belongs to no revision. */
  letter: string | null;
  state: RevisionState | 'document';
  verdict: Verdict;
  /** Hash of the board with its defaults. */
  inputHash: string;
  /** Hash of all that the record says. */
  digest: string;
  method: string;
  /** ISO 8601; null for a document. All dates of the record are those of the revision, so that it prints alike for ever. */
  changedAt: string | null;
  /** What stands under the title, label and value. */
  facts: readonly (readonly [string, string])[];
};

export type RecordSection = { id: string; title: string; blocks: RecordBlock[] };

/** Text, or a verdict as its shape and word. */
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
  | { kind: 'list'; items: readonly string[] }
  /** Something that exceeds a limit or is not issued: property and information only. */
  | { kind: 'notice'; text: string }
  /** A hazard to people. */
  | { kind: 'caution'; caution: Caution }
  | { kind: 'pairs'; rows: readonly (readonly [string, string])[] }
  | { kind: 'table'; columns: readonly RecordColumn[]; rows: readonly (readonly RecordCell[])[]; empty: string }
  | { kind: 'ladders'; ladders: readonly RecordLadder[] }
  /** The board without heat: parts, and the copper of every layer. */
  | { kind: 'copper'; board: Board }
  | { kind: 'heat'; drawing: RecordHeat };

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

/** Heat of one layer in one condition. */
export type RecordHeat = {
  condition: string;
  board: Board;
  field: HeatField;
  /** Layer whose temperatures are shown. */
  layer: string;
  side: 'top' | 'bottom';
  airC: number;
  coolestC: number;
  hottestC: number;
  /** The same for every drawing of a record, so that they can be compared. */
  scale: HeatScale;
  limits: readonly { label: string; valueC: number; reached: boolean }[];
  junctions: readonly { ref: string; junctionC: number; verdict: Verdict }[];
};
