import type { IterationRecord, LinearSystem } from './conjugate-gradients.ts';
import { dot, norm, residualOf } from './vectors.ts';

/**
 * Stabilised bi-conjugate gradients for an unsymmetric system, from the `x` that is given (van der Vorst, SIAM J. Sci. Stat.
 * Comput. 13 (1992) 631; Templates, figure 2.10). The true residual is computed at the end; where it lags behind the
 * recursive one the iteration starts again from the answer.
 * @param options.tolerance asked of ‖b − A·x‖ ÷ ‖b‖
 * @param options.reduction where given, a residual reduced by this factor is enough
 */
export function bicgstab(
  system: LinearSystem,
  b: Float64Array,
  x: Float64Array,
  options: { tolerance: number; reduction?: number; maximumIterations: number },
): IterationRecord {
  const n = b.length;
  const vector = () => new Float64Array(n);
  const [r, shadow, p, v, y, t, z] = [vector(), vector(), vector(), vector(), vector(), vector(), vector()];
  let target = options.tolerance * norm(b);
  if (target === 0) {
    x.fill(0);
    return { status: 'converged', iterations: 0, residual: 0 };
  }
  let iterations = 0;
  for (let restart = 0; restart < 6 && iterations < options.maximumIterations; restart++) {
    residualOf(system, b, x, r);
    if (restart === 0) target = Math.max(target, (options.reduction ?? 0) * norm(r));
    if (norm(r) <= target) break;
    shadow.set(r);
    p.fill(0);
    v.fill(0);
    let [rho, alpha, omega] = [1, 1, 1];
    while (iterations < options.maximumIterations) {
      const next = dot(shadow, r);
      if (next === 0) break;
      const beta = (next / rho) * (alpha / omega);
      rho = next;
      for (let k = 0; k < n; k++) p[k] = r[k]! + beta * (p[k]! - omega * v[k]!);
      system.precondition(p, y);
      system.multiply(y, v);
      alpha = rho / dot(shadow, v);
      for (let k = 0; k < n; k++) r[k]! -= alpha * v[k]!;
      system.precondition(r, z);
      system.multiply(z, t);
      const square = dot(t, t);
      omega = square === 0 ? 0 : dot(t, r) / square;
      for (let k = 0; k < n; k++) {
        x[k]! += alpha * y[k]! + omega * z[k]!;
        r[k]! -= omega * t[k]!;
      }
      iterations++;
      const size = norm(r);
      if (!Number.isFinite(size)) return { status: 'breakdown', iterations, residual: NaN };
      if (size <= target || omega === 0) break;
    }
  }
  residualOf(system, b, x, r);
  const size = norm(r);
  return { status: size <= target * 1.5 ? 'converged' : 'not-converged', iterations, residual: size / norm(b) };
}
