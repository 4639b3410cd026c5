import type { Board } from '#core/board/document.ts';
import type { Pour } from '#core/board/copper.ts';
import { replaced } from './in-list.ts';

/** The same board where there is no such object. Its name is changed by `renameObject`, which follows every reference. */
export function changePour(board: Board, id: string, patch: Partial<Omit<Pour, 'id'>>): Board {
  const pours = replaced(
    board.pours,
    (item) => item.id === id,
    (item) => ({ ...item, ...patch }),
  );
  return pours === board.pours ? board : { ...board, pours };
}
