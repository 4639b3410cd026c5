import type { Board } from '#core/board/document.ts';
import type { Regulator } from '#core/board/placement.ts';

export function addRegulator(board: Board, added: Regulator): Board {
  return { ...board, regulators: [...board.regulators, added] };
}
