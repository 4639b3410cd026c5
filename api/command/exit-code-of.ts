import type { Board } from '#core/board/document.ts';
import type { CheckResult } from '#core/result/result.ts';
import { exitCodes } from './exit-codes.ts';

/** What the end of a check says to a script. A board without regulators is fine when its heat was solved and no source is over. */
export function exitCodeOf(board: Pick<Board, 'regulators'>, result: CheckResult): number {
  if (result.conditions.some((condition) => condition.status !== 'converged')) return exitCodes.notConverged;
  if (result.verdict === 'within' || result.verdict === 'close') return exitCodes.fine;
  const solvedOnly = board.regulators.length === 0 && result.conditions.length > 0;
  const sourceBad = result.conditions.some((condition) =>
    condition.sources.some(
      (source) => source.verdict === 'over' || (source.limitC !== null && source.verdict === 'not evaluated'),
    ),
  );
  return solvedOnly && !sourceBad ? exitCodes.fine : exitCodes.over;
}
