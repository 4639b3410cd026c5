import type { Board } from '#core/board/document.ts';
import type { Part } from '#core/board/part.ts';

/** Changes a part in this document; every regulator that uses it follows. */
export function changePart(board: Board, key: string, patch: Partial<Part>): Board {
  const part = board.parts[key];
  return part ? { ...board, parts: { ...board.parts, [key]: { ...part, ...patch } } } : board;
}
