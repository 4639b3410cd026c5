import { hashBoard } from '#core/board/hash-board.ts';
import type { Board } from '#core/board/document.ts';
import { cautionsOf } from '#core/derating/cautions.ts';
import { findAll } from '#core/derating/find-all.ts';
import type { CheckedCondition } from '#core/derating/finding-context.ts';
import { worstVerdict } from '#core/derating/verdict.ts';
import type { Assumption, CheckResult } from '#core/result/result.ts';
import { buildBoardModel, releaseBoardModel } from '#core/thermal/board-model.ts';
import type { HeatField } from '#core/thermal/heat-field.ts';
import { methodVersion } from '#core/thermal/method.ts';
import type { ThermalSolution } from '#core/thermal/solution.ts';
import { checkCondition } from './check-condition.ts';

export type CheckOptions = {
  /** Names of the conditions to run; all when left out. */
  conditions?: readonly string[] | undefined;
  /** Cell size in mm; chosen from the board when left out. */
  cellMm?: number | undefined;
  /** Whether to solve on coarser grids for the grid error; by default only with the board's own cell size. */
  gridError?: boolean | undefined;
  /** Milliseconds of some clock, for `solver.milliseconds`; 0 when left out. */
  now?: (() => number) | undefined;
  /** Told after every condition; returning false ends the check with `CheckCancelled`. */
  onProgress?: ((done: number, total: number) => boolean) | undefined;
};

export type BoardCheck = {
  result: CheckResult;
  /** Heat field by condition name, for the conditions that converged. */
  fields: Map<string, HeatField>;
};

/** The caller asked the check to end before it was done. */
export class CheckCancelled extends Error {
  override name = 'CheckCancelled';
}

/**
 * Checks a whole board: operating points, heat, limits, verdicts, findings and cautions of every condition.
 * Pure and deterministic but for `solver.milliseconds`.
 * @throws BoardTooLarge beyond the stated maximum of unknowns; CheckCancelled when `onProgress` says so
 */
export function checkBoard(board: Board, assumptions: readonly Assumption[], options: CheckOptions = {}): BoardCheck {
  const chosen = board.conditions.filter(({ name }) => options.conditions?.includes(name) ?? true);
  const model = buildBoardModel(board, { cellMm: options.cellMm });
  const gridError = options.gridError ?? options.cellMm === undefined;
  const fields = new Map<string, HeatField>();
  const checked: CheckedCondition[] = [];
  let start: ThermalSolution | undefined;
  try {
    for (const condition of chosen) {
      const { checked: one, solution } = checkCondition(model, condition, { start, gridError, now: options.now });
      checked.push(one);
      start = solution;
      if (solution.status === 'converged') fields.set(condition.name, solution.field);
      if (options.onProgress?.(checked.length, chosen.length) === false)
        throw new CheckCancelled('The check was cancelled.');
    }
  } finally {
    releaseBoardModel(model);
  }
  const context = { board, conditions: checked };
  return {
    result: {
      format: 'dropwatt-result',
      version: 1,
      method: methodVersion,
      inputHash: hashBoard(board, assumptions),
      title: board.title,
      conditions: checked.map(({ result }) => result),
      findings: findAll(context),
      cautions: cautionsOf(context),
      assumptions: [...assumptions],
      verdict: worstVerdict(checked.map(({ result }) => result.verdict)),
    },
    fields,
  };
}
