import type { Board } from '#core/board/document.ts';
import { landRings } from '#core/board/footprint.ts';
import { type ObjectKey, idOf, kindOf, objectKeys } from '#core/board/object-key.ts';
import { type Box, boxOf, cornersOf, objectRings, positionOf } from '#core/board/object-rings.ts';
import type { Point, Ring } from '#core/board/outline.ts';

/** A line that an object offers: x = `at` for axis 0, y = `at` for axis 1; `low` to `high` is its object's extent along it. mm. */
export type SnapLine = { axis: 0 | 1; at: number; low: number; high: number; key: ObjectKey };

const found = new WeakMap<Board, Map<string, readonly SnapLine[]>>();

/** Edges, centres, lands and corners of every object but those that are being moved. Boards never change, so lines are kept with theirs. */
export function snapLines(board: Board, except: readonly ObjectKey[]): readonly SnapLine[] {
  const kept = found.get(board) ?? new Map<string, readonly SnapLine[]>();
  found.set(board, kept);
  const name = except.join(' ');
  const known = kept.get(name);
  if (known) return known;
  const moved = new Set(except);
  const lines = objectKeys(board)
    .filter((key) => !moved.has(key))
    .flatMap((key) => linesOf(board, key));
  kept.set(name, lines);
  return lines;
}

/** Lines of one object. */
export function linesOf(board: Board, key: ObjectKey): SnapLine[] {
  const rings = objectRings(board, key);
  const box = boxOf(rings);
  if (!box) return [];
  const position = positionOf(board, key);
  const points = [...edgesAndCentre(box), ...(position ? [position] : [])];
  if (cornersOf(board, key)) points.push(...rings.flat());
  for (const land of landsOf(board, key)) {
    const landBox = boxOf([land]);
    if (landBox) points.push(...edgesAndCentre(landBox));
  }
  const along = ([x, y]: Point): SnapLine[] => [
    { axis: 0, at: x, low: box.bottom, high: box.top, key },
    { axis: 1, at: y, low: box.left, high: box.right, key },
  ];
  return points.flatMap(along);
}

function edgesAndCentre(box: Box): Point[] {
  return [
    [box.left, box.bottom],
    [(box.left + box.right) / 2, (box.bottom + box.top) / 2],
    [box.right, box.top],
  ];
}

function landsOf(board: Board, key: ObjectKey): Ring[] {
  if (kindOf(key) !== 'regulator') return [];
  const regulator = board.regulators.find((item) => item.ref === idOf(key));
  return regulator ? landRings(board, regulator).map((land) => land.ring) : [];
}
