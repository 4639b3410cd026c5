import type { Rule } from '#core/board/criteria.ts';
import { ruleSource } from '#core/derating/limits.ts';
import { formatGiven } from '#core/format.ts';
import { makersSign, quantityWords } from '../limit-words.ts';
import type { RecordSection } from '../record-document.ts';
import type { RecordInput } from '../record-input.ts';

const marks: Record<NonNullable<Rule['mark']>, string> = {
  read: 'read in the document',
  'second-hand': 'quoted by another text',
  'common-practice': 'common practice',
  house: 'house rule',
  unverified: 'unverified',
};

/** The criteria as they were applied, each rule with its sign, source and mark. */
export function limitsSection({ board }: RecordInput): RecordSection {
  const { criteria } = board;
  return {
    id: 'limits',
    title: 'Derating limits and their sources',
    blocks: [
      {
        kind: 'text',
        text: `Criteria “${criteria.name}”${criteria.version ? `, version ${criteria.version}` : ''}. Of several comparisons in one rule the lowest limit counts. A value equal to its limit is inside. The maker’s own maximum (${makersSign}) always applies too; in a single-fault condition of a part it alone is judged for that part, as derating is for normal operation.`,
      },
      {
        kind: 'table',
        columns: [
          { title: 'Rule', weight: 0.6 },
          { title: 'Quantity', weight: 1.7 },
          { title: 'Limit', weight: 2.2 },
          { title: 'Source', weight: 3.4 },
          { title: 'Mark', weight: 1.5 },
        ],
        rows: [
          ...criteria.rules.map((rule, index) => [
            `R${index + 1}`,
            quantityWords[rule.quantity],
            limitText(rule),
            ruleSource(board, rule),
            rule.mark ? marks[rule.mark] : 'not marked',
          ]),
          [
            makersSign,
            quantityWords.junctionC,
            'maker’s maximum of each part',
            'the source of the part',
            'as the part states',
          ],
        ],
        empty: '',
      },
    ],
  };
}

function limitText(rule: Rule): string {
  const parts = [
    rule.atMostC !== undefined && `at most ${formatGiven(rule.atMostC, '°C')}`,
    rule.belowMaxK !== undefined && `at least ${formatGiven(rule.belowMaxK, 'K')} below the maker’s maximum`,
    rule.ratio !== undefined && `stress ratio at most ${formatGiven(rule.ratio)}`,
  ].filter(Boolean);
  return parts.join('; ');
}
