import type { LinearSystem } from './conjugate-gradients.ts';

export function dot(a: Float64Array, b: Float64Array): number {
  let s = 0;
  for (let n = 0; n < a.length; n++) s += a[n]! * b[n]!;
  return s;
}

export const norm = (a: Float64Array) => Math.sqrt(dot(a, a));

/** r = b − A·x. */
export function residualOf(system: LinearSystem, b: Float64Array, x: Float64Array, r: Float64Array) {
  system.multiply(x, r);
  for (let n = 0; n < b.length; n++) r[n] = b[n]! - r[n]!;
}
