import type { Board } from '#core/board/document.ts';
import type { Ring } from '#core/board/outline.ts';

export function addCutout(board: Board, ring: Ring): Board {
  return { ...board, outline: { ...board.outline, cutouts: [...board.outline.cutouts, ring] } };
}
