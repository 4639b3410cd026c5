import type { AirStreaks, StreakBody, StreakFace } from './air-streaks.ts';
import type { BoardModel } from './board-model.ts';
import { caseConductance } from './case-film.ts';
import type { FilmConductances } from './film-conductances.ts';

type StreakSide = { face: StreakFace; packages: number[]; offset: number; rise: Float64Array; back: Float64Array };

/** Heat that air, warmed upstream, brings back to the board and to its bodies in moving air: a linear map of the rises. */
export type AirReturn = {
  top: StreakSide;
  bottom: StreakSide;
  /** Convection conductance of each case top, W/K. */
  caseConvection: Float64Array;
  /** Rise of the air before each body, K, after the last `subtract`. */
  caseAir: Float64Array;
  /** Takes the present films of the bodies; to be called after the films are set. */
  update: (films: FilmConductances) => void;
  /** y −= B·rise, where B·rise is the heat brought back to each node, W; `back` of each side keeps it. */
  subtract: (rise: Float64Array, y: Float64Array) => void;
  /** y −= Bᵀ·weight. */
  subtractTransposed: (weight: Float64Array, y: Float64Array) => void;
};

export function airReturn(model: BoardModel, streaks: AirStreaks): AirReturn {
  const { layers, packages, grid } = model;
  const cells = grid.columns * grid.rows;
  const cellArea = grid.dxMm * grid.dyMm * 1e-6;
  const caseConvection = new Float64Array(packages.length);
  const caseAir = new Float64Array(packages.length);
  const side = (key: 'top' | 'bottom'): StreakSide => {
    const chosen = [...packages.keys()].filter((index) => {
      const nodes = packages[index]!;
      return nodes.side === key && nodes.body.cell.length > 0;
    });
    return {
      packages: chosen,
      offset: key === 'top' ? 0 : layers.count - 1,
      rise: new Float64Array(cells),
      back: new Float64Array(cells),
      face: {
        film: new Float64Array(cells),
        forced: new Float64Array(cells),
        exposed: model[key].area.map((area) => area / cellArea),
        bodies: chosen.map((index): StreakBody => {
          const { cell, weight } = packages[index]!.body;
          return {
            junction: packages[index]!.junction,
            lead: streaks.leadOf(cell),
            cell,
            shed: weight.map((share) => share / cellArea),
            own: 0,
            air: 0,
            back: 0,
          };
        }),
      },
    };
  };
  const [top, bottom] = [side('top'), side('bottom')];

  const update: AirReturn['update'] = (films) => {
    for (const { face, packages: chosen } of [top, bottom]) {
      chosen.forEach((index, k) => {
        const nodes = packages[index]!;
        const film = films.cases[index]!;
        const convection = caseConvection[index]!;
        const conductance = caseConductance(nodes, film);
        const fromAir = nodes.caseTopKPerW * conductance;
        const body = face.bodies[k]!;
        body.own = convection * (1 - fromAir);
        body.air = convection * ((fromAir * convection) / film - 1);
        body.back = (conductance * convection) / film;
      });
    }
  };
  const subtract: AirReturn['subtract'] = (rise, y) => {
    for (const { face, packages: chosen, offset, rise: faceRise, back } of [top, bottom]) {
      for (let cell = 0; cell < cells; cell++) faceRise[cell] = rise[cell * layers.count + offset]!;
      const junctions = Float64Array.from(face.bodies, (body) => rise[body.junction]!);
      const air = new Float64Array(chosen.length);
      streaks.forward(face, faceRise, junctions, back, air);
      for (let cell = 0; cell < cells; cell++) y[cell * layers.count + offset]! -= back[cell]!;
      chosen.forEach((index, k) => {
        caseAir[index] = air[k]!;
        y[face.bodies[k]!.junction]! -= face.bodies[k]!.back * air[k]!;
      });
    }
  };
  const subtractTransposed: AirReturn['subtractTransposed'] = (weight, y) => {
    const into = new Float64Array(cells);
    for (const { face, offset, rise: faceWeight } of [top, bottom]) {
      for (let cell = 0; cell < cells; cell++) faceWeight[cell] = weight[cell * layers.count + offset]!;
      const junctions = Float64Array.from(face.bodies, (body) => weight[body.junction]!);
      const intoJunctions = new Float64Array(face.bodies.length);
      streaks.backward(face, faceWeight, junctions, into, intoJunctions);
      for (let cell = 0; cell < cells; cell++) y[cell * layers.count + offset]! -= into[cell]!;
      face.bodies.forEach((body, k) => (y[body.junction]! -= intoJunctions[k]!));
    }
  };
  return { top, bottom, caseConvection, caseAir, update, subtract, subtractTransposed };
}
