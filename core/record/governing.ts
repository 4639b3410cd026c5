import type { CheckResult, ConditionResult, LimitResult, RegulatorResult, Verdict } from '#core/result/result.ts';

const severity: readonly Verdict[] = ['within', 'close', 'not evaluated', 'over'];

/** The lowest junction limit of a regulator; null where there is none. */
export function junctionLimit({ limits }: RegulatorResult): LimitResult | null {
  return limits
    .filter(({ quantity, limit }) => quantity === 'junctionC' && limit !== null)
    .reduce<LimitResult | null>(
      (least, limit) => (!least || (limit.limit ?? 0) < (least.limit ?? 0) ? limit : least),
      null,
    );
}

/** The limit that makes a regulator's verdict: of those with that verdict the junction's lowest, else the first. */
function governingLimit(regulator: RegulatorResult): LimitResult | null {
  const limits = regulator.limits.filter(({ verdict }) => verdict === regulator.verdict);
  return junctionLimit({ ...regulator, limits }) ?? limits[0] ?? junctionLimit(regulator);
}

export type Governing = { condition: ConditionResult; regulator: RegulatorResult; limit: LimitResult | null };

/**
 * The condition that governs each regulator: the worst verdict first (an exceedance before what was not evaluated,
 * as neither is a pass), then the least junction margin.
 */
export function governingByRegulator(result: CheckResult): ReadonlyMap<string, Governing> {
  const governing = new Map<string, Governing>();
  for (const condition of result.conditions) {
    for (const regulator of condition.regulators) {
      const before = governing.get(regulator.ref);
      if (!before || governsBefore(regulator, before.regulator))
        governing.set(regulator.ref, { condition, regulator, limit: governingLimit(regulator) });
    }
  }
  return governing;
}

function governsBefore(one: RegulatorResult, other: RegulatorResult): boolean {
  const order = severity.indexOf(one.verdict) - severity.indexOf(other.verdict);
  if (order !== 0) return order > 0;
  return (junctionLimit(one)?.margin ?? -Infinity) < (junctionLimit(other)?.margin ?? -Infinity);
}

/** Conditions that govern at least one regulator, in the order of the result; all where there is no regulator. */
export function governingConditions(result: CheckResult): ConditionResult[] {
  const governing = new Set([...governingByRegulator(result).values()].map(({ condition }) => condition));
  return governing.size === 0 ? result.conditions : result.conditions.filter((condition) => governing.has(condition));
}
