import type { Finding } from '#core/result/result.ts';
import type { ThermalNotice } from '#core/thermal/solution.ts';
import type { FindingRule } from '../finding-context.ts';

/** What the thermal solution says about its range of validity; what it says in every condition alike is said once. */
export const thermalNotice: FindingRule = ({ conditions }) => {
  const told = (notice: ThermalNotice) =>
    conditions.filter(({ notices }) => notices.some((other) => isSame(notice, other))).length;
  return conditions.flatMap(({ condition, notices }, index) =>
    notices.flatMap((notice): Finding[] => {
      const isGeneral = conditions.length > 1 && told(notice) === conditions.length;
      return isGeneral && index > 0 ? [] : [findingOf(notice, isGeneral ? null : condition.name)];
    }),
  );
};

const isSame = (one: ThermalNotice, other: ThermalNotice) =>
  one.code === other.code && one.ref === other.ref && one.message === other.message;

function findingOf({ code, ref, message }: ThermalNotice, condition: string | null): Finding {
  const isOff = code.endsWith('off-board');
  return {
    rule: code,
    severity: isOff ? 'stop' : 'note',
    ref,
    condition,
    message,
    remedy: isOff
      ? 'Place it on the board.'
      : `Treat the numbers ${condition === null ? 'of every condition' : 'of this condition'} with care.`,
  };
}
