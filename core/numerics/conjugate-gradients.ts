import { dot, norm, residualOf } from './vectors.ts';

/** Why an iteration ended, and how well its answer fulfils the equations. */
export type IterationRecord = {
  status: 'converged' | 'not-converged' | 'breakdown';
  iterations: number;
  /** ‖b − A·x‖ ÷ ‖b‖, computed anew from the answer. */
  residual: number;
};

export type LinearSystem = {
  multiply: (x: Float64Array, y: Float64Array) => void;
  precondition: (r: Float64Array, z: Float64Array) => void;
};

/**
 * Preconditioned conjugate gradients for a symmetric positive definite system, from the `x` that is given.
 * Steps as in Templates for the Solution of Linear Systems (Barrett et al. 1994), figure 2.5. The true residual is
 * computed at the end; when it lags behind the recursive one the iteration is restarted from the answer.
 * @param options.tolerance asked of ‖b − A·x‖ ÷ ‖b‖
 * @param options.reduction where given, a residual reduced by this factor is enough
 * @param options.work four vectors of the length of b, so that a solve allocates nothing
 */
export function conjugateGradients(
  system: LinearSystem,
  b: Float64Array,
  x: Float64Array,
  options: { tolerance: number; reduction?: number; maximumIterations: number; work: ConjugateWork },
): IterationRecord {
  const { r, z, p, q } = options.work;
  let target = options.tolerance * norm(b);
  if (target === 0) {
    // Without heat the answer is known, and a residual relative to nothing could never be met.
    x.fill(0);
    return { status: 'converged', iterations: 0, residual: 0 };
  }
  let iterations = 0;
  for (let restart = 0; restart < 4; restart++) {
    residualOf(system, b, x, r);
    if (restart === 0) target = Math.max(target, (options.reduction ?? 0) * norm(r));
    if (norm(r) <= target) break;
    let rho = 0;
    for (let step = 0; iterations < options.maximumIterations; step++) {
      system.precondition(r, z);
      const next = dot(r, z);
      if (step === 0) p.set(z);
      else {
        const beta = next / rho;
        for (let n = 0; n < p.length; n++) p[n] = z[n]! + beta * p[n]!;
      }
      rho = next;
      system.multiply(p, q);
      const curvature = dot(p, q);
      if (!(curvature > 0) || !(rho > 0)) {
        residualOf(system, b, x, r);
        return { status: 'breakdown', iterations, residual: norm(r) / norm(b) };
      }
      const alpha = rho / curvature;
      let square = 0;
      for (let n = 0; n < x.length; n++) {
        x[n]! += alpha * p[n]!;
        const left = r[n]! - alpha * q[n]!;
        r[n] = left;
        square += left * left;
      }
      iterations++;
      if (Math.sqrt(square) <= target) break;
    }
    if (iterations >= options.maximumIterations) break;
  }
  residualOf(system, b, x, r);
  const size = norm(r);
  // The recursive residual may undercut the true one by rounding only.
  return { status: size <= target * 1.5 ? 'converged' : 'not-converged', iterations, residual: size / norm(b) };
}

export type ConjugateWork = { r: Float64Array; z: Float64Array; p: Float64Array; q: Float64Array };

export function conjugateWork(length: number): ConjugateWork {
  const vector = () => new Float64Array(length);
  return { r: vector(), z: vector(), p: vector(), q: vector() };
}
