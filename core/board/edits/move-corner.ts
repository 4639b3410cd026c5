import type { Board } from '#core/board/document.ts';
import type { Point } from '#core/board/outline.ts';
import type { ObjectKey } from '../object-key.ts';
import { withRing } from './with-ring.ts';

/** Puts one corner of a polygon elsewhere. */
export function moveCorner(board: Board, key: ObjectKey, index: number, to: Point): Board {
  return withRing(board, key, (ring) => ring.map((corner, place) => (place === index ? to : corner)));
}
