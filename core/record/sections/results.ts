import type { Board } from '#core/board/document.ts';
import { formatNumber, formatQuantity } from '#core/format.ts';
import type { CheckResult, ConditionResult } from '#core/result/result.ts';
import { governingByRegulator, junctionLimit } from '../governing.ts';
import { limitSigns, limitValue, marginText, quantityWords, ratioText } from '../limit-words.ts';
import type { RecordBlock, RecordSection } from '../record-document.ts';
import type { RecordInput } from '../record-input.ts';

/** Operating points, temperatures and every limit, condition by condition. */
export function resultsSection({ board, result }: RecordInput): RecordSection {
  return {
    id: 'results',
    title: 'Results by condition',
    blocks: [
      {
        kind: 'text',
        text: 'An asterisk marks the condition that governs a regulator. A dash stands for a value that could not be evaluated or does not apply. θJA is the rise over the local air per own watt on this board, neighbours’ heat included: it holds for no other board. Margins are limit less actual, in the unit shown.',
      },
      ...result.conditions.flatMap((condition) => conditionBlocks(board, result, condition)),
    ],
  };
}

function conditionBlocks(board: Board, result: CheckResult, condition: ConditionResult): RecordBlock[] {
  return [
    { kind: 'heading', text: condition.name },
    ...(condition.status === 'converged'
      ? []
      : [{ kind: 'notice' as const, text: `No converged solution: ${condition.message ?? condition.status}` }]),
    temperatures(result, condition),
    operatingPoints(condition),
    limits(board, condition),
    ...solution(condition),
  ];
}

function temperatures(result: CheckResult, condition: ConditionResult): RecordBlock {
  const governing = governingByRegulator(result);
  return {
    kind: 'table',
    columns: [
      { title: 'Ref', weight: 0.9 },
      { title: 'Heat W', weight: 1, align: 'right' },
      { title: 'θJA K/W', weight: 1, align: 'right' },
      { title: 'Hottest land °C', weight: 1.3, align: 'right' },
      { title: 'Case top °C', weight: 1.1, align: 'right' },
      { title: 'Junction °C', weight: 1.2, align: 'right' },
      { title: '± K', weight: 0.8, align: 'right' },
      { title: 'Limit °C', weight: 1, align: 'right' },
      { title: 'Margin K', weight: 1.1, align: 'right' },
      { title: 'Verdict', weight: 1.6 },
    ],
    rows: condition.regulators.map((regulator) => {
      const limit = junctionLimit(regulator);
      const governs = governing.get(regulator.ref)?.condition === condition;
      return [
        governs ? `${regulator.ref} *` : regulator.ref,
        formatNumber(regulator.dissipationW, 3),
        formatNumber(regulator.thetaJaKPerW, 1),
        formatNumber(regulator.landC, 1),
        formatNumber(regulator.caseTopC, 1),
        formatNumber(regulator.junctionC, 1),
        formatNumber(regulator.uncertaintyK, 1),
        formatNumber(limit?.limit, 1),
        formatNumber(limit?.margin, 1),
        { verdict: regulator.verdict },
      ];
    }),
    empty: 'The board has no regulator.',
  };
}

function operatingPoints({ regulators }: ConditionResult): RecordBlock {
  return {
    kind: 'table',
    columns: [
      { title: 'Ref', weight: 0.9 },
      { title: 'Input V', weight: 1, align: 'right' },
      { title: 'Output V', weight: 1, align: 'right' },
      { title: 'Output A', weight: 1, align: 'right' },
      { title: 'Ground A', weight: 1, align: 'right' },
      { title: 'Headroom V', weight: 1.1, align: 'right' },
      { title: 'Operating point', weight: 3.4 },
    ],
    rows: regulators.map((regulator) => [
      regulator.ref,
      formatNumber(regulator.inputV, 2),
      formatNumber(regulator.outputV, 2),
      formatNumber(regulator.outputA, 3),
      formatNumber(regulator.groundA, 4),
      formatNumber(regulator.headroomV, 2),
      [
        regulator.regulating === null ? 'not known' : regulator.regulating ? 'regulates' : 'does not hold its output',
        regulator.shutsDown && 'reaches its thermal shutdown',
      ]
        .filter(Boolean)
        .join('; '),
    ]),
    empty: '',
  };
}

/** Every limit by its rule: part stress by part stress. */
function limits(board: Board, { regulators }: ConditionResult): RecordBlock {
  return {
    kind: 'table',
    columns: [
      { title: 'Ref', weight: 0.8 },
      { title: 'Rule', weight: 0.7 },
      { title: 'Stress', weight: 2 },
      { title: 'Rated', weight: 1.2, align: 'right' },
      { title: 'Actual', weight: 1.2, align: 'right' },
      { title: 'Derated limit', weight: 1.3, align: 'right' },
      { title: 'Stress ratio', weight: 1.2, align: 'right' },
      { title: 'Margin', weight: 1.2, align: 'right' },
      { title: 'Verdict', weight: 1.6 },
    ],
    rows: regulators.flatMap((regulator) => {
      const signs = limitSigns(board, regulator);
      const part = board.parts[board.regulators.find(({ ref }) => ref === regulator.ref)?.part ?? ''];
      return regulator.limits.map((limit, index) => [
        regulator.ref,
        signs[index] ?? '',
        quantityWords[limit.quantity],
        limitValue(
          limit.quantity,
          part
            ? { junctionC: part.junctionMaxC, inputV: part.inputMaxV, outputA: part.outputMaxA }[limit.quantity]
            : null,
        ),
        limitValue(limit.quantity, limit.actual),
        limitValue(limit.quantity, limit.limit),
        ratioText(limit.ratio),
        marginText(limit),
        { verdict: limit.verdict },
      ]);
    }),
    empty: '',
  };
}

function solution({ board, energy, solver }: ConditionResult): RecordBlock[] {
  if (!board || !energy || !solver) return [];
  const parts = [
    `Board: hottest ${formatQuantity(board.maxC, '°C')} at ${formatNumber(board.maxAt[0], 1)}, ${formatNumber(board.maxAt[1], 1)} mm, mean ${formatQuantity(board.meanC, '°C')}.`,
    `Solution: heat in ${formatNumber(energy.inW, 3)} W, out ${formatNumber(energy.outW, 3)} W, imbalance ${energy.imbalance.toExponential(0)};`,
    `${solver.cells} unknowns, cells of ${formatNumber(solver.cellMm, 2)} mm, ${solver.iterations} iterations, residual ${solver.residual.toExponential(1)},`,
    `grid error at most ${formatQuantity(solver.gridErrorK, 'K')}.`,
  ];
  return [{ kind: 'text', text: parts.join(' ') }];
}
