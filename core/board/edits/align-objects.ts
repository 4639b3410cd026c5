import type { Board } from '#core/board/document.ts';
import type { ObjectKey } from '../object-key.ts';
import { type Box, boxOf, objectRings } from '../object-rings.ts';
import { moveObjects } from './move-objects.ts';

export const alignments = ['left', 'centre', 'right', 'top', 'middle', 'bottom'] as const;
/** Left, centre, right: along x; top, middle, bottom: along y. */
export type Alignment = (typeof alignments)[number];

/** Moves each object so that the named side (or middle) of its box lies on that of the box around all of them. */
export function alignObjects(board: Board, keys: readonly ObjectKey[], to: Alignment): Board {
  const whole = boxOf(keys.flatMap((key) => objectRings(board, key)));
  if (!whole || keys.length < 2) return board;
  return keys.reduce((before, key) => {
    const own = boxOf(objectRings(board, key));
    if (!own) return before;
    const by = lineOf(whole, to) - lineOf(own, to);
    return moveObjects(before, [key], isAlongX(to) ? [by, 0] : [0, by]);
  }, board);
}

function isAlongX(to: Alignment): boolean {
  return to === 'left' || to === 'centre' || to === 'right';
}

function lineOf(box: Box, to: Alignment): number {
  if (to === 'centre') return (box.left + box.right) / 2;
  if (to === 'middle') return (box.bottom + box.top) / 2;
  return box[to];
}
