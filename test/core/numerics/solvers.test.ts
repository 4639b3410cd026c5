import { expect, test } from 'vitest';
import { conjugateGradients, conjugateWork } from '#core/numerics/conjugate-gradients.ts';
import { factorDense, solveDense } from '#core/numerics/dense-cholesky.ts';
import {
  buildLinks,
  conductanceSums,
  type LayeredNetwork,
  multiply,
  nodeCount,
} from '#core/numerics/layered-network.ts';
import { applyMultigrid, buildMultigrid, refreshMultigrid } from '#core/numerics/multigrid.ts';

/** Park and Miller's generator, so that a network is the same on every run. */
function random(seed: number): () => number {
  let state = seed;
  return () => (state = (state * 48271) % 2147483647) / 2147483647;
}

/** Conductances over four decades, extra nodes and links past the grid, a weak anchor. */
function network(columns: number, rows: number, layers: number, seed: number): LayeredNetwork {
  const next = random(seed);
  const cells = columns * rows * layers;
  const value = () => 10 ** (4 * next() - 3);
  const [gx, gy, gz] = [new Float64Array(cells), new Float64Array(cells), new Float64Array(cells)];
  for (let n = 0; n < cells; n++) {
    const cell = Math.floor(n / layers);
    if (cell % columns < columns - 1) gx[n] = value();
    if (Math.floor(cell / columns) < rows - 1) gy[n] = value();
    if (n % layers < layers - 1) gz[n] = value();
  }
  const extras = 2;
  const pairs = [
    { a: cells, b: 3, g: 5 },
    { a: cells, b: cells + 1, g: 0.4 },
    { a: cells + 1, b: cells - 2, g: 2 },
    { a: 0, b: layers - 1, g: 0.7 },
  ];
  const anchor = new Float64Array(cells + extras).map(() => 1e-3 * next());
  return { columns, rows, layers, extras, gx, gy, gz, links: buildLinks(cells + extras, pairs), anchor };
}

function solveIteratively(net: LayeredNetwork, b: Float64Array, withMultigrid: boolean) {
  const grid = buildMultigrid(net);
  expect(refreshMultigrid(grid)).toBe(true);
  const { diagonal } = grid.levels[0]!;
  const x = new Float64Array(b.length);
  const record = conjugateGradients(
    {
      multiply: (v, y) => multiply(net, diagonal, v, y),
      precondition: withMultigrid
        ? (r, z) => applyMultigrid(grid, r, z)
        : (r, z) => z.set(r.map((value, n) => value / diagonal[n]!)),
    },
    b,
    x,
    { tolerance: 1e-10, maximumIterations: 5000, work: conjugateWork(b.length) },
  );
  return { x, record };
}

const load = (length: number, seed: number) => {
  const next = random(seed);
  return new Float64Array(length).map(() => next() - 0.5);
};

test.each([
  [7, 5, 3, 70717],
  [33, 18, 4, 917],
])('a network of %d × %d × %d – with and without multigrid – has one solution', (columns, rows, layers, seed) => {
  const net = network(columns, rows, layers, seed);
  const b = load(nodeCount(net), seed + 1);
  const [fast, plain] = [solveIteratively(net, b, true), solveIteratively(net, b, false)];
  expect([fast.record.status, plain.record.status]).toEqual(['converged', 'converged']);
  expect(fast.record.iterations).toBeLessThan(plain.record.iterations / 2);
  const most = Math.max(...fast.x.map(Math.abs));
  for (let n = 0; n < b.length; n++) expect(Math.abs(fast.x[n]! - plain.x[n]!) / most).toBeLessThan(1e-6);
});

test('a small network – by elimination – has the solution of the iteration', () => {
  const net = network(6, 4, 3, 31);
  const n = nodeCount(net);
  const diagonal = conductanceSums(net).map((sum, k) => sum + net.anchor[k]!);
  const dense = new Float64Array(n * n);
  for (let k = 0; k < n; k++) {
    const unit = new Float64Array(n);
    const column = new Float64Array(n);
    unit[k] = 1;
    multiply(net, diagonal, unit, column);
    dense.set(column, k * n);
  }
  const b = load(n, 5);
  const direct = b.slice();
  expect(factorDense(dense, n)).toBe(true);
  solveDense(dense, n, direct);
  const { x } = solveIteratively(net, b, true);
  const most = Math.max(...direct.map(Math.abs));
  for (let k = 0; k < n; k++) expect(Math.abs(x[k]! - direct[k]!) / most).toBeLessThan(1e-7);
});

test('a matrix that is not positive definite – is told, not solved', () => {
  expect(factorDense(Float64Array.from([1, 2, 2, 1]), 2)).toBe(false);
});
