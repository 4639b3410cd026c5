import type { Board } from '#core/board/document.ts';
import type { Rule } from '#core/board/criteria.ts';
import type { Part } from '#core/board/part.ts';
import type { LimitResult } from '#core/result/result.ts';
import { verdictOf } from './verdict.ts';

/** What the limits of one regulator are compared with; null where it is not known. */
export type Stress = {
  junctionC: number | null;
  uncertaintyK: number | null;
  inputV: number | null;
  outputA: number | null;
};

/**
 * Every limit of a regulator: each rule of the criteria, and the maker's own maximum, which always applies too.
 * @param faulted whether the regulator itself is in a single-fault condition: then derating rules rest and only the maker's
 * maximum is judged, as derating is for normal operation (common practice)
 */
export function limitsOf(board: Board, part: Part, stress: Stress, faulted: boolean): LimitResult[] {
  const rules = faulted ? [] : board.criteria.rules.map((rule) => ruleLimit(board, part, rule, stress));
  return [...rules, makersMaximum(part, stress, faulted)];
}

function makersMaximum(part: Part, stress: Stress, faulted: boolean): LimitResult {
  const source = `Maker's maximum, ${part.name}${faulted ? ' (single fault)' : ''}: ${part.source}`;
  return limit('junctionC', stress.junctionC, part.junctionMaxC, null, source, stress.uncertaintyK);
}

function ruleLimit(board: Board, part: Part, rule: Rule, stress: Stress): LimitResult {
  const source = ruleSource(board, rule);
  if (rule.quantity === 'junctionC') {
    const limits = [part.junctionMaxC];
    if (rule.belowMaxK !== undefined) limits.push(part.junctionMaxC - rule.belowMaxK);
    if (rule.atMostC !== undefined) limits.push(rule.atMostC);
    if (rule.ratio !== undefined) limits.push(part.junctionMaxC * rule.ratio);
    return limit('junctionC', stress.junctionC, Math.min(...limits), null, source, stress.uncertaintyK);
  }
  const rated = rule.quantity === 'inputV' ? part.inputMaxV : part.outputMaxA;
  const actual = rule.quantity === 'inputV' ? stress.inputV : stress.outputA;
  return limit(rule.quantity, actual, rated * (rule.ratio ?? 1), rated, source, null);
}

function limit(
  quantity: LimitResult['quantity'],
  actual: number | null,
  atMost: number,
  rated: number | null,
  source: string,
  uncertainty: number | null,
): LimitResult {
  return {
    quantity,
    actual,
    limit: atMost,
    margin: actual === null ? null : atMost - actual,
    ratio: actual === null || rated === null || rated === 0 ? null : actual / rated,
    verdict: verdictOf(actual, atMost, uncertainty ?? 0),
    source,
  };
}

/** Where a rule comes from, with its mark where it is not read in the document itself. */
export function ruleSource(board: Board, rule: Rule): string {
  const document = [rule.document, rule.revision, rule.clause, rule.level].filter(Boolean).join(', ');
  const mark = rule.mark && rule.mark !== 'read' && rule.mark !== 'house' ? ` (${rule.mark.replace('-', ' ')})` : '';
  return `${board.criteria.name}: ${rule.source ?? (document || 'no source stated')}${mark}`;
}
