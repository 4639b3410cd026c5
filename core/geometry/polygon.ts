/** A closed ring of points [x, y] in mm, the last joined to the first; either sense of rotation. */
export type Ring = readonly (readonly [number, number])[];

/** Signed area, mm²; positive for a ring that runs counter-clockwise. */
export function signedArea(ring: Ring): number {
  let twice = 0;
  for (let i = 0, j = ring.length - 1; i < ring.length; j = i++) {
    const [ax, ay] = ring[j]!;
    const [bx, by] = ring[i]!;
    twice += ax * by - bx * ay;
  }
  return twice / 2;
}

export const polygonArea = (ring: Ring) => Math.abs(signedArea(ring));

/** Whether a point lies inside the ring (even-odd); points on an edge may fall on either side. */
export function polygonContains(ring: Ring, x: number, y: number): boolean {
  let inside = false;
  for (let i = 0, j = ring.length - 1; i < ring.length; j = i++) {
    const [ax, ay] = ring[j]!;
    const [bx, by] = ring[i]!;
    if (ay > y !== by > y && x < ((bx - ax) * (y - ay)) / (by - ay) + ax) inside = !inside;
  }
  return inside;
}

export type Bounds = { minX: number; minY: number; maxX: number; maxY: number };

export function boundsOf(ring: Ring): Bounds {
  const bounds = { minX: Infinity, minY: Infinity, maxX: -Infinity, maxY: -Infinity };
  for (const [x, y] of ring) {
    bounds.minX = Math.min(bounds.minX, x);
    bounds.minY = Math.min(bounds.minY, y);
    bounds.maxX = Math.max(bounds.maxX, x);
    bounds.maxY = Math.max(bounds.maxY, y);
  }
  return bounds;
}

export function perimeter(ring: Ring): number {
  return ring.reduce((sum, [bx, by], i) => {
    const [ax, ay] = ring[(i + ring.length - 1) % ring.length]!;
    return sum + Math.hypot(bx - ax, by - ay);
  }, 0);
}
