import { formatNumber, formatQuantity } from '#core/format.ts';
import { governingByRegulator } from '../governing.ts';
import { limitValue, marginText, shortQuantityWords } from '../limit-words.ts';
import type { RecordBlock, RecordSection } from '../record-document.ts';
import type { RecordInput } from '../record-input.ts';

const meanings = {
  within: 'Every part is inside its derated limits by more than the stated uncertainty.',
  close: 'Every part is inside its derated limits, at least one by no more than the stated uncertainty.',
  over: 'At least one part is over a limit.',
  'not evaluated': 'Something that is needed for a verdict is missing; a missing input is never a pass.',
} as const;

/** Verdict of every regulator in its governing condition, and every exceedance. */
export function summarySection({ board, result, revision }: RecordInput): RecordSection {
  const governing = governingByRegulator(result);
  const rows = board.regulators.map(({ ref, part }) => {
    const found = governing.get(ref);
    const limit = found?.limit ?? null;
    const isJunction = limit?.quantity === 'junctionC' && limit.actual !== null;
    const band = isJunction ? found?.regulator.uncertaintyK : null;
    return [
      ref,
      board.parts[part]?.name ?? part,
      found?.condition.name ?? 'none',
      limit ? shortQuantityWords[limit.quantity] : 'no limit',
      limit ? `${limitValue(limit.quantity, limit.actual)}${band ? ` ± ${formatNumber(band, 1)}` : ''}` : '–',
      limit ? limitValue(limit.quantity, limit.limit) : '–',
      limit ? marginText(limit) : '–',
      { verdict: found?.regulator.verdict ?? ('not evaluated' as const) },
    ];
  });
  const { verdict } = result;
  return {
    id: 'summary',
    title: 'Verdict',
    blocks: [
      { kind: 'text', text: `Verdict: ${verdict}. ${meanings[verdict]}` },
      ...(revision?.stateReason
        ? [
            {
              kind: 'notice' as const,
              text: `${revision.state === 'withdrawn' ? 'Withdrawn' : 'Sent back'}: ${revision.stateReason}`,
            },
          ]
        : []),
      {
        kind: 'table',
        columns: [
          { title: 'Regulator', weight: 1 },
          { title: 'Part', weight: 1.3 },
          { title: 'Governing condition', weight: 2.1 },
          { title: 'Governed by', weight: 1.7 },
          { title: 'Actual', weight: 1.6, align: 'right' },
          { title: 'Limit', weight: 1.1, align: 'right' },
          { title: 'Margin', weight: 1, align: 'right' },
          { title: 'Verdict', weight: 1.6 },
        ],
        rows,
        empty: 'The board has no regulator, so there is no verdict; its heat was solved all the same.',
      },
      ...exceedances(board, result),
      ...(result.cautions.length > 0
        ? [
            {
              kind: 'text' as const,
              text: `${result.cautions.length === 1 ? 'One caution' : `${result.cautions.length} cautions`} about hazards to people and property: read the section “Cautions” before the board is handled.`,
            },
          ]
        : []),
    ],
  };
}

/** Every limit that is exceeded, in every condition: none of them may go unseen behind a governing one. */
function exceedances({ stackup }: RecordInput['board'], result: RecordInput['result']): RecordBlock[] {
  const rows = result.conditions.flatMap((condition) => [
    ...condition.regulators.flatMap(({ ref, limits }) =>
      limits
        .filter(({ verdict }) => verdict === 'over')
        .map((limit) => [
          ref,
          condition.name,
          shortQuantityWords[limit.quantity],
          limitValue(limit.quantity, limit.actual),
          limitValue(limit.quantity, limit.limit),
          marginText({ ...limit, margin: limit.margin === null ? null : -limit.margin }),
          limit.source,
        ]),
    ),
    ...condition.sources
      .filter(({ verdict }) => verdict === 'over')
      .map(({ ref, temperatureC, limitC }) => [
        ref,
        condition.name,
        'Mean temperature',
        formatQuantity(temperatureC, '°C'),
        formatQuantity(limitC, '°C'),
        formatQuantity(temperatureC === null || limitC === null ? null : temperatureC - limitC, 'K'),
        'limit stated for this part',
      ]),
    ...(condition.board && condition.board.maxC > stackup.maxOperatingC
      ? [
          [
            'Laminate',
            condition.name,
            'Hottest place',
            formatQuantity(condition.board.maxC, '°C'),
            formatQuantity(stackup.maxOperatingC, '°C'),
            formatQuantity(condition.board.maxC - stackup.maxOperatingC, 'K'),
            'maximum operating temperature of the laminate',
          ],
        ]
      : []),
  ]);
  if (rows.length === 0) return [];
  return [
    { kind: 'heading', text: 'Exceedances' },
    {
      kind: 'notice',
      text: 'An exceedance has to be designed out, or agreed as a deviation before the board is built. No deviation is recorded in this document.',
    },
    {
      kind: 'table',
      columns: [
        { title: 'Part', weight: 0.8 },
        { title: 'Condition', weight: 2 },
        { title: 'Quantity', weight: 1.4 },
        { title: 'Actual', weight: 1, align: 'right' },
        { title: 'Limit', weight: 1, align: 'right' },
        { title: 'Over by', weight: 1, align: 'right' },
        { title: 'Source of the limit', weight: 2.8 },
      ],
      rows,
      empty: '',
    },
  ];
}
