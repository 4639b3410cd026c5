import type { Condition } from '#core/board/condition.ts';
import type { Board } from '#core/board/document.ts';
import type { OperatingPoint } from '#core/electrical/operating-point.ts';
import type { ConditionResult, Finding } from '#core/result/result.ts';
import type { ThermalNotice } from '#core/thermal/solution.ts';

/** One condition with all that is known of it when findings and cautions are made. */
export type CheckedCondition = {
  condition: Condition;
  points: ReadonlyMap<string, OperatingPoint>;
  result: ConditionResult;
  notices: readonly ThermalNotice[];
};

export type FindingContext = { board: Board; conditions: readonly CheckedCondition[] };

/** One rule: what it finds on a board; an empty list when all is well. */
export type FindingRule = (context: FindingContext) => Finding[];
