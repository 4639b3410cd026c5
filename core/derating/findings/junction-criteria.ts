import type { FindingRule } from '../finding-context.ts';
import { formatNumber } from '#core/format.ts';

/** Least distance of a junction limit from the shutdown threshold, K (common practice: hysteresis and spread of the threshold). */
const shutdownDistanceK = 25;

/** No rule for the junction, or a rule that leans on the thermal shutdown, which protects and does not permit. */
export const junctionCriteria: FindingRule = ({ board }) => {
  if (board.regulators.length === 0) return [];
  const rules = board.criteria.rules.filter((rule) => rule.quantity === 'junctionC');
  if (rules.length === 0) {
    return [
      {
        rule: 'no-junction-criteria',
        severity: 'stop',
        ref: null,
        condition: null,
        message: "The criteria hold no rule for the junction; the maker's absolute maximum is no operating limit.",
        remedy: 'Choose a derating rule under Conditions.',
      },
    ];
  }
  return board.regulators.flatMap((regulator) => {
    const part = board.parts[regulator.part];
    if (!part || part.shutdownC === null) return [];
    const limits = rules.map((rule) =>
      Math.min(
        part.junctionMaxC - (rule.belowMaxK ?? 0),
        rule.atMostC ?? Infinity,
        rule.ratio === undefined ? Infinity : part.junctionMaxC * rule.ratio,
      ),
    );
    const limit = Math.min(...limits);
    if (limit < part.shutdownC - shutdownDistanceK) return [];
    return [
      {
        rule: 'shutdown-as-limit',
        severity: 'stop' as const,
        ref: regulator.ref,
        condition: null,
        message: `The junction limit of ${regulator.ref}, ${formatNumber(limit, 0)} °C, lies less than ${shutdownDistanceK} K below its thermal shutdown at ${formatNumber(part.shutdownC, 0)} °C.`,
        remedy: 'Lower the limit; a shutdown protects the die and is no operating limit.',
      },
    ];
  });
};
