import type { Board } from '#core/board/document.ts';
import type { Pour } from '#core/board/copper.ts';

export function addPour(board: Board, added: Pour): Board {
  return { ...board, pours: [...board.pours, added] };
}
