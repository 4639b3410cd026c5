import type { Condition } from '#core/board/condition.ts';
import { boundsOf, perimeter, polygonArea } from '#core/geometry/polygon.ts';
import { celsiusOffset } from '#core/units.ts';
import { pressureRatio } from './air-properties.ts';
import type { BoardModel } from './board-model.ts';
import type { Face } from './film-areas.ts';
import { flowDistances } from './flow-distance.ts';
import { blendedFilm, forcedFilm } from './forced-convection.ts';
import { naturalFilm, type Attitude } from './natural-convection.ts';
import { radiationFilm } from './radiation.ts';

/** Air around a board in one condition, made once; `update` turns present temperatures into film conductances. */
export type Films = {
  ambientK: number;
  /**
   * Writes the film conductance of every outer cell face and case top, W/K, for the given rises over the air, K.
   * @param rise of every node of the network
   * @param caseRise of every case top
   */
  update: (rise: Float64Array, caseRise: Float64Array, out: FilmConductances) => void;
};

export type FilmConductances = { top: Float64Array; bottom: Float64Array; cases: Float64Array };

export function filmConductances(model: BoardModel): FilmConductances {
  const cells = model.grid.columns * model.grid.rows;
  return {
    top: new Float64Array(cells),
    bottom: new Float64Array(cells),
    cases: new Float64Array(model.packages.length),
  };
}

export function buildFilms(model: BoardModel, condition: Condition): Films {
  const ambientK = condition.ambientC + condition.boxRiseK + celsiusOffset;
  const pressure = pressureRatio(condition.altitudeM);
  const moving = condition.air.kind === 'moving' && condition.fault?.kind !== 'fan-stopped' ? condition.air : null;
  const distances = moving ? flowDistances(model.grid, moving.towardDeg) : null;
  const { points } = model.board.outline;
  const bounds = boundsOf(points);
  const upright = condition.orientation === 'vertical';
  const length = (upright ? bounds.maxY - bounds.minY : polygonArea(points) / perimeter(points)) * 1e-3;
  const layers = model.layers.count;

  const sides = [
    { face: model.top, offset: 0, attitude: upright ? 'upright' : 'face-up', key: 'top' },
    { face: model.bottom, offset: layers - 1, attitude: upright ? 'upright' : 'face-down', key: 'bottom' },
  ] as const;

  const update: Films['update'] = (rise, caseRise, out) => {
    const fixed = condition.filmWPerM2K;
    if (fixed !== null) {
      const films = typeof fixed === 'number' ? { top: fixed, bottom: fixed } : fixed;
      for (const { face, key } of sides) face.area.forEach((area, cell) => (out[key][cell] = films[key] * area));
      model.packages.forEach((nodes, index) => (out.cases[index] = films[nodes.side] * nodes.caseAreaM2));
      return;
    }
    for (const { face, offset, attitude, key } of sides) {
      const mean = drivingRise(face, rise, offset, layers);
      const natural = naturalFilm(attitude as Attitude, ambientK, mean.rise, length * mean.shrink, pressure);
      const film = ambientK + mean.rise / 2;
      for (let cell = 0; cell < face.area.length; cell++) {
        const area = face.area[cell]!;
        if (area === 0) {
          out[key][cell] = 0;
          continue;
        }
        const convection =
          moving && distances
            ? blendedFilm(
                natural,
                forcedFilm(moving.speedMPerS, distances.near[cell]!, distances.far[cell]!, film, pressure),
              )
            : natural;
        const surfaceK = ambientK + Math.max(-150, Math.min(2000, rise[cell * layers + offset]!));
        out[key][cell] = area * (convection + radiationFilm(face.emissivity[cell]!, surfaceK, ambientK));
      }
      model.packages.forEach((nodes, index) => {
        if (nodes.side !== key) return;
        const surfaceK = ambientK + Math.max(-150, Math.min(2000, caseRise[index]!));
        let convection = natural;
        const cell = nodes.lands[0]?.weights.cell[0];
        if (moving && distances && cell !== undefined) {
          convection = blendedFilm(
            natural,
            forcedFilm(moving.speedMPerS, distances.near[cell]!, distances.far[cell]!, film, pressure),
          );
        }
        out.cases[index] = nodes.caseAreaM2 * (convection + radiationFilm(nodes.emissivity, surfaceK, ambientK));
      });
    }
  };
  return { ambientK, update };
}

/**
 * Rise that drives natural convection on an unevenly warm face: ∫ΔT² dA ÷ ∫ΔT dA; the length shrinks with the side of the
 * warm patch, whose area is (∫ΔT dA)² ÷ ∫ΔT² dA.
 */
function drivingRise(face: Face, rise: Float64Array, offset: number, layers: number) {
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
