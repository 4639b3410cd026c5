import { ruleSource } from '#core/derating/limits.ts';
import { formatGiven } from '#core/format.ts';
import type { Rule } from '#core/board/criteria.ts';
import type { RecordSection } from '../record-document.ts';
import type { RecordInput } from '../record-input.ts';

const quantities = { junctionC: 'Junction temperature', inputV: 'Input voltage', outputA: 'Output current' } as const;

/** The criteria as they were applied, each rule with its source and mark. */
export function limitsSection({ board }: RecordInput): RecordSection {
  const { criteria } = board;
  return {
    id: 'limits',
    title: 'Derating criteria',
    blocks: [
      {
        kind: 'text',
        text: `Criteria “${criteria.name}”${criteria.version ? `, version ${criteria.version}` : ''}. The maker’s own maximum junction temperature always applies too. A value equal to its limit is inside.`,
      },
      {
        kind: 'table',
        columns: [
          { title: 'Quantity', weight: 1.5 },
          { title: 'Limit', weight: 2.2 },
          { title: 'Source', weight: 4 },
          { title: 'Mark', weight: 1.2 },
        ],
        rows: criteria.rules.map((rule) => [
          quantities[rule.quantity],
          limitText(rule),
          ruleSource(board, rule),
          (rule.mark ?? 'not marked').replace('-', ' '),
        ]),
        empty: 'The criteria hold no rule.',
      },
    ],
  };
}

function limitText(rule: Rule): string {
  const parts = [
    rule.atMostC !== undefined && `at most ${formatGiven(rule.atMostC, '°C')}`,
    rule.belowMaxK !== undefined && `${formatGiven(rule.belowMaxK, 'K')} below the maker’s maximum`,
    rule.ratio !== undefined && `stress ratio at most ${formatGiven(rule.ratio)}`,
  ].filter(Boolean);
  return parts.join(', whichever is lower: ');
}
