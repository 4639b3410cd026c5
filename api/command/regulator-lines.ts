import { formatNumber, formatQuantity } from '#core/format.ts';
import type { ConditionResult, LimitResult, RegulatorResult } from '#core/result/result.ts';
import { textTable } from './text-table.ts';

const number = formatNumber;

/** Regulators of one condition: figures, limits that are not plainly kept, and each junction's rise by its causes. */
export function regulatorLines({ regulators }: ConditionResult): string[] {
  if (regulators.length === 0) return [];
  const ladders = regulators.flatMap((regulator) =>
    regulator.ladderK ? [ladderRow(regulator, regulator.ladderK)] : [],
  );
  return [
    ...textTable(regulatorHead, regulators.map(regulatorRow)),
    ...regulators.flatMap(limitLines),
    ...(ladders.length > 0 ? textTable(ladderHead, ladders) : []),
  ];
}

const regulatorHead = [
  'regulator',
  'heat W',
  'junction °C',
  '± K',
  'limit °C',
  'margin K',
  'case °C',
  'land °C',
  'θJA K/W',
  'Vin V',
  'Iout A',
  'headroom V',
  'verdict',
];

function regulatorRow(regulator: RegulatorResult): string[] {
  const junction = regulator.limits
    .filter((limit) => limit.quantity === 'junctionC' && limit.limit !== null)
    .reduce<number | null>((least, limit) => (least === null ? limit.limit : Math.min(least, limit.limit!)), null);
  const margin = junction === null || regulator.junctionC === null ? null : junction - regulator.junctionC;
  return [
    regulator.ref,
    number(regulator.dissipationW, 3),
    number(regulator.junctionC, 1),
    number(regulator.uncertaintyK, 1),
    number(junction, 1),
    number(margin, 1),
    number(regulator.caseTopC, 1),
    number(regulator.landC, 1),
    number(regulator.thetaJaKPerW, 1),
    number(regulator.inputV, 2),
    number(regulator.outputA, 3),
    number(regulator.headroomV, 2),
    regulator.verdict +
      (regulator.shutsDown ? ', shuts down' : regulator.regulating === false ? ', out of regulation' : ''),
  ];
}

const quantities: Record<LimitResult['quantity'], { word: string; unit: string; marginUnit: string }> = {
  junctionC: { word: 'junction', unit: '°C', marginUnit: 'K' },
  inputV: { word: 'input', unit: 'V', marginUnit: 'V' },
  outputA: { word: 'output', unit: 'A', marginUnit: 'A' },
};

/** Every limit that is passed or nearly so, with its source: the junction is not the only one that decides. */
function limitLines({ ref, limits }: RegulatorResult): string[] {
  return limits
    .filter(({ verdict }) => verdict === 'over' || verdict === 'close')
    .map(({ quantity, actual, limit, margin, verdict, source }) => {
      const { word, unit, marginUnit } = quantities[quantity];
      return (
        `  ${ref} ${verdict}: ${word} ${formatQuantity(actual, unit)}, limit ${formatQuantity(limit, unit)}, ` +
        `margin ${formatQuantity(margin, marginUnit)} (${source})`
      );
    });
}

const ladderHead = ['rise in K', 'box', 'air', 'neighbours', 'board', 'package', 'junction °C'];

function ladderRow({ ref, junctionC }: RegulatorResult, ladder: NonNullable<RegulatorResult['ladderK']>): string[] {
  return [
    ref,
    ...[ladder.box, ladder.air, ladder.neighbours, ladder.board, ladder.package].map((rise) => number(rise, 1)),
    number(junctionC, 1),
  ];
}
