import type { Board } from '#core/board/document.ts';
import type { Sink } from '#core/board/copper.ts';
import { replaced } from './in-list.ts';

/** The same board where there is no such object. Its name is changed by `renameObject`, which follows every reference. */
export function changeSink(board: Board, id: string, patch: Partial<Omit<Sink, 'id'>>): Board {
  const sinks = replaced(
    board.sinks,
    (item) => item.id === id,
    (item) => ({ ...item, ...patch }),
  );
  return sinks === board.sinks ? board : { ...board, sinks };
}
