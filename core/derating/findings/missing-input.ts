import type { FindingRule } from '../finding-context.ts';

/** An operating point that cannot be computed, or a source without a power; the verdict stays "not evaluated". */
export const missingInput: FindingRule = ({ board, conditions }) =>
  conditions.flatMap(({ condition, points, result }) => {
    const place = { rule: 'missing-input', severity: 'stop' as const, condition: condition.name };
    // A source that waits for a dropper's operating point is named there.
    const isUnstated = (source: string) =>
      result.sources.some(({ ref, powerW }) => ref === source && powerW === null) &&
      !board.regulators.some(({ dropper }) => dropper?.source === source);
    return [
      ...[...points.values()]
        .filter((point) => point.missing.length > 0)
        .map(({ ref, missing }) => ({
          ...place,
          ref,
          message: `${ref} is not evaluated: ${missing.join(' and ')} ${missing.length > 1 ? 'are' : 'is'} missing.`,
          remedy: 'Enter it under Conditions, or state a known dissipation.',
        })),
      ...board.sources
        .filter(({ ref }) => isUnstated(ref))
        .map(({ ref }) => ({
          ...place,
          ref,
          message: `Nothing says how much heat ${ref} gives, so no part near it can be judged.`,
          remedy: 'Enter its power, in the source or under Conditions, or name it as the source of a dropper.',
        })),
    ];
  });
