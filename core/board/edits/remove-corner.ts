import type { Board } from '#core/board/document.ts';
import type { ObjectKey } from '../object-key.ts';
import { withRing } from './with-ring.ts';

/** A polygon keeps three corners at least. */
export function removeCorner(board: Board, key: ObjectKey, index: number): Board {
  return withRing(board, key, (ring) => (ring.length <= 3 ? ring : ring.filter((_, place) => place !== index)));
}
