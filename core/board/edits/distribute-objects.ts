import type { Board } from '#core/board/document.ts';
import type { ObjectKey } from '../object-key.ts';
import { boxOf, objectRings } from '../object-rings.ts';
import { moveObjects } from './move-objects.ts';

/**
 * Spreads three or more objects so that the gaps between their boxes along one axis are equal; the outermost two stay.
 * Where the objects are wider than the room between them the equal gaps are overlaps.
 */
export function distributeObjects(board: Board, keys: readonly ObjectKey[], axis: 'x' | 'y'): Board {
  const spans = keys
    .flatMap((key) => {
      const box = boxOf(objectRings(board, key));
      if (!box) return [];
      return axis === 'x' ? { key, low: box.left, high: box.right } : { key, low: box.bottom, high: box.top };
    })
    .sort((a, b) => a.low + a.high - (b.low + b.high));
  const [first] = spans;
  const last = spans.at(-1);
  if (!first || !last || spans.length < 3) return board;
  const taken = spans.reduce((sum, { low, high }) => sum + high - low, 0);
  const gap = (last.high - first.low - taken) / (spans.length - 1);
  let next = first.low;
  let result = board;
  for (const { key, low, high } of spans) {
    const by = key === last.key ? 0 : next - low;
    result = moveObjects(result, [key], axis === 'x' ? [by, 0] : [0, by]);
    next += high - low + gap;
  }
  return result;
}
