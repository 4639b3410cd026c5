import type { FindingRule } from '../finding-context.ts';
import { isShorted } from '#core/electrical/output-currents.ts';
import { formatNumber } from '#core/format.ts';

/** The lowest input does not carry the highest output at this load: the part starves before it overheats. */
export const noHeadroom: FindingRule = ({ board, conditions }) =>
  conditions.flatMap(({ condition, points }) =>
    [...points.values()].flatMap((point) => {
      const short = point.headroomV !== null && point.headroomV < 0;
      const droops = point.regulating === false && !isShorted(condition, point) && (point.inputV ?? 0) > 0;
      if (!short && !droops) return [];
      const dropper = board.regulators.find((regulator) => regulator.ref === point.ref)?.dropper;
      return [
        {
          rule: 'no-headroom',
          severity: 'stop' as const,
          ref: point.ref,
          condition: condition.name,
          message: short
            ? `${point.ref} lacks ${formatNumber(-point.headroomV!, 2)} V of headroom at its lowest input and ${formatNumber(point.outputA ?? 0, 3)} A.`
            : `${point.ref} does not regulate at ${formatNumber(point.inputV ?? 0, 2)} V and ${formatNumber(point.outputA ?? 0, 3)} A; its output follows the input.`,
          remedy: dropper
            ? 'Lower the dropper, raise the feed or use a part with less dropout.'
            : 'Raise the feed or use a part with less dropout.',
        },
      ];
    }),
  );
