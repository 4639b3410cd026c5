import type { PlantedFault } from './planted-fault.ts';

const derating = ['test/core/derating'];
const check = ['test/core/check'];

/** Faults of limits, comparisons and of the result. */
export const verdictFaults: readonly PlantedFault[] = [
  {
    fault: 'a value equal to its limit is over',
    file: 'core/derating/verdict.ts',
    from: "if (actual > limit) return 'over';",
    to: "if (actual >= limit) return 'over';",
    tests: derating,
  },
  {
    fault: 'the uncertainty dropped from close',
    file: 'core/derating/verdict.ts',
    from: 'limit - actual > uncertainty || uncertainty === 0',
    to: 'limit - actual >= 0 || uncertainty === 0',
    tests: derating,
  },
  {
    fault: 'a missing value that passes',
    file: 'core/derating/verdict.ts',
    from: "if (actual === null || !Number.isFinite(actual)) return 'not evaluated';",
    to: "if (actual === null || !Number.isFinite(actual)) return 'within';",
    tests: derating,
  },
  {
    fault: 'the mildest of several verdicts',
    file: 'core/derating/verdict.ts',
    from: 'order.indexOf(verdict) > order.indexOf(worst)',
    to: 'order.indexOf(verdict) < order.indexOf(worst)',
    tests: derating,
  },
  {
    fault: 'the highest limit of a rule',
    file: 'core/derating/limits.ts',
    from: 'Math.min(...limits)',
    to: 'Math.max(...limits)',
    tests: derating,
  },
  {
    fault: 'derated upwards',
    file: 'core/derating/limits.ts',
    from: 'part.junctionMaxC - rule.belowMaxK',
    to: 'part.junctionMaxC + rule.belowMaxK',
    tests: derating,
  },
  {
    fault: 'the stress ratio of a rule ignored',
    file: 'core/derating/limits.ts',
    from: 'rated * (rule.ratio ?? 1)',
    to: 'rated',
    tests: derating,
  },
  {
    fault: 'the input judged by the output’s rating',
    file: 'core/derating/limits.ts',
    from: "rule.quantity === 'inputV' ? part.inputMaxV : part.outputMaxA",
    to: "rule.quantity === 'inputV' ? part.outputMaxA : part.outputMaxA",
    tests: derating,
  },
  {
    fault: 'the maker’s own maximum left out',
    file: 'core/derating/limits.ts',
    from: 'return [...rules, makersMaximum(part, stress, faulted)];',
    to: 'return rules.length > 0 ? rules : [makersMaximum(part, stress, faulted)];',
    tests: derating,
  },
  {
    fault: 'a margin with the sign reversed',
    file: 'core/derating/limits.ts',
    from: 'actual === null ? null : atMost - actual',
    to: 'actual === null ? null : actual - atMost',
    tests: derating,
  },
  {
    fault: 'the grid error left out of the uncertainty',
    file: 'core/check/regulator-result.ts',
    from: 'Math.hypot(heat.gridErrorK ?? 0, heat.modelErrorK)',
    to: 'heat.modelErrorK',
    tests: check,
  },
  {
    fault: 'θJA against the outside air, the box’s rise in it',
    file: 'core/check/regulator-result.ts',
    from: 'const localC = condition.ambientC + condition.boxRiseK;',
    to: 'const localC = condition.ambientC;',
    tests: check,
  },
  {
    fault: 'a hidden neighbour that gives a pass',
    file: 'core/check/regulator-result.ts',
    from: "const verdict = complete || limit.verdict === 'over' ? limit.verdict",
    to: "const verdict = complete || limit.verdict !== 'close' ? limit.verdict",
    tests: check,
  },
  {
    fault: 'a part of unknown heat that lets its neighbours pass',
    file: 'core/check/check-condition.ts',
    from: '[...points.values()].every((point) => point.missing.length === 0);',
    to: '[...points.values()].every((point) => point.missing.length < 9);',
    tests: check,
  },
  {
    fault: 'a source’s limit without the model’s error',
    file: 'core/check/check-condition.ts',
    from: 'Math.abs(rise) * modelErrorShare(condition, null)',
    to: '0 * Math.abs(rise) * modelErrorShare(condition, null)',
    tests: check,
  },
  {
    fault: 'the heat of sources left out',
    file: 'core/check/heat-input.ts',
    from: '[ref, power ?? 0]',
    to: '[ref, 0 * (power ?? 0)]',
    tests: check,
  },
  {
    fault: 'a shorted part’s heat not limited by its shutdown',
    file: 'core/check/solve-with-shutdown.ts',
    from: 'if (junction() > shutdownC) {',
    to: 'if (junction() > 2 * shutdownC) {',
    tests: check,
  },
];
