import type { Board } from '#core/board/document.ts';
import { idOf, objectKeys } from '#core/board/object-key.ts';

/** Why a reference or id cannot be given; null when it is free. */
export function takenName(board: Board, name: string): string | null {
  return objectKeys(board).some((key) => idOf(key) === name) ? `${name} is in use on this board.` : null;
}
