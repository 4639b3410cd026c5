import type { Board } from '#core/board/document.ts';

export function setTitle(board: Board, title: string): Board {
  return { ...board, title };
}
