import type { Condition } from '#core/board/condition.ts';
import { conjugateGradients, conjugateWork } from '#core/numerics/conjugate-gradients.ts';
import { multiply } from '#core/numerics/layered-network.ts';
import { applyMultigrid, refreshMultigrid } from '#core/numerics/multigrid.ts';
import { celsiusOffset } from '#core/units.ts';
import type { BoardModel } from './board-model.ts';
import { buildFilms, filmConductances, type FilmConductances } from './film-conductances.ts';
import { filmToleranceK, linearTolerance, maximumFilmRounds, maximumIterations } from './method.ts';
import type { HeatInput } from './solution.ts';

/** Rises over the local air of every node and case top, with the films that belong to them. */
export type Rises = {
  status: 'converged' | 'not-converged' | 'invalid';
  message: string | null;
  ambientK: number;
  rise: Float64Array;
  caseRise: Float64Array;
  films: FilmConductances;
  iterations: number;
  residual: number;
};

/**
 * Non-linear solution by Picard rounds: films from the present rises, one linear solve, again until nothing moves.
 * The early rounds are solved loosely, the last one with the films frozen to the full tolerance.
 */
export function solveRises(model: BoardModel, condition: Condition, heat: HeatInput, start?: Rises): Rises {
  const { network, multigrid } = model;
  const films = buildFilms(model, condition);
  const out = filmConductances(model);
  const n = network.anchor.length;
  const usable = start && start.rise.length === n;
  const rise = usable ? start.rise.slice() : new Float64Array(n);
  const caseRise = usable ? start.caseRise.slice() : new Float64Array(model.packages.length);
  const work = conjugateWork(n);
  const b = rightSide(model, heat, films.ambientK);
  const before = new Float64Array(n);
  if (!usable) rise.fill(20);
  if (!usable) caseRise.fill(20);
  const record = (status: Rises['status'], message: string | null, iterations: number, residual: number): Rises => ({
    status,
    message,
    ambientK: films.ambientK,
    rise,
    caseRise,
    films: out,
    iterations,
    residual,
  });

  const fixed = condition.filmWPerM2K !== null;
  let iterations = 0;
  for (let round = 0; round < maximumFilmRounds; round++) {
    films.update(rise, caseRise, out);
    setAnchors(model, out);
    if (!refreshMultigrid(multigrid)) return record('invalid', 'The network has no path to the air.', iterations, NaN);
    const { diagonal } = multigrid.levels[0]!;
    const system = {
      multiply: (x: Float64Array, y: Float64Array) => multiply(network, diagonal, x, y),
      precondition: (r: Float64Array, z: Float64Array) => applyMultigrid(multigrid, r, z),
    };
    before.set(rise);
    const solve = (tolerance: number) => conjugateGradients(system, b, rise, { tolerance, maximumIterations, work });
    let linear = solve(fixed ? linearTolerance : 1e-4);
    iterations += linear.iterations;
    if (linear.status === 'breakdown')
      return record('invalid', 'The linear solution broke down.', iterations, linear.residual);
    model.packages.forEach((nodes, index) => (caseRise[index] = caseRiseOf(model, out, rise, index)));
    let moved = 0;
    for (let k = 0; k < n; k++) moved = Math.max(moved, Math.abs(rise[k]! - before[k]!));
    if (!Number.isFinite(moved))
      return record('invalid', 'The temperatures are not finite.', iterations, linear.residual);
    if (!fixed && moved > filmToleranceK * 10) continue;
    if (!fixed) {
      linear = solve(linearTolerance);
      iterations += linear.iterations;
      moved = 0;
      for (let k = 0; k < n; k++) moved = Math.max(moved, Math.abs(rise[k]! - before[k]!));
      model.packages.forEach((nodes, index) => (caseRise[index] = caseRiseOf(model, out, rise, index)));
      if (moved > filmToleranceK) continue;
    }
    return linear.status === 'converged'
      ? record('converged', null, iterations, linear.residual)
      : record('not-converged', 'The linear solution did not reach its tolerance.', iterations, linear.residual);
  }
  return record('not-converged', `The films did not settle in ${maximumFilmRounds} rounds.`, iterations, NaN);
}

/** Heat at each node, W, with the heat that sinks at a fixed temperature bring. */
export function rightSide(model: BoardModel, heat: HeatInput, ambientK: number): Float64Array {
  const b = new Float64Array(model.network.anchor.length);
  for (const nodes of model.packages) b[nodes.junction]! += heat.regulatorsW.get(nodes.ref) ?? 0;
  for (const source of model.sources) {
    const power = heat.sourcesW.get(source.ref) ?? 0;
    const offset = source.side === 'top' ? 0 : model.layers.count - 1;
    source.weights.cell.forEach(
      (cell, k) => (b[cell * model.layers.count + offset]! += power * source.weights.weight[k]!),
    );
  }
  for (const sink of model.sinks) {
    if (sink.toC === 'ambient') continue;
    const over = sink.toC + celsiusOffset - ambientK;
    sink.weights.cell.forEach((cell, k) => {
      b[cell * model.layers.count + sink.layer]! += sink.conductanceWPerK * sink.weights.weight[k]! * over;
    });
  }
  return b;
}

/** Case top between its resistance and its film. */
export function caseConductance(model: BoardModel, films: FilmConductances, index: number): number {
  const film = films.cases[index]!;
  return film === 0 ? 0 : 1 / (model.packages[index]!.caseTopKPerW + 1 / film);
}

function caseRiseOf(model: BoardModel, films: FilmConductances, rise: Float64Array, index: number): number {
  const nodes = model.packages[index]!;
  return rise[nodes.junction]! * (1 - nodes.caseTopKPerW * caseConductance(model, films, index));
}

function setAnchors(model: BoardModel, films: FilmConductances) {
  const { anchor } = model.network;
  const layers = model.layers.count;
  anchor.fill(0);
  for (let cell = 0; cell < films.top.length; cell++) {
    anchor[cell * layers]! += films.top[cell]!;
    anchor[cell * layers + layers - 1]! += films.bottom[cell]!;
  }
  for (const sink of model.sinks) {
    sink.weights.cell.forEach(
      (cell, k) => (anchor[cell * layers + sink.layer]! += sink.conductanceWPerK * sink.weights.weight[k]!),
    );
  }
  model.packages.forEach((nodes, index) => (anchor[nodes.junction]! += caseConductance(model, films, index)));
}
