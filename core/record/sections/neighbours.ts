import { formatNumber } from '#core/format.ts';
import { governingOf } from '../governing.ts';
import type { RecordSection } from '../record-document.ts';
import type { RecordInput } from '../record-input.ts';

const shown = 4;

/** Who heats whom in the governing condition, and the neighbours' own limits. */
export function neighboursSection({ board, result }: RecordInput): RecordSection {
  return {
    id: 'neighbours',
    title: 'Heat ledger and neighbours',
    blocks: [
      {
        kind: 'table',
        columns: [
          { title: 'Junction', weight: 1 },
          { title: 'Condition', weight: 2.2 },
          { title: 'Heated by, K (largest first)', weight: 5 },
        ],
        rows: board.regulators.map(({ ref }) => {
          const condition = governingOf(result, ref)?.condition;
          const entries = (condition?.ledger ?? [])
            .filter((entry) => entry.victim === ref)
            .toSorted((a, b) => b.riseK - a.riseK);
          const rest = entries.slice(shown).reduce((sum, entry) => sum + entry.riseK, 0);
          const words = entries
            .slice(0, shown)
            .map((entry) => `${entry.source === ref ? 'itself' : entry.source} ${formatNumber(entry.riseK, 1)}`);
          if (entries.length > shown) words.push(`${entries.length - shown} others ${formatNumber(rest, 1)}`);
          return [ref, condition?.name ?? 'none', words.join(' · ') || 'not evaluated'];
        }),
        empty: 'The board has no regulator.',
      },
      {
        kind: 'table',
        columns: [
          { title: 'Neighbour', weight: 1.2 },
          { title: 'Condition', weight: 2.4 },
          { title: 'Heat W', weight: 1, align: 'right' },
          { title: 'Mean °C', weight: 1, align: 'right' },
          { title: 'Hottest °C', weight: 1, align: 'right' },
          { title: 'Limit °C', weight: 1, align: 'right' },
          { title: 'Verdict', weight: 1.6 },
        ],
        rows: board.sources.flatMap(({ ref }) => {
          const seen = result.conditions.flatMap((condition) =>
            condition.sources
              .filter((source) => source.ref === ref)
              .map((source) => ({ name: condition.name, source })),
          );
          const hottest = seen.toSorted(
            (a, b) => (b.source.temperatureC ?? -Infinity) - (a.source.temperatureC ?? -Infinity),
          )[0];
          if (!hottest) return [];
          const { source } = hottest;
          return [
            [
              ref,
              hottest.name,
              formatNumber(source.powerW, 3),
              formatNumber(source.temperatureC, 1),
              formatNumber(source.maxC, 1),
              formatNumber(source.limitC, 1),
              source.limitC === null ? 'no limit stated' : { verdict: source.verdict },
            ],
          ];
        }),
        empty: 'No neighbour is on the board.',
      },
    ],
  };
}
