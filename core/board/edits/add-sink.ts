import type { Board } from '#core/board/document.ts';
import type { Sink } from '#core/board/copper.ts';

export function addSink(board: Board, added: Sink): Board {
  return { ...board, sinks: [...board.sinks, added] };
}
