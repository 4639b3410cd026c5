import { expect, test } from 'vitest';
import { bicgstab } from '#core/numerics/bicgstab.ts';

/** Upwind transport with diffusion on a line: unsymmetric, diagonally dominant. */
const n = 60;
const system = {
  multiply: (x: Float64Array, y: Float64Array) => {
    for (let k = 0; k < n; k++) y[k] = 3.1 * x[k]! - 2 * (x[k - 1] ?? 0) - (x[k + 1] ?? 0);
  },
  precondition: (r: Float64Array, z: Float64Array) => z.set(r.map((value) => value / 3.1)),
};
const known = Float64Array.from({ length: n }, (_, k) => Math.sin(0.37 * k) + 0.2);

test('an unsymmetric system – made from a known answer – gives it back, with its true residual', () => {
  const b = new Float64Array(n);
  system.multiply(known, b);
  const x = new Float64Array(n);
  const record = bicgstab(system, b, x, { tolerance: 1e-11, maximumIterations: 200 });
  expect(record.status).toBe('converged');
  for (let k = 0; k < n; k++) expect(x[k]).toBeCloseTo(known[k]!, 8);
  const left = new Float64Array(n);
  system.multiply(x, left);
  const size = (v: Float64Array) => Math.sqrt(v.reduce((sum, value) => sum + value * value, 0));
  expect(record.residual).toBeCloseTo(size(left.map((value, k) => b[k]! - value)) / size(b), 15);
});

test('no right side – nothing – is the answer at once', () => {
  const x = Float64Array.from(known);
  expect(bicgstab(system, new Float64Array(n), x, { tolerance: 1e-9, maximumIterations: 9 })).toEqual({
    status: 'converged',
    iterations: 0,
    residual: 0,
  });
  expect(x.every((value) => value === 0)).toBe(true);
});

test('too few iterations – the record – does not claim an answer', () => {
  const b = new Float64Array(n).fill(1);
  const record = bicgstab(system, b, new Float64Array(n), { tolerance: 1e-12, maximumIterations: 2 });
  expect(record.status).toBe('not-converged');
  expect(record.iterations).toBe(2);
});
