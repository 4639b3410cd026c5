import type { Condition } from '#core/board/condition.ts';
import { boundsOf } from '#core/geometry/polygon.ts';
import { airProperties, pressureRatio } from './air-properties.ts';
import type { BoardModel } from './board-model.ts';
import { drivingRise } from './driving-rise.ts';
import { movingAir, naturalLength } from './film-conductances.ts';
import { criticalReynolds } from './forced-convection.ts';
import { rayleigh } from './natural-convection.ts';
import type { ThermalNotice } from './solution.ts';
import type { Rises } from './solve-rises.ts';

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
