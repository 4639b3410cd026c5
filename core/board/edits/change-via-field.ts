import type { Board } from '#core/board/document.ts';
import type { ViaField } from '#core/board/copper.ts';
import { replaced } from './in-list.ts';

/** The same board where there is no such object. Its name is changed by `renameObject`, which follows every reference. */
export function changeViaField(board: Board, id: string, patch: Partial<Omit<ViaField, 'id'>>): Board {
  const viaFields = replaced(
    board.viaFields,
    (item) => item.id === id,
    (item) => ({ ...item, ...patch }),
  );
  return viaFields === board.viaFields ? board : { ...board, viaFields };
}
