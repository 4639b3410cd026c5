import type { AirProperties } from './air-properties.ts';

/** Reynolds number from which the boundary layer is taken as turbulent. */
export const criticalReynolds = 5e5;

/**
 * How much better a populated board in fan air is cooled than a smooth plate in a wind tunnel. Published enhancements by
 * free-stream turbulence (Dyban and Epik, laminar plate, up to 1.8 at 12–25 %; from memory) and by parts that trip the layer
 * (1.5 to 2 on circuit boards, Wills 1983, quoted by Ellison; from memory) agree on this range; the middle is taken. The bare
 * plate is 25–35 % too hot against published wind-tunnel ratios.
 */
export const boardEnhancement = 1.75;

/**
 * Mean film coefficient of a flat plate in parallel flow between two distances from its leading edge, m; W/(m²·K), uniform heat
 * flux: local Nu = 0.453·Re^½·Pr^⅓ laminar, 0.0308·Re^0.8·Pr^⅓ beyond Re 5e5 (Incropera, 7.2.4; Cengel, 7-2; Pr from 0.6).
 * A board is heated by its parts, not held at one temperature, so the flux form is the fitting one.
 * @param air at the film temperature
 */
export function plateFilm(speedMPerS: number, air: AirProperties): (fromM: number, toM: number) => number {
  const perMetre = speedMPerS / air.viscosity;
  const critical = criticalReynolds / perMetre;
  const scale = air.conductivity * air.prandtl ** (1 / 3);
  // Integrals of the local coefficient over x, so that the singular leading edge needs no care.
  const laminar = (x: number) => 0.906 * Math.sqrt(perMetre * x);
  const turbulent = (x: number) => (0.0308 / 0.8) * (perMetre * x) ** 0.8;
  return (fromM, toM) => {
    let integral = laminar(Math.min(toM, critical)) - laminar(Math.min(fromM, critical));
    if (toM > critical) integral += turbulent(toM) - turbulent(Math.max(fromM, critical));
    return (scale * integral) / (toM - fromM);
  };
}

/** Natural and forced convection together: the cube root of the sum of cubes (Churchill 1977; common practice for assisting flow). */
export const blendedFilm = (natural: number, forced: number) => Math.cbrt(natural ** 3 + forced ** 3);
