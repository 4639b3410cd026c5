import { multiply, type LayeredNetwork } from '#core/numerics/layered-network.ts';

/**
 * The yardstick of the benchmark: conjugate gradients with the diagonal alone as preconditioner (Barrett et al.,
 * Templates, 1994, figure 2.5), from zero, until ‖b − A·x‖ ÷ ‖b‖ is below `tolerance`. As plain as can be on purpose.
 */
export function jacobiConjugateGradients(
  network: LayeredNetwork,
  diagonal: Float64Array,
  b: Float64Array,
  tolerance: number,
): { x: Float64Array; iterations: number } {
  const n = b.length;
  const x = new Float64Array(n);
  const r = b.slice();
  const p = new Float64Array(n);
  const q = new Float64Array(n);
  const target = tolerance * Math.sqrt(dot(b, b));
  let rho = 0;
  let iterations = 0;
  while (Math.sqrt(dot(r, r)) > target && iterations < 100_000) {
    let next = 0;
    for (let k = 0; k < n; k++) next += (r[k]! * r[k]!) / diagonal[k]!;
    const beta = iterations === 0 ? 0 : next / rho;
    for (let k = 0; k < n; k++) p[k] = r[k]! / diagonal[k]! + beta * p[k]!;
    multiply(network, diagonal, p, q);
    const alpha = next / dot(p, q);
    for (let k = 0; k < n; k++) {
      x[k]! += alpha * p[k]!;
      r[k]! -= alpha * q[k]!;
    }
    rho = next;
    iterations++;
  }
  return { x, iterations };
}

function dot(a: Float64Array, b: Float64Array): number {
  let sum = 0;
  for (let k = 0; k < a.length; k++) sum += a[k]! * b[k]!;
  return sum;
}
