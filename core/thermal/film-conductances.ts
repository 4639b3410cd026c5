import type { Condition } from '#core/board/condition.ts';
import { boundsOf, perimeter, polygonArea } from '#core/geometry/polygon.ts';
import { celsiusOffset } from '#core/units.ts';
import { airProperties, pressureRatio } from './air-properties.ts';
import { airReturn, type AirReturn } from './air-return.ts';
import type { BoardModel } from './board-model.ts';
import { caseFilm } from './case-film.ts';
import { drivingRise } from './driving-rise.ts';
import { flowDistances } from './flow-distance.ts';
import { blendedFilm, boardEnhancement, plateFilm } from './forced-convection.ts';
import { naturalFilm, type Attitude } from './natural-convection.ts';
import { radiationFilm } from './radiation.ts';
import { stillFace, withinRange } from './still-face.ts';

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

/** Convection and radiation of every outer cell face and case top, W/K; `air` is null where the air stands still. */
export type FilmConductances = {
  top: Float64Array;
  bottom: Float64Array;
  cases: Float64Array;
  /** What a face's heat gains per kelvin beyond its film, W/K, in still air; 0 elsewhere. It speeds the rounds, never the answer. */
  slope: { top: Float64Array; bottom: Float64Array };
  air: AirReturn | null;
};

/** Whether the air moves in a condition: a stopped fan is still air. */
export function movingAir(condition: Condition) {
  return condition.air.kind === 'moving' && condition.fault?.kind !== 'fan-stopped' ? condition.air : null;
}

/** Length that natural convection is built on, m: the height when upright, area ÷ perimeter when lying. */
export function naturalLength(model: BoardModel, condition: Condition): number {
  const { points } = model.board.outline;
  const bounds = boundsOf(points);
  const mm = condition.orientation === 'vertical' ? bounds.maxY - bounds.minY : polygonArea(points) / perimeter(points);
  return mm * 1e-3;
}

export function buildFilms(model: BoardModel, condition: Condition): { films: Films; out: FilmConductances } {
  const ambientK = condition.ambientC + condition.boxRiseK + celsiusOffset;
  const pressure = pressureRatio(condition.altitudeM);
  const fixed = condition.filmWPerM2K;
  const moving = fixed === null ? movingAir(condition) : null;
  const upright = condition.orientation === 'vertical';
  const length = naturalLength(model, condition);
  const cells = model.grid.columns * model.grid.rows;
  const out: FilmConductances = {
    top: new Float64Array(cells),
    bottom: new Float64Array(cells),
    cases: new Float64Array(model.packages.length),
    slope: { top: new Float64Array(cells), bottom: new Float64Array(cells) },
    air: moving ? airReturn(model, moving.towardDeg) : null,
  };
  const distances = moving ? flowDistances(model.grid, moving.towardDeg) : null;
  const sides = [
    { face: model.top, offset: 0, attitude: upright ? 'upright' : 'face-up', key: 'top' },
    { face: model.bottom, offset: model.layers.count - 1, attitude: upright ? 'upright' : 'face-down', key: 'bottom' },
  ] as const;

  const setFixed = (films: { top: number; bottom: number }) => {
    for (const { face, key } of sides) face.area.forEach((area, cell) => (out[key][cell] = films[key] * area));
    model.packages.forEach((nodes, index) => (out.cases[index] = films[nodes.side] * nodes.caseAreaM2));
  };
  const update: Films['update'] = (rise, caseRise) => {
    if (fixed !== null) return setFixed(typeof fixed === 'number' ? { top: fixed, bottom: fixed } : fixed);
    for (const { face, offset, attitude, key } of sides) {
      const driving = drivingRise(face, rise, offset, model.layers.count);
      const properties = airProperties(ambientK + driving.rise / 2, pressure);
      const natural = naturalFilm(attitude as Attitude, properties, driving.rise, length * driving.shrink);
      const plate = moving ? plateFilm(moving.speedMPerS, properties) : null;
      const { air } = out;
      if (!plate || !distances || !air) {
        const target = { film: out[key], slope: out.slope[key] };
        stillFace(face, rise, { first: offset, step: model.layers.count }, natural, ambientK, target);
      } else {
        for (let cell = 0; cell < cells; cell++) {
          const stream = boardEnhancement * plate(distances.near[cell]!, distances.far[cell]!);
          const convection = blendedFilm(natural, stream);
          air.convection[key][cell] = convection;
          air.forced[key][cell] = (stream / convection) ** 3;
          const area = face.area[cell]!;
          const surfaceK = ambientK + withinRange(rise[cell * model.layers.count + offset]!);
          const radiation = radiationFilm(face.emissivity[cell]!, surfaceK, ambientK);
          out[key][cell] = area === 0 ? 0 : area * (convection + radiation);
        }
      }
      model.packages.forEach((nodes, index) => {
        if (nodes.side !== key) return;
        const surfaceK = ambientK + withinRange(caseRise[index]!);
        const convection = nodes.caseAreaM2 * caseFilm(nodes, natural, moving?.speedMPerS ?? 0, properties);
        out.cases[index] = convection + nodes.caseAreaM2 * radiationFilm(nodes.emissivity, surfaceK, ambientK);
        if (out.air) out.air.caseConvection[index] = convection;
      });
    }
    out.air?.update(out);
  };
  return { films: { ambientK, update }, out };
}
