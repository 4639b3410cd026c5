import type { Board } from '#core/board/document.ts';
import { boxOf, objectRings, positionOf } from '../object-rings.ts';
import type { ObjectKey } from '../object-key.ts';
import { tidyMm } from './tidy-mm.ts';
import { transformObjects } from './transform-objects.ts';

/** Turns one object about its own place, several about the middle of their common box; degrees counter-clockwise. */
export function rotateObjects(board: Board, keys: readonly ObjectKey[], byDeg: number): Board {
  const [first] = keys;
  if (!first || byDeg % 360 === 0) return board;
  const box = boxOf(keys.flatMap((key) => objectRings(board, key)));
  const middle = keys.length === 1 ? positionOf(board, first) : null;
  if (!box) return board;
  const [cx, cy] = middle ?? [(box.left + box.right) / 2, (box.bottom + box.top) / 2];
  const angle = (byDeg * Math.PI) / 180;
  const [cos, sin] = [Math.cos(angle), Math.sin(angle)];
  return transformObjects(board, keys, {
    turnDeg: byDeg,
    point: ([x, y]) => [tidyMm(cx + (x - cx) * cos - (y - cy) * sin), tidyMm(cy + (x - cx) * sin + (y - cy) * cos)],
  });
}
