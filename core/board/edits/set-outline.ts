import type { Board } from '#core/board/document.ts';
import type { Ring } from '#core/board/outline.ts';

/** Another edge of the board; cut-outs stay. */
export function setOutline(board: Board, points: Ring): Board {
  return { ...board, outline: { ...board.outline, points } };
}
