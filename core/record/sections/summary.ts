import { formatNumber } from '#core/format.ts';
import { governingOf } from '../governing.ts';
import type { RecordBlock, RecordSection } from '../record-document.ts';
import type { RecordInput } from '../record-input.ts';

/** Verdict of every regulator in its governing condition, and what was not evaluated. */
export function summarySection({ board, result, revision }: RecordInput): RecordSection {
  const rows = board.regulators.map(({ ref, part }) => {
    const governing = governingOf(result, ref);
    const regulator = governing?.regulator;
    return [
      ref,
      board.parts[part]?.name ?? part,
      governing?.condition.name ?? 'none',
      formatNumber(regulator?.junctionC ?? null, 1),
      formatNumber(regulator?.uncertaintyK ?? null, 1),
      formatNumber(governing?.limit?.limit ?? null, 1),
      formatNumber(governing?.limit?.margin ?? null, 1),
      { verdict: regulator?.verdict ?? ('not evaluated' as const) },
    ];
  });
  const blocks: RecordBlock[] = [
    {
      kind: 'table',
      columns: [
        { title: 'Regulator', weight: 1.1 },
        { title: 'Part', weight: 1.5 },
        { title: 'Governing condition', weight: 2.6 },
        { title: 'Junction °C', weight: 1.1, align: 'right' },
        { title: '± K', weight: 0.8, align: 'right' },
        { title: 'Limit °C', weight: 1, align: 'right' },
        { title: 'Margin K', weight: 1, align: 'right' },
        { title: 'Verdict', weight: 1.6 },
      ],
      rows,
      empty: 'The board has no regulator.',
    },
  ];
  const open = result.conditions.filter((condition) => condition.verdict === 'not evaluated').map(({ name }) => name);
  if (open.length > 0)
    blocks.push({ kind: 'notice', text: `Not evaluated: ${open.join('; ')}. A missing input is never a pass.` });
  if (result.conditions.length === 0)
    blocks.push({ kind: 'notice', text: 'There is no operating condition, so nothing was evaluated.' });
  if (revision?.stateReason)
    blocks.push({
      kind: 'notice',
      text: `${revision.state === 'withdrawn' ? 'Withdrawn' : 'Sent back'}: ${revision.stateReason}`,
    });
  return { id: 'summary', title: 'Verdict', blocks };
}
