import type { Condition } from '#core/board/condition.ts';
import { bicgstab } from '#core/numerics/bicgstab.ts';
import type { IterationRecord } from '#core/numerics/conjugate-gradients.ts';
import { celsiusOffset } from '#core/units.ts';
import type { BoardModel } from './board-model.ts';
import { caseConductance } from './case-film.ts';
import { buildFilms, type FilmConductances } from './film-conductances.ts';
import { filmToleranceK, linearTolerance, maximumFilmRounds, maximumIterations, roundReduction } from './method.ts';
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
 * Non-linear solution in rounds: films from the present rises, one linear solve, again until nothing moves. The early rounds are
 * solved loosely and follow the films along their tangents (Newton, in still air); the last one has the films themselves, which no
 * longer move, and the full tolerance. Where a round
 * takes back most of the one before (radiation at rises of many hundred kelvins answers with more than it was given), the films
 * follow only part of the way from then on.
 */
export function solveRises(model: BoardModel, condition: Condition, heat: HeatInput, start?: Rises): Rises {
  const { network, solver } = model;
  const { films, out } = buildFilms(model, condition);
  const n = network.anchor.length;
  const usable = start && start.rise.length === n;
  const rise = usable ? start.rise.slice() : new Float64Array(n);
  const caseRise = usable ? start.caseRise.slice() : new Float64Array(model.packages.length);
  const b = rightSide(model, heat, films.ambientK);
  const { before, move, right, followedRise } = workOf(model, n);
  move.fill(0);
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

  let iterations = 0;
  let last = condition.filmWPerM2K !== null;
  followedRise.set(rise);
  const followed = { rise: followedRise, caseRise: caseRise.slice(), share: 1, move };
  for (let round = 0; round < maximumFilmRounds; round++) {
    follow(followed.rise, rise, followed.share);
    follow(followed.caseRise, caseRise, followed.share);
    films.update(followed.rise, followed.caseRise, out);
    if (!last) addTangents(model, out, b, rise, right);
    setAnchors(model, out, !last);
    if (!solver.refresh()) return record('invalid', 'The network has no path to the air.', iterations, NaN);
    before.set(rise);
    const linear = solveLinear(model, out, last ? b : right, rise, { reduction: last ? 0 : roundReduction });
    iterations += linear.iterations;
    if (linear.status === 'breakdown')
      return record('invalid', 'The linear solution broke down.', iterations, linear.residual);
    let moved = 0;
    let [back, square] = [0, 0];
    for (let k = 0; k < n; k++) {
      const move = rise[k]! - before[k]!;
      moved = Math.max(moved, Math.abs(move));
      back -= move * followed.move[k]!;
      square += followed.move[k]! ** 2;
      followed.move[k] = move;
    }
    if (round > 0 && back > swingRatio * square) followed.share = Math.max(leastShare, followed.share / 2);
    if (!Number.isFinite(moved))
      return record('invalid', 'The temperatures are not finite.', iterations, linear.residual);
    out.air?.subtract(rise, before);
    model.packages.forEach((nodes, index) => (caseRise[index] = caseRiseOf(model, out, rise, index)));
    if (!last) {
      // Tangents converge by squares: what moved this little will hardly move again, and the last round has a test of its own.
      last = moved <= (out.air ? 1 : 20) * filmToleranceK * followed.share;
      continue;
    }
    if (linear.status !== 'converged')
      return record('not-converged', 'The linear solution did not reach its tolerance.', iterations, linear.residual);
    if (moved <= 3 * filmToleranceK * followed.share || condition.filmWPerM2K !== null)
      return record('converged', null, iterations, linear.residual);
    last = false;
  }
  return record('not-converged', `The films did not settle in ${maximumFilmRounds} rounds.`, iterations, NaN);
}

/** Vectors of a solution on the way, kept with their model: touching new memory in every solution costs more than the work in it. */
type Work = Record<'before' | 'move' | 'right' | 'followedRise', Float64Array>;
const works = new WeakMap<BoardModel, Work>();

function workOf(model: BoardModel, n: number): Work {
  const vector = () => new Float64Array(n);
  const work = works.get(model) ?? { before: vector(), move: vector(), right: vector(), followedRise: vector() };
  works.set(model, work);
  return work;
}

/** A round that takes back more than this share of the one before swings; films answer at most with the third power of a rise. */
const swingRatio = 0.7;
const leastShare = 0.25;

function follow(behind: Float64Array, ahead: Float64Array, share: number) {
  for (let k = 0; k < ahead.length; k++) behind[k]! += share * (ahead[k]! - behind[k]!);
}

/**
 * Rises for given heat with the films as they are, or, `transposed`, the weights of heat for given weights of rises: by
 * conjugate gradients where the network is symmetric, by stabilised bi-conjugate gradients where air carries heat along.
 */
export function solveLinear(
  { solver }: BoardModel,
  { air }: FilmConductances,
  b: Float64Array,
  x: Float64Array,
  options: { tolerance?: number; reduction?: number; transposed?: boolean },
): IterationRecord {
  const limits = { tolerance: linearTolerance, maximumIterations, ...options };
  if (!air) return solver.solve(b, x, limits);
  const carrying = (v: Float64Array, y: Float64Array) => {
    solver.multiply(v, y);
    if (options.transposed) air.subtractTransposed(v, y);
    else air.subtract(v, y);
  };
  return bicgstab({ multiply: carrying, precondition: solver.precondition }, b, x, limits);
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

function caseRiseOf(model: BoardModel, films: FilmConductances, rise: Float64Array, index: number): number {
  const nodes = model.packages[index]!;
  const film = films.cases[index]!;
  const fromAir = nodes.caseTopKPerW * caseConductance(nodes, film);
  const air = films.air && film > 0 ? (films.air.caseAir[index]! * films.air.caseConvection[index]!) / film : 0;
  return rise[nodes.junction]! * (1 - fromAir) + air * fromAir;
}

/** Right side of a round that follows the films along their tangents from the rises as they are. */
function addTangents(
  model: BoardModel,
  { slope }: FilmConductances,
  b: Float64Array,
  rise: Float64Array,
  right: Float64Array,
) {
  right.set(b);
  const layers = model.layers.count;
  for (let cell = 0, first = 0; cell < slope.top.length; cell++, first += layers) {
    const last = first + layers - 1;
    right[first]! += slope.top[cell]! * rise[first]!;
    right[last]! += slope.bottom[cell]! * rise[last]!;
  }
}

function setAnchors(model: BoardModel, films: FilmConductances, tangents: boolean) {
  const { anchor } = model.network;
  const layers = model.layers.count;
  anchor.fill(0);
  for (let cell = 0; cell < films.top.length; cell++) {
    anchor[cell * layers]! += films.top[cell]!;
    anchor[cell * layers + layers - 1]! += films.bottom[cell]!;
    if (!tangents) continue;
    anchor[cell * layers]! += films.slope.top[cell]!;
    anchor[cell * layers + layers - 1]! += films.slope.bottom[cell]!;
  }
  for (const sink of model.sinks) {
    sink.weights.cell.forEach(
      (cell, k) => (anchor[cell * layers + sink.layer]! += sink.conductanceWPerK * sink.weights.weight[k]!),
    );
  }
  model.packages.forEach((nodes, index) => (anchor[nodes.junction]! += caseConductance(nodes, films.cases[index]!)));
}
