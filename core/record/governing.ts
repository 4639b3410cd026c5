import type { CheckResult, ConditionResult, LimitResult, RegulatorResult } from '#core/result/result.ts';

/** The junction limit of a regulator that leaves the least margin; null where there is none. */
export function governingLimit(regulator: RegulatorResult): LimitResult | null {
  const junction = regulator.limits.filter((limit) => limit.quantity === 'junctionC' && limit.limit !== null);
  return junction.reduce<LimitResult | null>(
    (least, limit) => (!least || limit.limit! < least.limit! ? limit : least),
    null,
  );
}

export type Governing = { condition: ConditionResult; regulator: RegulatorResult; limit: LimitResult | null };

/**
 * The condition that governs each regulator: the least junction margin; one that was not evaluated goes first, as a
 * missing input is never a pass.
 */
export function governingOf(result: CheckResult, ref: string): Governing | null {
  const seen = result.conditions.flatMap((condition): Governing[] => {
    const regulator = condition.regulators.find((candidate) => candidate.ref === ref);
    return regulator ? [{ condition, regulator, limit: governingLimit(regulator) }] : [];
  });
  const margin = (one: Governing) => one.limit?.margin ?? -Infinity;
  return seen.reduce<Governing | null>((least, one) => (!least || margin(one) < margin(least) ? one : least), null);
}

/** Conditions that govern at least one regulator, in the order of the result. */
export function governingConditions(result: CheckResult, refs: readonly string[]): ConditionResult[] {
  const governing = new Set(refs.map((ref) => governingOf(result, ref)?.condition.name));
  return result.conditions.filter((condition) => governing.has(condition.name));
}
