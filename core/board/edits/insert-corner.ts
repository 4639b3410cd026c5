import type { Board } from '#core/board/document.ts';
import type { ObjectKey } from '../object-key.ts';
import { withRing } from './with-ring.ts';

/** A new corner in the middle of the edge that leaves corner `index`. */
export function insertCorner(board: Board, key: ObjectKey, index: number): Board {
  return withRing(board, key, (ring) => {
    const from = ring[index];
    const to = ring[(index + 1) % ring.length];
    if (!from || !to) return ring;
    return ring.toSpliced(index + 1, 0, [(from[0] + to[0]) / 2, (from[1] + to[1]) / 2]);
  });
}
