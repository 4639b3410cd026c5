type P = readonly [number, number];

const turn = (a: P, b: P, c: P) => (b[0] - a[0]) * (c[1] - a[1]) - (b[1] - a[1]) * (c[0] - a[0]);
const between = (a: P, b: P, c: P) =>
  Math.min(a[0], b[0]) <= c[0] &&
  c[0] <= Math.max(a[0], b[0]) &&
  Math.min(a[1], b[1]) <= c[1] &&
  c[1] <= Math.max(a[1], b[1]);

/** Whether the closed segments ab and cd share a point. */
export function segmentsTouch(a: P, b: P, c: P, d: P): boolean {
  const d1 = turn(c, d, a);
  const d2 = turn(c, d, b);
  const d3 = turn(a, b, c);
  const d4 = turn(a, b, d);
  if (d1 > 0 !== d2 > 0 && d3 > 0 !== d4 > 0 && d1 !== 0 && d2 !== 0 && d3 !== 0 && d4 !== 0) return true;
  return (
    (d1 === 0 && between(c, d, a)) ||
    (d2 === 0 && between(c, d, b)) ||
    (d3 === 0 && between(a, b, c)) ||
    (d4 === 0 && between(a, b, d))
  );
}

/** Distance from a point to the closed segment ab, mm. */
export function distanceToSegment(x: number, y: number, a: P, b: P): number {
  const dx = b[0] - a[0];
  const dy = b[1] - a[1];
  const length = dx * dx + dy * dy;
  const t = length === 0 ? 0 : Math.max(0, Math.min(1, ((x - a[0]) * dx + (y - a[1]) * dy) / length));
  return Math.hypot(x - a[0] - t * dx, y - a[1] - t * dy);
}
