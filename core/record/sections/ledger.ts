import { formatNumber } from '#core/format.ts';
import { governingByRegulator } from '../governing.ts';
import type { RecordSection } from '../record-document.ts';
import type { RecordInput } from '../record-input.ts';

const shown = 5;

/** Who heats whom in the governing condition: the largest contributors, and what all others add. */
export function ledgerSection({ board, result }: RecordInput): RecordSection {
  const governing = governingByRegulator(result);
  return {
    id: 'ledger',
    title: 'Heat ledger',
    blocks: [
      {
        kind: 'text',
        text: `Rise of each junction over the local air by the source of the heat, in the governing condition; the ${shown} largest neighbours by name.`,
      },
      {
        kind: 'table',
        columns: [
          { title: 'Junction', weight: 0.9 },
          { title: 'Condition', weight: 2.2 },
          { title: 'Own heat K', weight: 1, align: 'right' },
          { title: 'Largest neighbours K', weight: 3.8 },
          { title: 'All others K', weight: 1, align: 'right' },
          { title: 'Sum K', weight: 0.9, align: 'right' },
        ],
        rows: board.regulators.map(({ ref }) => {
          const condition = governing.get(ref)?.condition;
          const entries = (condition?.ledger ?? []).filter(({ victim }) => victim === ref);
          if (!condition || entries.length === 0)
            return [ref, condition?.name ?? 'none', '–', 'not evaluated', '–', '–'];
          const own = entries.find(({ source }) => source === ref)?.riseK ?? 0;
          const others = entries
            .filter(({ source }) => source !== ref)
            .toSorted((a, b) => b.riseK - a.riseK || (a.source < b.source ? -1 : 1));
          const rest = others.slice(shown).reduce((sum, { riseK }) => sum + riseK, 0);
          const named = others.slice(0, shown).map(({ source, riseK }) => `${source} ${formatNumber(riseK, 1)}`);
          return [
            ref,
            condition.name,
            formatNumber(own, 1),
            named.join(', ') || 'none',
            formatNumber(rest, 1),
            formatNumber(
              entries.reduce((sum, { riseK }) => sum + riseK, 0),
              1,
            ),
          ];
        }),
        empty: 'The board has no regulator.',
      },
    ],
  };
}
