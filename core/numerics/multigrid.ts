import { coarsen } from './coarsen.ts';
import { factorDense, solveDense } from './dense-cholesky.ts';
import { conductanceSums, multiply, nodeCount, type LayeredNetwork } from './layered-network.ts';
import { factorLines, smoothColumns, smoothExtras } from './line-smoother.ts';

type Level = {
  network: LayeredNetwork;
  sums: Float64Array;
  diagonal: Float64Array;
  inverse: Float64Array;
  /** Node of the next coarser level; null on the coarsest. */
  parent: Int32Array | null;
  b: Float64Array;
  x: Float64Array;
  residual: Float64Array;
};

/**
 * Hierarchy of a network: built once, refreshed when only anchors (films) change. The plain path of `kernel/`, in double precision
 * and without any packing; what the product solves with is held against it.
 */
export type Multigrid = { levels: Level[]; dense: Float64Array };

/** Columns of the coarsest level at most. */
const coarsestColumns = 12;

export function buildMultigrid(network: LayeredNetwork): Multigrid {
  const levels: Level[] = [];
  let fine = network;
  for (;;) {
    const n = nodeCount(fine);
    const arrays = () => new Float64Array(n);
    const sums = conductanceSums(fine);
    const level: Level = {
      network: fine,
      sums,
      diagonal: arrays(),
      inverse: arrays(),
      parent: null,
      b: arrays(),
      x: arrays(),
      residual: arrays(),
    };
    levels.push(level);
    if (fine.columns * fine.rows <= coarsestColumns) break;
    const { network: coarse, parent } = coarsen(fine);
    level.parent = parent;
    fine = coarse;
  }
  const last = nodeCount(fine);
  return { levels, dense: new Float64Array(last * last) };
}

/** Takes the finest network's present anchors into every level; false when the matrix is not positive definite. */
export function refreshMultigrid({ levels, dense }: Multigrid): boolean {
  levels.forEach((level, index) => {
    const { anchor } = level.network;
    for (let n = 0; n < anchor.length; n++) {
      const d = level.sums[n]! + anchor[n]!;
      // A node without any conductance (no board there) stands alone with a unit diagonal.
      level.diagonal[n] = d > 0 ? d : 1;
    }
    factorLines(level.network, level.diagonal, level.inverse);
    const next = levels[index + 1];
    if (!next || !level.parent) return;
    next.network.anchor.fill(0);
    for (let n = 0; n < anchor.length; n++) next.network.anchor[level.parent[n]!]! += anchor[n]!;
  });
  const { network, diagonal } = levels.at(-1)!;
  const n = diagonal.length;
  const unit = new Float64Array(n);
  const column = new Float64Array(n);
  for (let k = 0; k < n; k++) {
    unit[k] = 1;
    multiply(network, diagonal, unit, column);
    dense.set(column, k * n);
    unit[k] = 0;
  }
  return factorDense(dense, n);
}

/** z = one symmetric cycle on A·z = r, from zero. */
export function applyMultigrid(grid: Multigrid, r: Float64Array, z: Float64Array) {
  grid.levels[0]!.b.set(r);
  grid.levels[0]!.x.fill(0);
  cycle(grid, 0);
  z.set(grid.levels[0]!.x);
}

/** Two sweeps, the coarser level (twice from the second level on), two sweeps, from the unknowns as they are. */
function cycle(grid: Multigrid, depth: number) {
  const level = grid.levels[depth]!;
  const { network, inverse, b, x, parent, residual, diagonal } = level;
  if (!parent) {
    x.set(b);
    solveDense(grid.dense, x.length, x);
    return;
  }
  for (let sweep = 0; sweep < 2; sweep++) {
    smoothColumns(network, inverse, b, x, 0);
    smoothColumns(network, inverse, b, x, 1);
    smoothExtras(network, inverse, b, x, false);
  }
  multiply(network, diagonal, x, residual);
  const next = grid.levels[depth + 1]!;
  next.b.fill(0);
  for (let n = 0; n < x.length; n++) next.b[parent[n]!]! += b[n]! - residual[n]!;
  next.x.fill(0);
  cycle(grid, depth + 1);
  if (depth >= 1 && next.parent) cycle(grid, depth + 1);
  for (let n = 0; n < x.length; n++) x[n]! += next.x[parent[n]!]!;
  for (let sweep = 0; sweep < 2; sweep++) {
    smoothExtras(network, inverse, b, x, true);
    smoothColumns(network, inverse, b, x, 1);
    smoothColumns(network, inverse, b, x, 0);
  }
}
