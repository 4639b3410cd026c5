import type { Board } from '#core/board/document.ts';
import type { Regulator } from '#core/board/placement.ts';
import { atCurrent } from '#core/electrical/current-table.ts';
import type { OperatingPoint } from '#core/electrical/operating-point.ts';
import { formatNumber } from '#core/format.ts';
import type { Finding } from '#core/result/result.ts';
import type { CheckedCondition, FindingRule } from '../finding-context.ts';

/** Heat below which a dropper is not worth a word, W. */
const littleW = 0.02;

/** Droppers whose heat is nowhere on the board, and series resistors that make the regulator hottest below its full load. */
export const dropperHeat: FindingRule = ({ board, conditions }) =>
  board.regulators
    .filter(({ dropper }) => dropper !== null)
    .flatMap((regulator) => [
      ...notPlaced(
        regulator,
        hottest(conditions, (point) => point.dropperW, regulator),
      ),
      ...hottestBelowLoad(
        board,
        regulator,
        hottest(conditions, (point) => point.dissipationW, regulator),
      ),
    ]);

type Corner = { condition: string; point: OperatingPoint } | null;

/** The condition in which some heat of a regulator is greatest. */
function hottest(
  conditions: readonly CheckedCondition[],
  heatOf: (point: OperatingPoint) => number | null,
  { ref }: Regulator,
): Corner {
  return conditions.reduce<Corner>((most, { condition, points }) => {
    const point = points.get(ref);
    if (!point || (most && (heatOf(point) ?? 0) <= (heatOf(most.point) ?? 0))) return most;
    return { condition: condition.name, point };
  }, null);
}

function notPlaced({ ref, dropper }: Regulator, corner: Corner): Finding[] {
  const heatW = corner?.point.dropperW ?? 0;
  if (!corner || dropper?.source !== undefined || heatW <= littleW) return [];
  return [
    {
      rule: 'dropper-not-placed',
      severity: 'note',
      ref,
      condition: corner.condition,
      message: `The dropper of ${ref} gives ${formatNumber(heatW, 2)} W that is nowhere on the board.`,
      remedy: 'Place a heat source for it and name it in the dropper, unless it stands off the board.',
    },
  ];
}

/** Through a series resistor (Vfeed − R·I − Vout)·I peaks at I = (Vfeed − Vout)/2R. */
function hottestBelowLoad(board: Board, { ref, part, dropper, powerW }: Regulator, corner: Corner): Finding[] {
  const model = board.parts[part];
  const resistance = dropper?.resistanceOhm ?? 0;
  if (!corner || !model || !dropper || resistance === 0 || powerW !== null) return [];
  const { feedV, outputV, outputA, regulating } = corner.point;
  if (feedV === null || outputV === null || outputA === null || !regulating) return [];
  const available = feedV - (dropper.dropV ?? 0) - resistance * atCurrent(model.groundA, outputA) - outputV;
  const peakA = available / (2 * resistance);
  if (outputA <= peakA) return [];
  return [
    {
      rule: 'hottest-below-load',
      severity: 'warn',
      ref,
      condition: corner.condition,
      message: `With its series resistor ${ref} is hottest at ${formatNumber(peakA, 3)} A, below its load of ${formatNumber(outputA, 3)} A.`,
      remedy: 'Add a condition at that load, or say why it cannot occur.',
    },
  ];
}
