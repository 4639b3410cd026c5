import type { Face } from './film-areas.ts';
import { radiationFilm, radiationSlope } from './radiation.ts';

/** A natural film grows about with this power of the rise that drives it. */
const naturalExponent = 0.2;

/** Radiation is linearised between these rises, so that a wild intermediate field cannot overflow. */
export const withinRange = (rise: number) => Math.max(-150, Math.min(2000, rise));

/**
 * Film conductances of a face in still air, W/K, and what its heat gains per kelvin beyond them.
 * @param node first cell's node and the step from cell to cell
 * @param natural film of natural convection, the same all over the face, W/(m²·K)
 */
export function stillFace(
  { area, emissivity }: Face,
  rise: Float64Array,
  node: { first: number; step: number },
  natural: number,
  ambientK: number,
  out: { film: Float64Array; slope: Float64Array },
) {
  const { film, slope } = out;
  for (let cell = 0, n = node.first; cell < area.length; cell++, n += node.step) {
    const a = area[cell]!;
    if (a === 0) {
      film[cell] = slope[cell] = 0;
      continue;
    }
    const surfaceK = ambientK + withinRange(rise[n]!);
    const e = emissivity[cell]!;
    film[cell] = a * (natural + radiationFilm(e, surfaceK, ambientK));
    slope[cell] = a * (naturalExponent * natural + radiationSlope(e, surfaceK, ambientK));
  }
}
