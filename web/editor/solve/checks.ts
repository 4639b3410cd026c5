import type { Board } from '#core/board/document.ts';
import type { Caution, CheckResult, ConditionResult, Finding } from '#core/result/result.ts';
import type { HeatField } from '#core/thermal/heat-field.ts';

/** What this page itself has calculated for one condition. */
export type ConditionCheck = {
  /** The board that it belongs to. */
  board: Board;
  /**
   * `preview`: coarse cells while something is being moved; `refined`: finer ones right after;
   * `settled`: the cell that the server uses as well.
   */
  fidelity: 'preview' | 'refined' | 'settled';
  condition: ConditionResult;
  field: HeatField | null;
  findings: readonly Finding[];
  cautions: readonly Caution[];
};

export type Checks = {
  byCondition: ReadonlyMap<string, ConditionCheck>;
  /** Whether the worker has something to do. */
  busy: boolean;
  /** Why the last calculation gave nothing; null when it did. */
  fault: string | null;
};

export const noChecks: Checks = { byCondition: new Map(), busy: false, fault: null };

export function withCheck(checks: Checks, name: string, check: ConditionCheck): Checks {
  return { ...checks, fault: null, byCondition: new Map(checks.byCondition).set(name, check) };
}

/** Parts of a one-condition result. @returns null when the condition is not in it */
export function conditionCheck(
  board: Board,
  fidelity: ConditionCheck['fidelity'],
  name: string,
  result: CheckResult,
  field: HeatField | null,
): ConditionCheck | null {
  const condition = result.conditions.find((candidate) => candidate.name === name);
  if (!condition) return null;
  return { board, fidelity, condition, field, findings: result.findings, cautions: result.cautions };
}

type Notice = { rule?: string; kind?: string; ref: string | null; condition: string | null; message: string };

/** Findings (or cautions) of all conditions, each once, in the order of the conditions. */
export function merged<T extends Notice>(lists: readonly (readonly T[])[]): T[] {
  const seen = new Set<string>();
  return lists.flat().filter((item) => {
    const key = JSON.stringify([item.rule ?? item.kind, item.ref, item.condition, item.message]);
    return !seen.has(key) && seen.add(key);
  });
}

/** Whether a check is the full answer for this very board. */
export function isCurrent(check: ConditionCheck, board: Board): boolean {
  return check.fidelity === 'settled' && check.board === board;
}
