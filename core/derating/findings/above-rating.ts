import type { Part } from '#core/board/part.ts';
import type { Regulator } from '#core/board/placement.ts';
import { atCurrent } from '#core/electrical/current-table.ts';
import type { OperatingPoint } from '#core/electrical/operating-point.ts';
import { isShorted } from '#core/electrical/output-currents.ts';
import { formatNumber } from '#core/format.ts';
import type { FindingRule } from '../finding-context.ts';

/** Input voltage or output current above what the maker allows at all. */
export const aboveRating: FindingRule = ({ board, conditions }) =>
  conditions.flatMap(({ condition, points }) =>
    board.regulators.flatMap((regulator) => {
      const part = board.parts[regulator.part];
      const point = points.get(regulator.ref);
      if (!part || !point) return [];
      const place = { severity: 'stop' as const, ref: regulator.ref, condition: condition.name };
      const found = [];
      const idleV = idleInputV(regulator, part, point);
      const allowed = `${part.name} allows ${formatNumber(part.inputMaxV, 2)} V`;
      if (point.inputV !== null && point.inputV > part.inputMaxV) {
        found.push({
          ...place,
          rule: 'input-above-maximum',
          message: `${regulator.ref} gets ${formatNumber(point.inputV, 2)} V; ${allowed}.`,
          remedy: 'Lower the feed or use a part for a higher input.',
        });
      } else if (idleV !== null && idleV > part.inputMaxV) {
        found.push({
          ...place,
          rule: 'input-above-maximum',
          message: `Without load the dropper of ${regulator.ref} drops next to nothing: the input rises to ${formatNumber(idleV, 2)} V; ${allowed}.`,
          remedy: 'Lower the feed, add a clamp or use a part for a higher input.',
        });
      }
      if (!isShorted(condition, regulator) && point.outputA !== null && point.outputA > part.outputMaxA) {
        found.push({
          ...place,
          rule: 'output-above-maximum',
          message: `${regulator.ref} carries ${formatNumber(point.outputA, 3)} A; ${part.name} allows ${formatNumber(part.outputMaxA, 3)} A.`,
          remedy: 'Lower the load or use a part for more current.',
        });
      }
      return found;
    }),
  );

/** Input without load: the resistor carries the ground current only, and a diode's drop at that current is not counted on. */
function idleInputV({ dropper }: Regulator, part: Part, { feedV }: OperatingPoint): number | null {
  if (feedV === null) return null;
  return feedV - (dropper?.resistanceOhm ?? 0) * atCurrent(part.groundA, 0);
}
