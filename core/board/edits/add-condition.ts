import type { Condition } from '#core/board/condition.ts';
import type { Board } from '#core/board/document.ts';

/** Another operating condition at the end of the list. The same board where its name is taken. */
export function addCondition(board: Board, added: Condition): Board {
  if (board.conditions.some(({ name }) => name === added.name)) return board;
  return { ...board, conditions: [...board.conditions, added] };
}
