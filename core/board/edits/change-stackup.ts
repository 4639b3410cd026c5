import type { Board } from '#core/board/document.ts';
import type { Stackup } from '#core/board/stackup.ts';

/** Emissivities of the faces and the maximum operating temperature. */
export function changeStackup(board: Board, patch: Partial<Omit<Stackup, 'copper' | 'dielectric'>>): Board {
  return { ...board, stackup: { ...board.stackup, ...patch } };
}
