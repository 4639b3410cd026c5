import type { IterationRecord } from '../conjugate-gradients.ts';
import type { Kernel } from './kernel.ts';
import type { MemoryLayout } from './lay-out.ts';

export type IterationLimits = { tolerance: number; reduction?: number; maximumIterations: number };

/**
 * Conjugate gradients on the vectors in the kernel's memory: steps as in Templates for the Solution of Linear Systems (Barrett et
 * al. 1994), figure 2.5, restarted from the answer where the true residual lags behind the recursive one.
 */
export function iterate(
  kernel: Kernel,
  { b, x, r, p, q }: Pick<MemoryLayout, 'b' | 'x' | 'r' | 'p' | 'q'>,
  limits: IterationLimits,
): IterationRecord {
  const size = Math.sqrt(kernel.dot(b, b));
  let left = Math.sqrt(kernel.residual(b, x, r));
  if (size === 0) {
    // Without heat the answer is known, and a residual relative to nothing could never be met.
    kernel.step(x, r, x, x, -1);
    return { status: 'converged', iterations: 0, residual: 0 };
  }
  const target = Math.max(limits.tolerance * size, (limits.reduction ?? 0) * left);
  let iterations = 0;
  for (let restart = 0; restart < 4 && left > target && iterations < limits.maximumIterations; restart++) {
    let rho = 0;
    while (iterations < limits.maximumIterations) {
      kernel.precondition(r);
      const next = kernel.answerDot(r);
      kernel.turn(p, rho === 0 ? 0 : next / rho);
      rho = next;
      kernel.multiply(p, q);
      const curvature = kernel.dot(p, q);
      if (!(curvature > 0) || !(rho > 0)) {
        return { status: 'breakdown', iterations, residual: Math.sqrt(kernel.residual(b, x, r)) / size };
      }
      iterations++;
      if (Math.sqrt(kernel.step(x, r, p, q, rho / curvature)) <= target) break;
    }
    left = Math.sqrt(kernel.residual(b, x, r));
  }
  // The recursive residual may undercut the true one by rounding only.
  return { status: left <= target * 1.5 ? 'converged' : 'not-converged', iterations, residual: left / size };
}
