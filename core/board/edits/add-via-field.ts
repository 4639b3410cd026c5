import type { Board } from '#core/board/document.ts';
import type { ViaField } from '#core/board/copper.ts';

export function addViaField(board: Board, added: ViaField): Board {
  return { ...board, viaFields: [...board.viaFields, added] };
}
