import type { Board } from '#core/board/document.ts';
import type { Probe } from '#core/board/placement.ts';
import { replaced } from './in-list.ts';

/** The same board where there is no such object. Its name is changed by `renameObject`, which follows every reference. */
export function changeProbe(board: Board, id: string, patch: Partial<Omit<Probe, 'id'>>): Board {
  const probes = replaced(
    board.probes,
    (item) => item.id === id,
    (item) => ({ ...item, ...patch }),
  );
  return probes === board.probes ? board : { ...board, probes };
}
