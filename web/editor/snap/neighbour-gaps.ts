import type { Board } from '#core/board/document.ts';
import { type ObjectKey, kindOf, objectKeys } from '#core/board/object-key.ts';
import { type Box, boxOf, objectRings } from '#core/board/object-rings.ts';
import type { Point } from '#core/board/outline.ts';

/** A clear distance from a moved object to its next neighbour, mm. */
export type Gap = { from: Point; to: Point; mm: number };

const neighbours = new Set(['regulator', 'source', 'via-field', 'sink', 'probe', 'cutout']);

/** Clear distances to the left, right, below and above: to the next object, or to the board's edge where none is nearer. */
export function neighbourGaps(board: Board, keys: readonly ObjectKey[]): Gap[] {
  const own = boxOf(keys.flatMap((key) => objectRings(board, key)));
  const edge = boxOf([board.outline.points]);
  if (!own || !edge) return [];
  const others = objectKeys(board)
    .filter((key) => neighbours.has(kindOf(key)) && !keys.includes(key))
    .flatMap((key) => boxOf(objectRings(board, key)) ?? []);
  const beside = others.filter((box) => box.bottom < own.top && box.top > own.bottom);
  const stacked = others.filter((box) => box.left < own.right && box.right > own.left);
  const left = Math.max(edge.left, ...beside.map((box) => box.right).filter((x) => x <= own.left));
  const right = Math.min(edge.right, ...beside.map((box) => box.left).filter((x) => x >= own.right));
  const below = Math.max(edge.bottom, ...stacked.map((box) => box.top).filter((y) => y <= own.bottom));
  const above = Math.min(edge.top, ...stacked.map((box) => box.bottom).filter((y) => y >= own.top));
  const [x, y] = middle(own);
  return [
    gap([own.left, y], [left, y], own.left - left),
    gap([own.right, y], [right, y], right - own.right),
    gap([x, own.bottom], [x, below], own.bottom - below),
    gap([x, own.top], [x, above], above - own.top),
  ].filter((each) => each.mm > 1e-6);
}

function gap(from: Point, to: Point, mm: number): Gap {
  return { from, to, mm };
}

function middle(box: Box): Point {
  return [(box.left + box.right) / 2, (box.bottom + box.top) / 2];
}
