import type { ConditionResult } from '#core/result/result.ts';
import { formatNumber, formatQuantity } from '#core/format.ts';
import { governingLimit, governingOf } from '../governing.ts';
import type { RecordBlock, RecordSection } from '../record-document.ts';
import type { RecordInput } from '../record-input.ts';

export function resultsSection({ result }: RecordInput): RecordSection {
  const blocks = result.conditions.flatMap((condition): RecordBlock[] => [
    { kind: 'heading', text: condition.name },
    ...(condition.status === 'converged'
      ? []
      : [{ kind: 'notice' as const, text: `No converged solution: ${condition.message ?? condition.status}` }]),
    {
      kind: 'table',
      columns: [
        { title: 'Ref', weight: 0.8 },
        { title: 'Vin V', weight: 0.9, align: 'right' },
        { title: 'Vout V', weight: 0.9, align: 'right' },
        { title: 'Iout A', weight: 0.9, align: 'right' },
        { title: 'Iground A', weight: 1.15, align: 'right' },
        { title: 'Headroom V', weight: 1.35, align: 'right' },
        { title: 'Heat W', weight: 0.9, align: 'right' },
        { title: 'θJA K/W', weight: 0.9, align: 'right' },
        { title: 'Junction °C', weight: 1.3, align: 'right' },
        { title: '± K', weight: 0.7, align: 'right' },
        { title: 'Limit °C', weight: 0.9, align: 'right' },
        { title: 'Margin K', weight: 1, align: 'right' },
        { title: 'Verdict', weight: 1.7 },
      ],
      rows: condition.regulators.map((regulator) => {
        const limit = governingLimit(regulator);
        const governs = governingOf(result, regulator.ref)?.condition === condition;
        return [
          governs ? `${regulator.ref} *` : regulator.ref,
          formatNumber(regulator.inputV, 2),
          formatNumber(regulator.outputV, 2),
          formatNumber(regulator.outputA, 3),
          formatNumber(regulator.groundA, 4),
          formatNumber(regulator.headroomV, 2),
          formatNumber(regulator.dissipationW, 3),
          formatNumber(regulator.thetaJaKPerW, 1),
          formatNumber(regulator.junctionC, 1),
          formatNumber(regulator.uncertaintyK, 1),
          formatNumber(limit?.limit ?? null, 1),
          formatNumber(limit?.margin ?? null, 1),
          { verdict: regulator.verdict },
        ];
      }),
      empty: 'The board has no regulator.',
    },
    ...stressTable(condition),
    ...remarks(condition),
  ]);
  return {
    id: 'results',
    title: 'Results by condition',
    blocks: [
      {
        kind: 'text',
        text: 'An asterisk marks the governing condition of a regulator. θJA is the one of this board, its neighbours’ heat included; it holds for no other.',
      },
      ...blocks,
    ],
  };
}

/** Limits other than the junction's: voltage and current as stress ratios. */
function stressTable({ regulators }: ConditionResult): RecordBlock[] {
  const rows = regulators.flatMap(({ ref, limits }) =>
    limits
      .filter((limit) => limit.quantity !== 'junctionC')
      .map((limit) => {
        const unit = limit.quantity === 'inputV' ? 'V' : 'A';
        return [
          ref,
          limit.quantity === 'inputV' ? 'Input voltage' : 'Output current',
          formatQuantity(limit.actual, unit),
          formatQuantity(limit.limit, unit),
          formatNumber(limit.ratio, 2),
          formatQuantity(limit.margin, unit),
          { verdict: limit.verdict },
          limit.source,
        ];
      }),
  );
  if (rows.length === 0) return [];
  return [
    {
      kind: 'table',
      columns: [
        { title: 'Ref', weight: 0.7 },
        { title: 'Stress', weight: 1.4 },
        { title: 'Actual', weight: 1, align: 'right' },
        { title: 'Derated limit', weight: 1.1, align: 'right' },
        { title: 'Stress ratio', weight: 1, align: 'right' },
        { title: 'Margin', weight: 1, align: 'right' },
        { title: 'Verdict', weight: 1.5 },
        { title: 'Source', weight: 3 },
      ],
      rows,
      empty: '',
    },
  ];
}

function remarks({ regulators, board, energy, solver }: ConditionResult): RecordBlock[] {
  const states = regulators.flatMap((regulator) => [
    ...(regulator.shutsDown ? [`${regulator.ref} reaches its thermal shutdown.`] : []),
    ...(regulator.regulating === false ? [`${regulator.ref} does not hold its output.`] : []),
  ]);
  const facts =
    board && energy && solver
      ? [
          `Board up to ${formatQuantity(board.maxC, '°C')} at ${formatNumber(board.maxAt[0], 1)}, ${formatNumber(board.maxAt[1], 1)} mm, mean ${formatQuantity(board.meanC, '°C')}.`,
          `Heat in ${formatNumber(energy.inW, 3)} W, out ${formatNumber(energy.outW, 3)} W. ${solver.cells} unknowns of ${formatNumber(solver.cellMm, 2)} mm, residual ${solver.residual.toExponential(1)}, grid error at most ${formatQuantity(solver.gridErrorK, 'K')}.`,
        ]
      : [];
  const text = [...states, ...facts].join(' ');
  return text ? [{ kind: 'text', text }] : [];
}
