import type { Verdict } from '#core/result/result.ts';

/**
 * Compares unrounded values; a value equal to its limit is inside. `close`: inside, but by no more than the uncertainty.
 * A missing value is never a pass.
 */
export function verdictOf(actual: number | null, limit: number, uncertainty: number): Verdict {
  if (actual === null || !Number.isFinite(actual)) return 'not evaluated';
  if (actual > limit) return 'over';
  return limit - actual > uncertainty || uncertainty === 0 ? 'within' : 'close';
}

const order: readonly Verdict[] = ['within', 'close', 'not evaluated', 'over'];

/** The worst of several verdicts; of none at all nothing is evaluated. */
export function worstVerdict(verdicts: readonly Verdict[]): Verdict {
  if (verdicts.length === 0) return 'not evaluated';
  return verdicts.reduce((worst, verdict) => (order.indexOf(verdict) > order.indexOf(worst) ? verdict : worst));
}
