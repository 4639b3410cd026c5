import type { Board } from '#core/board/document.ts';
import type { Assumption, CheckResult } from '#core/result/result.ts';
import type { HeatField } from '#core/thermal/heat-field.ts';

export type CheckOptions = {
  /** Names of the conditions to run; all when left out. */
  conditions?: readonly string[];
  /** Cell size in mm; chosen from the board when left out. */
  cellMm?: number;
  /** Milliseconds of some clock, for `solver.milliseconds`; 0 when left out. */
  now?: () => number;
  /** Told after every condition; returning false ends the check with `CheckCancelled`. */
  onProgress?: (done: number, total: number) => boolean;
};

export type BoardCheck = {
  result: CheckResult;
  /** Heat field by condition name, for the conditions that converged. */
  fields: Map<string, HeatField>;
};

/**
 * Checks a whole board: operating points, heat, limits, verdicts, findings and cautions of every condition.
 * Pure and deterministic but for `solver.milliseconds`.
 */
export declare function checkBoard(board: Board, assumptions: readonly Assumption[], options?: CheckOptions): BoardCheck;
