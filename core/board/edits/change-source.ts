import type { Board } from '#core/board/document.ts';
import type { HeatSource } from '#core/board/placement.ts';
import { replaced } from './in-list.ts';

/** The same board where there is no such object. Its name is changed by `renameObject`, which follows every reference. */
export function changeSource(board: Board, ref: string, patch: Partial<Omit<HeatSource, 'ref'>>): Board {
  const sources = replaced(
    board.sources,
    (item) => item.ref === ref,
    (item) => ({ ...item, ...patch }),
  );
  return sources === board.sources ? board : { ...board, sources };
}
