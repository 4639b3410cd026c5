import type { Board } from '#core/board/document.ts';
import type { HeatSource } from '#core/board/placement.ts';

export function addSource(board: Board, added: HeatSource): Board {
  return { ...board, sources: [...board.sources, added] };
}
