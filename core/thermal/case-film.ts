import type { AirProperties } from './air-properties.ts';
import { blendedFilm, plateFilm } from './forced-convection.ts';
import type { PackageNodes } from './package-star.ts';

/**
 * Convection on a body's top and sides, W/(m²·K): the natural film of its face, blended with a boundary layer that starts
 * anew at the body and runs over the side of the square of its area. Between Re 500 and 5000 this is within 20 % of
 * Nu = 0.348·Re^0.6 for flat packs on a card (Wirtz and Dykshoorn 1984, from memory), so no further enhancement is taken.
 * Range: Re of the body from `leastBodyReynolds`, below which no boundary layer forms and the film is better than this, to 5e5.
 */
export function caseFilm(nodes: PackageNodes, natural: number, speedMPerS: number, air: AirProperties): number {
  if (speedMPerS === 0) return natural;
  return blendedFilm(natural, plateFilm(speedMPerS, air)(0, nodes.bodySideM));
}

/** Reynolds number of a body from which the plate's boundary layer is thin against it (White, Viscous Fluid Flow, from memory). */
export const leastBodyReynolds = 50;

/** Case top between its resistance and its film, W/K; 0 without a film. */
export function caseConductance(nodes: PackageNodes, filmWPerK: number): number {
  return filmWPerK === 0 ? 0 : 1 / (nodes.caseTopKPerW + 1 / filmWPerK);
}
