import type { FindingRule } from '../finding-context.ts';
import { formatNumber } from '#core/format.ts';

/** Input voltage or output current above what the maker allows at all. */
export const aboveRating: FindingRule = ({ board, conditions }) =>
  conditions.flatMap(({ condition, points }) =>
    board.regulators.flatMap((regulator) => {
      const part = board.parts[regulator.part];
      const point = points.get(regulator.ref);
      if (!part || !point) return [];
      const shorted = condition.fault?.kind === 'output-short' && condition.fault.ref === regulator.ref;
      const place = { severity: 'stop' as const, ref: regulator.ref, condition: condition.name };
      const found = [];
      if (point.inputV !== null && point.inputV > part.inputMaxV) {
        found.push({
          ...place,
          rule: 'input-above-maximum',
          message: `${regulator.ref} gets ${formatNumber(point.inputV, 2)} V; ${part.name} allows ${formatNumber(part.inputMaxV, 2)} V.`,
          remedy: 'Lower the feed or use a part for a higher input.',
        });
      }
      if (!shorted && point.outputA !== null && point.outputA > part.outputMaxA) {
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
