import type { Condition } from '#core/board/condition.ts';
import { boundsOf } from '#core/geometry/polygon.ts';
import { airProperties, pressureRatio } from './air-properties.ts';
import type { BoardModel } from './board-model.ts';
import { drivingRise } from './driving-rise.ts';
import { movingAir, naturalLength } from './film-conductances.ts';
import { criticalReynolds } from './forced-convection.ts';
import { rayleigh } from './natural-convection.ts';
import type { ThermalNotice } from './solution.ts';
import { leastBodyReynolds } from './case-film.ts';
import type { Rises } from './solve-rises.ts';

/** Rayleigh number of a lying board up to which the published fits of its lower face agree. */
const lyingRayleigh = 1e7;
/** Rise of the air in a box beyond which one temperature for all of it is no longer common practice, K. */
const warmBoxK = 60;

/** Where a film correlation or a property of air was used outside the range that it is published or checked for. */
export function filmNotices(model: BoardModel, condition: Condition, { rise, ambientK }: Rises): ThermalNotice[] {
  if (condition.filmWPerM2K !== null) return [];
  const notices: ThermalNotice[] = [];
  const note = (code: string, message: string) => notices.push({ code, ref: null, message });
  const pressure = pressureRatio(condition.altitudeM);
  const driving = drivingRise(model.top, rise, 0, model.layers.count);
  const filmK = ambientK + driving.rise / 2;
  if (condition.altitudeM > 11000) note('altitude-range', 'The air pressure is stated for altitudes up to 11 000 m.');
  if (filmK < 200 || filmK > 600) {
    note('air-range', `Air at ${filmK.toFixed(0)} K is outside the 200 to 600 K of its property formulas.`);
  }
  const air = movingAir(condition);
  const properties = airProperties(filmK, pressure);
  const ra = rayleigh(properties, driving.rise, naturalLength(model, condition) * driving.shrink);
  // Without heat there is no draught, and nothing is taken from the correlation.
  if (!air && driving.rise > 1 && (ra < 1 || ra > 1e10)) {
    note(
      'rayleigh-range',
      `Natural convection at Ra ${ra.toExponential(1)} is outside the range 1 to 1e10 of its formulas.`,
    );
  }
  if (!air && driving.rise > 1 && condition.orientation === 'horizontal' && ra > lyingRayleigh && ra <= 1e10) {
    note(
      'lying-board-range',
      `At Ra ${ra.toExponential(1)} the published fits for a face that looks down part by a quarter and more; they agree up to 1e7.`,
    );
  }
  if (condition.boxRiseK > warmBoxK) {
    note(
      'box-range',
      `One temperature is taken for all the air of a box that is ${condition.boxRiseK} K above the outside; so warm a box has layers of air.`,
    );
  }
  if (!air) return notices;
  const bounds = boundsOf(model.board.outline.points);
  const length = Math.hypot(bounds.maxX - bounds.minX, bounds.maxY - bounds.minY) * 1e-3;
  const reynolds = (air.speedMPerS * length) / properties.viscosity;
  if (reynolds > criticalReynolds) {
    note(
      'reynolds-range',
      `Re ${reynolds.toExponential(1)}: the wake of warm parts is that of laminar flow, up to Re 5e5.`,
    );
  }
  const bodies = model.packages.map((nodes) => (air.speedMPerS * nodes.bodySideM) / properties.viscosity);
  if (Math.min(...bodies) < leastBodyReynolds) {
    note(
      'body-range',
      `Re ${Math.min(...bodies).toFixed(0)} of the smallest body is below ${leastBodyReynolds}: its case is cooled better than shown.`,
    );
  }
  if (air.speedMPerS < 0.3) {
    note(
      'slow-air',
      `At ${air.speedMPerS} m/s the natural draught is as strong as the flow; the two are taken to help each other.`,
    );
  }
  if (air.speedMPerS > 3) {
    note('fast-air', `Moving air was checked against published boards up to 3 m/s; here it is ${air.speedMPerS} m/s.`);
  }
  return notices;
}
