import type { Condition } from '#core/board/condition.ts';
import type { Board } from '#core/board/document.ts';
import { replaced } from './in-list.ts';

/** Changes one operating condition, found by its name. The same board where its new name is taken. */
export function changeCondition(board: Board, name: string, patch: Partial<Condition>): Board {
  if (patch.name !== undefined && patch.name !== name && board.conditions.some((other) => other.name === patch.name)) {
    return board;
  }
  const conditions = replaced(
    board.conditions,
    (condition) => condition.name === name,
    (condition) => ({ ...condition, ...patch }),
  );
  return conditions === board.conditions ? board : { ...board, conditions };
}
