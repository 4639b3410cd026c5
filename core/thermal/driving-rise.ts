import type { Face } from './film-areas.ts';

/**
 * Rise that drives natural convection on an unevenly warm face: ∫ΔT² dA ÷ ∫ΔT dA; the length shrinks with the side of the
 * warm patch, whose area is (∫ΔT dA)² ÷ ∫ΔT² dA. A choice of this model, exact for a face of one temperature and for a warm
 * patch on a cold face; checked by the published boards, whose mean error holds what it misses.
 * @param offset layer of the face in a column of `layers` nodes
 */
export function drivingRise(face: Face, rise: Float64Array, offset: number, layers: number) {
  let area = 0;
  let first = 0;
  let second = 0;
  for (let cell = 0; cell < face.area.length; cell++) {
    const a = face.area[cell]!;
    const t = Math.abs(rise[cell * layers + offset]!);
    area += a;
    first += a * t;
    second += a * t * t;
  }
  if (first < 1e-12 || area === 0) return { rise: 0.01, shrink: 1 };
  return { rise: Math.max(0.01, second / first), shrink: Math.sqrt((first * first) / second / area) };
}
