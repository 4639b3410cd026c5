import { boundsOf, polygonContains, type Ring } from './polygon.ts';
import { distanceToSegment, segmentsTouch } from './segments.ts';

/** Whether no two edges of the ring touch but neighbours at their common corner, and no edge has zero length. */
export function isSimplePolygon(ring: Ring): boolean {
  const n = ring.length;
  if (n < 3) return false;
  const at = (i: number) => ring[i % n]!;
  for (let i = 0; i < n; i++) {
    if (at(i)[0] === at(i + 1)[0] && at(i)[1] === at(i + 1)[1]) return false;
    for (let j = i + 1; j < n; j++) {
      const neighbours = j === i + 1 || (i === 0 && j === n - 1);
      if (neighbours) {
        // Neighbouring edges may only meet at their common corner; folding back on itself is a crossing.
        const [a, b, c] = j === i + 1 ? [at(i), at(j), at(j + 1)] : [at(j), at(0), at(1)];
        const cross = (b[0] - a[0]) * (c[1] - b[1]) - (b[1] - a[1]) * (c[0] - b[0]);
        const dot = (b[0] - a[0]) * (c[0] - b[0]) + (b[1] - a[1]) * (c[1] - b[1]);
        if (cross === 0 && dot < 0) return false;
      } else if (segmentsTouch(at(i), at(i + 1), at(j), at(j + 1))) return false;
    }
  }
  return true;
}

/** Whether two simple polygons share any area or touch. */
export function polygonsOverlap(a: Ring, b: Ring): boolean {
  const p = boundsOf(a);
  const q = boundsOf(b);
  if (p.maxX < q.minX || q.maxX < p.minX || p.maxY < q.minY || q.maxY < p.minY) return false;
  for (let i = 0; i < a.length; i++) {
    for (let j = 0; j < b.length; j++) {
      if (segmentsTouch(a[i]!, a[(i + 1) % a.length]!, b[j]!, b[(j + 1) % b.length]!)) return true;
    }
  }
  return polygonContains(a, b[0]![0], b[0]![1]) || polygonContains(b, a[0]![0], a[0]![1]);
}

/** Distance from a point to the nearest edge of the ring, mm. */
export function distanceToEdge(ring: Ring, x: number, y: number): number {
  let least = Infinity;
  for (let i = 0; i < ring.length; i++) {
    least = Math.min(least, distanceToSegment(x, y, ring[i]!, ring[(i + 1) % ring.length]!));
  }
  return least;
}
