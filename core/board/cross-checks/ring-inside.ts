import { polygonContains } from '#core/geometry/polygon.ts';
import { distanceToEdge } from '#core/geometry/ring-checks.ts';
import type { Point, Ring } from '../outline.ts';

/** Closer than this to an edge counts as on it, mm. */
const onEdgeMm = 1e-9;

/** Whether a simple ring lies inside another; it may touch its edge, but not leave it. */
export function ringInside(inner: Ring, outer: Ring): boolean {
  const covered = ([x, y]: Point) => polygonContains(outer, x, y) || distanceToEdge(outer, x, y) < onEdgeMm;
  return inner.every((corner, index) => {
    const next = inner[(index + 1) % inner.length]!;
    if (!covered(corner) || !covered([(corner[0] + next[0]) / 2, (corner[1] + next[1]) / 2])) return false;
    return outer.every((edge, k) => !crosses(corner, next, edge, outer[(k + 1) % outer.length]!));
  });
}

const turn = (a: Point, b: Point, c: Point) => (b[0] - a[0]) * (c[1] - a[1]) - (b[1] - a[1]) * (c[0] - a[0]);

/** Whether two segments pass through each other; touching is no crossing. */
function crosses(a: Point, b: Point, c: Point, d: Point): boolean {
  return turn(a, b, c) * turn(a, b, d) < 0 && turn(c, d, a) * turn(c, d, b) < 0;
}
