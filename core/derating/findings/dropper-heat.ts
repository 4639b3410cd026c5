import type { Finding } from '#core/result/result.ts';
import { atCurrent } from '#core/electrical/current-table.ts';
import { formatNumber } from '#core/format.ts';
import type { FindingRule } from '../finding-context.ts';

/** Heat below which a dropper is not worth a word, W. */
const littleW = 0.02;

/**
 * Droppers whose heat is nowhere on the board, and series resistors that make the regulator hottest below its full load:
 * (Vfeed − R·I − Vout)·I peaks at I = (Vfeed − Vout)/2R.
 */
export const dropperHeat: FindingRule = ({ board, conditions }) =>
  conditions.flatMap(({ condition, points }) =>
    board.regulators.flatMap((regulator): Finding[] => {
      const { ref, dropper, powerW } = regulator;
      const point = points.get(ref);
      const part = board.parts[regulator.part];
      if (!dropper || !point || !part) return [];
      const found: Finding[] = [];
      if (dropper.source === undefined && (point.dropperW ?? 0) > littleW) {
        found.push({
          rule: 'dropper-not-placed',
          severity: 'note',
          ref,
          condition: condition.name,
          message: `The dropper of ${ref} gives ${formatNumber(point.dropperW, 2)} W that is nowhere on the board.`,
          remedy: 'Place a heat source for it and name it in the dropper, unless it stands off the board.',
        });
      }
      const { feedV, outputV, outputA } = point;
      const resistance = dropper.resistanceOhm ?? 0;
      if (
        resistance > 0 &&
        powerW === null &&
        feedV !== null &&
        outputV !== null &&
        outputA !== null &&
        point.regulating
      ) {
        const available = feedV - (dropper.dropV ?? 0) - resistance * atCurrent(part.groundA, outputA) - outputV;
        const peakA = available / (2 * resistance);
        if (outputA > peakA) {
          found.push({
            rule: 'hottest-below-load',
            severity: 'warn',
            ref,
            condition: condition.name,
            message: `With its series resistor ${ref} is hottest at ${formatNumber(peakA, 3)} A, below its load of ${formatNumber(outputA, 3)} A.`,
            remedy: 'Add a condition at that load, or say why it cannot occur.',
          });
        }
      }
      return found;
    }),
  );
