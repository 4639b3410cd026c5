import type { Board } from '#core/board/document.ts';
import type { Point } from '#core/board/outline.ts';
import type { ObjectKey } from '../object-key.ts';
import { tidyMm } from './tidy-mm.ts';
import { transformObjects } from './transform-objects.ts';

/** Moves objects together by a distance, mm. */
export function moveObjects(board: Board, keys: readonly ObjectKey[], [dx, dy]: Point): Board {
  if (keys.length === 0 || (dx === 0 && dy === 0)) return board;
  return transformObjects(board, keys, { turnDeg: 0, point: ([x, y]) => [tidyMm(x + dx), tidyMm(y + dy)] });
}
