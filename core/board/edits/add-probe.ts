import type { Board } from '#core/board/document.ts';
import type { Probe } from '#core/board/placement.ts';

export function addProbe(board: Board, added: Probe): Board {
  return { ...board, probes: [...board.probes, added] };
}
