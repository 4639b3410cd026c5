import type { Board } from '#core/board/document.ts';
import type { Point, Ring } from '#core/board/outline.ts';
import { type ObjectKey, idOf, kindOf } from '../object-key.ts';
import { type Box, boxOf } from '../object-rings.ts';
import { tidyMm } from './tidy-mm.ts';
import { replaced } from './in-list.ts';
import { withRing } from './with-ring.ts';

/** Moves and stretches a polygon so that it fills another box; the holes of a pour go along. */
export function scaleRing(board: Board, key: ObjectKey, to: Box): Board {
  let place: (point: Point) => Point = (point) => point;
  const moved = withRing(board, key, (ring) => {
    const from = boxOf([ring]);
    if (from) place = placing(from, to);
    return ring.map(place);
  });
  if (kindOf(key) !== 'pour') return moved;
  const holes = (rings: Ring[]) => rings.map((ring) => ring.map(place));
  return {
    ...moved,
    pours: replaced(
      moved.pours,
      (pour) => pour.id === idOf(key),
      (pour) => ({ ...pour, holes: holes(pour.holes) }),
    ),
  };
}

function placing(from: Box, to: Box): (point: Point) => Point {
  const scale = (value: number, low: number, high: number, newLow: number, newHigh: number) =>
    high === low ? newLow : tidyMm(newLow + ((value - low) / (high - low)) * (newHigh - newLow));
  return ([x, y]) => [
    scale(x, from.left, from.right, to.left, to.right),
    scale(y, from.bottom, from.top, to.bottom, to.top),
  ];
}
