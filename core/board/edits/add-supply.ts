import type { Supply } from '#core/board/condition.ts';
import type { Board } from '#core/board/document.ts';

/** Another supply at the end of the list. The same board where its name is taken. */
export function addSupply(board: Board, added: Supply): Board {
  if (board.supplies.some(({ name }) => name === added.name)) return board;
  return { ...board, supplies: [...board.supplies, added] };
}
