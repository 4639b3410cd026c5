import type { Board } from '#core/board/document.ts';
import type { Regulator } from '#core/board/placement.ts';
import { replaced } from './in-list.ts';

/** The same board where there is no such object. Its name is changed by `renameObject`, which follows every reference. */
export function changeRegulator(board: Board, ref: string, patch: Partial<Omit<Regulator, 'ref'>>): Board {
  const regulators = replaced(
    board.regulators,
    (item) => item.ref === ref,
    (item) => ({ ...item, ...patch }),
  );
  return regulators === board.regulators ? board : { ...board, regulators };
}
