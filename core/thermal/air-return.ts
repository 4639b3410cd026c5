import { AirStreaks, type StreakBody, type StreakFace } from './air-streaks.ts';
import type { BoardModel } from './board-model.ts';
import { caseConductance } from './case-film.ts';
import { faceBlocks, sumByBlock } from './face-blocks.ts';
import type { FilmConductances } from './film-conductances.ts';

/** One face: its blocks in the streaks, and each cell's share in its block's convection. */
type StreakSide = {
  face: StreakFace;
  packages: number[];
  offset: number;
  share: Float64Array;
  rise: Float64Array;
  back: Float64Array;
};

/** Heat that air, warmed upstream, brings back to the board and to its bodies in moving air: a linear map B of the rises. */
export type AirReturn = {
  top: StreakSide;
  bottom: StreakSide;
  /** Convection conductance of each case top, W/K, and convection film of each cell, W/(m²·K), and its forced share: to be set. */
  caseConvection: Float64Array;
  convection: { top: Float64Array; bottom: Float64Array };
  forced: { top: Float64Array; bottom: Float64Array };
  /** Rise of the air before each body, K, after the last `subtract`. */
  caseAir: Float64Array;
  /** Takes what was set, and the films of the bodies. */
  update: (films: FilmConductances) => void;
  /** y −= B·rise, W at each node; `back` of each side keeps it by block. */
  subtract: (rise: Float64Array, y: Float64Array) => void;
  /** y −= Bᵀ·weight. */
  subtractTransposed: (weight: Float64Array, y: Float64Array) => void;
};

export function airReturn(model: BoardModel, towardDeg: number): AirReturn {
  const { layers, packages, grid } = model;
  const cells = grid.columns * grid.rows;
  const blocks = faceBlocks(grid);
  const { blockOf } = blocks;
  const count = blocks.grid.columns * blocks.grid.rows;
  const blockArea = blocks.grid.dxMm * blocks.grid.dyMm * 1e-6;
  const streaks = new AirStreaks(blocks.grid, towardDeg);
  const members = sumByBlock(blocks, new Uint8Array(cells).fill(1));
  const caseAir = new Float64Array(packages.length);
  const caseConvection = new Float64Array(packages.length);
  const convection = { top: new Float64Array(cells), bottom: new Float64Array(cells) };
  const forced = { top: new Float64Array(cells), bottom: new Float64Array(cells) };
  const side = (key: 'top' | 'bottom'): StreakSide => {
    const chosen = [...packages.keys()].filter((index) => {
      const nodes = packages[index]!;
      return nodes.side === key && nodes.body.cell.length > 0;
    });
    return {
      packages: chosen,
      offset: key === 'top' ? 0 : layers.count - 1,
      share: new Float64Array(cells),
      rise: new Float64Array(count),
      back: new Float64Array(count),
      face: {
        film: new Float64Array(count),
        forced: new Float64Array(count),
        exposed: sumByBlock(blocks, model[key].area).map((area) => area / blockArea),
        bodies: chosen.map((index): StreakBody => {
          const { cell, weight } = packages[index]!.body;
          const shares = new Map<number, number>();
          cell.forEach((at, k) => shares.set(blockOf[at]!, (shares.get(blockOf[at]!) ?? 0) + weight[k]!));
          const footprint = Int32Array.from(shares.keys());
          return {
            junction: packages[index]!.junction,
            lead: streaks.leadOf(footprint),
            cell: footprint,
            shed: Float64Array.from(shares.values(), (share) => share / blockArea),
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
    for (const [key, one] of [
      ['top', top],
      ['bottom', bottom],
    ] as const) {
      const { face, share } = one;
      const { area } = model[key];
      for (let cell = 0; cell < cells; cell++) share[cell] = area[cell]! * convection[key][cell]!;
      const whole = sumByBlock(blocks, share);
      for (let cell = 0; cell < cells; cell++) if (share[cell]) share[cell]! /= whole[blockOf[cell]!]!;
      face.film = sumByBlock(blocks, convection[key]).map((sum, block) => sum / members[block]!);
      face.forced = sumByBlock(blocks, forced[key]).map((sum, block) => sum / members[block]!);
      one.packages.forEach((index, k) => {
        const { caseTopKPerW } = packages[index]!;
        const film = films.cases[index]!;
        const conductance = caseConductance(packages[index]!, film);
        const fromAir = caseTopKPerW * conductance;
        const body = face.bodies[k]!;
        body.own = caseConvection[index]! * (1 - fromAir);
        body.air = caseConvection[index]! * ((fromAir * caseConvection[index]!) / film - 1);
        body.back = (conductance * caseConvection[index]!) / film;
      });
    }
  };
  /** Block means of a field on the nodes, by each cell's share in the convection. */
  const gather = ({ share, rise, offset }: StreakSide, field: Float64Array) => {
    rise.fill(0);
    for (let cell = 0; cell < cells; cell++)
      rise[blockOf[cell]!]! += share[cell]! * field[cell * layers.count + offset]!;
  };
  const spread = ({ share, offset }: StreakSide, values: Float64Array, y: Float64Array) => {
    for (let cell = 0; cell < cells; cell++) y[cell * layers.count + offset]! -= share[cell]! * values[blockOf[cell]!]!;
  };
  const subtract: AirReturn['subtract'] = (rise, y) => {
    for (const one of [top, bottom]) {
      const { face, packages: chosen, back } = one;
      gather(one, rise);
      const junctions = Float64Array.from(face.bodies, (body) => rise[body.junction]!);
      const air = new Float64Array(chosen.length);
      streaks.forward(face, one.rise, junctions, back, air);
      spread(one, back, y);
      chosen.forEach((index, k) => {
        caseAir[index] = air[k]!;
        y[face.bodies[k]!.junction]! -= face.bodies[k]!.back * air[k]!;
      });
    }
  };
  const into = new Float64Array(count);
  const subtractTransposed: AirReturn['subtractTransposed'] = (weight, y) => {
    for (const one of [top, bottom]) {
      gather(one, weight);
      const junctions = Float64Array.from(one.face.bodies, (body) => weight[body.junction]!);
      const intoJunctions = new Float64Array(one.face.bodies.length);
      streaks.backward(one.face, one.rise, junctions, into, intoJunctions);
      spread(one, into, y);
      one.face.bodies.forEach((body, k) => (y[body.junction]! -= intoJunctions[k]!));
    }
  };
  return { top, bottom, caseConvection, convection, forced, caseAir, update, subtract, subtractTransposed };
}
