import { expect, test } from 'vitest';
import { networkSolver } from '#core/numerics/kernel/network-solver.ts';
import { buildLinks, multiply, type LayeredNetwork } from '#core/numerics/layered-network.ts';
import { applyMultigrid, buildMultigrid, refreshMultigrid } from '#core/numerics/multigrid.ts';
import { randomNumbers } from '#test/bench/random-numbers.ts';

/*
 * The compiled kernel against the plain path in double precision (`multigrid.ts`), which has the same parts. Its preconditioner
 * works in single precision (6e-8 of each number), hence 3e-6 there; matrix and iteration are double.
 */
type Shape = [columns: number, rows: number, layers: number, extras: number];

function randomNetwork([columns, rows, layers, extras]: Shape, seed: number) {
  const random = randomNumbers(seed);
  const cells = columns * rows * layers;
  const [gx, gy, gz] = [new Float64Array(cells), new Float64Array(cells), new Float64Array(cells)];
  for (let n = 0; n < cells; n++) {
    const i = Math.floor(n / layers) % columns;
    const j = Math.floor(n / layers / columns);
    // Conductances over four decades, some of them none at all.
    const some = () => (random() < 0.1 ? 0 : 10 ** (4 * random() - 3));
    if (i + 1 < columns) gx[n] = some();
    if (j + 1 < rows) gy[n] = some();
    if ((n % layers) + 1 < layers) gz[n] = some();
  }
  const cell = () => Math.floor(random() * cells);
  const pairs = Array.from({ length: extras * 5 }, (_, k) => ({ a: cells + (k % extras), b: cell(), g: random() }));
  for (let via = 0; via < columns; via++) {
    const base = Math.floor(random() * columns * rows) * layers;
    pairs.push({ a: base, b: base + layers - 1, g: 10 * random() });
  }
  const network: LayeredNetwork = {
    columns,
    rows,
    layers,
    extras,
    gx,
    gy,
    gz,
    links: buildLinks(cells + extras, pairs),
    anchor: Float64Array.from({ length: cells + extras }, () => 0.01 * random()),
  };
  return { network, b: Float64Array.from({ length: cells + extras }, () => random() - 0.3) };
}

const shapes: Shape[] = [
  [1, 1, 1, 1],
  [7, 1, 3, 0],
  [1, 9, 2, 1],
  [8, 6, 4, 0],
  [9, 7, 3, 2],
  [16, 16, 1, 3],
  [33, 21, 5, 4],
];

const largest = (a: Float64Array, b?: Float64Array) =>
  a.reduce((most, value, n) => Math.max(most, Math.abs(value - (b?.[n] ?? 0))), 0);

test.each(shapes)('%d × %d cells, %d layers, %d extra nodes – product – that of the plain path', (...shape) => {
  const { network, b } = randomNetwork(shape, 41_117);
  const plain = buildMultigrid(network);
  expect(refreshMultigrid(plain)).toBe(true);
  const solver = networkSolver(network);
  expect(solver.refresh()).toBe(true);
  const [y, z] = [new Float64Array(b.length), new Float64Array(b.length)];
  solver.multiply(b, y);
  multiply(network, plain.levels[0]!.diagonal, b, z);
  expect(largest(y, z)).toBeLessThanOrEqual(1e-13 * largest(z));
});

test.each(shapes)('%d × %d cells, %d layers, %d extra nodes – one cycle – that of the plain path', (...shape) => {
  const { network, b } = randomNetwork(shape, 90_533);
  // Strong anchors, so that the rounding of a diagonal is not magnified by a weak path to the reference.
  network.anchor.fill(1);
  const plain = buildMultigrid(network);
  refreshMultigrid(plain);
  const solver = networkSolver(network);
  solver.refresh();
  const [y, z] = [new Float64Array(b.length), new Float64Array(b.length)];
  solver.precondition(b, y);
  applyMultigrid(plain, b, z);
  expect(largest(y, z)).toBeLessThanOrEqual(3e-6 * largest(z));
});

test.each(shapes)('%d × %d cells, %d layers, %d extra nodes – solution – fulfils the equations', (...shape) => {
  const { network, b } = randomNetwork(shape, 77_291);
  const solver = networkSolver(network);
  solver.refresh();
  const x = new Float64Array(b.length);
  const record = solver.solve(b, x, { tolerance: 1e-10, maximumIterations: 200 });
  expect(record.status).toBe('converged');
  const plain = buildMultigrid(network);
  refreshMultigrid(plain);
  const left = new Float64Array(b.length);
  multiply(network, plain.levels[0]!.diagonal, x, left);
  expect(Math.hypot(...left.map((value, n) => value - b[n]!))).toBeLessThanOrEqual(2e-10 * Math.hypot(...b));
});

test('memory given back and taken by another network – its solution – knows nothing of the first', () => {
  const first = randomNetwork([20, 14, 3, 2], 1301);
  const second = randomNetwork([17, 11, 2, 1], 1303);
  const solve = ({ network, b }: typeof first) => {
    const solver = networkSolver(network);
    solver.refresh();
    const x = new Float64Array(b.length);
    solver.solve(b, x, { tolerance: 1e-10, maximumIterations: 200 });
    return { x, solver };
  };
  const fresh = solve(second);
  solve(first).solver.release();
  expect([...solve(second).x]).toEqual([...fresh.x]);
});

test('anchors of nothing – refresh – no positive definite matrix, or no solution', () => {
  const { network, b } = randomNetwork([9, 7, 3, 0], 60_013);
  network.anchor.fill(NaN);
  const solver = networkSolver(network);
  const sound = solver.refresh();
  const record = sound ? solver.solve(b, new Float64Array(b.length), { tolerance: 1e-8, maximumIterations: 50 }) : null;
  expect(record?.status).not.toBe('converged');
});
