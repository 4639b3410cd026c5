import type { ConditionResult } from '#core/result/result.ts';
import type { PartMark } from './place-plates.ts';

/** What stands beside each regulator: its junction temperature and its verdict in one condition. */
export function partMarks(condition: ConditionResult | null): ReadonlyMap<string, PartMark> {
  return new Map(
    (condition?.regulators ?? []).map((regulator) => [
      regulator.ref,
      { ref: regulator.ref, temperatureC: regulator.junctionC, verdict: regulator.verdict },
    ]),
  );
}
