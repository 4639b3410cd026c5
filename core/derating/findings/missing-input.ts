import type { FindingRule } from '../finding-context.ts';

/** An operating point that cannot be computed; its verdict stays "not evaluated". */
export const missingInput: FindingRule = ({ conditions }) =>
  conditions.flatMap(({ condition, points }) =>
    [...points.values()]
      .filter((point) => point.missing.length > 0)
      .map((point) => ({
        rule: 'missing-input',
        severity: 'stop' as const,
        ref: point.ref,
        condition: condition.name,
        message: `${point.ref} is not evaluated: ${point.missing.join(' and ')} is missing.`,
        remedy: 'Enter it under Conditions, or state a known dissipation.',
      })),
  );
