import type { Board } from '#core/board/document.ts';
import type { Ring } from '#core/board/outline.ts';
import { replaced } from './in-list.ts';

/** Cuts a hole into a pour. */
export function addHole(board: Board, pourId: string, ring: Ring): Board {
  const pours = replaced(
    board.pours,
    (pour) => pour.id === pourId,
    (pour) => ({ ...pour, holes: [...pour.holes, ring] }),
  );
  return pours === board.pours ? board : { ...board, pours };
}
