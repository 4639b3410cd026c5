import type { Board } from '#core/board/document.ts';
import { without } from './in-list.ts';

export function removeCondition(board: Board, name: string): Board {
  const conditions = without(board.conditions, (condition) => condition.name === name);
  return conditions === board.conditions ? board : { ...board, conditions };
}
