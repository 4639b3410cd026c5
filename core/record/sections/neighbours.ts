import { formatNumber } from '#core/format.ts';
import type { SourceResult, Verdict } from '#core/result/result.ts';
import type { RecordSection } from '../record-document.ts';
import type { RecordInput } from '../record-input.ts';

const severity: readonly Verdict[] = ['within', 'close', 'not evaluated', 'over'];

/** Other parts, the laminate and the probes against what they may reach, each in its hottest condition. */
export function neighboursSection({ board, result }: RecordInput): RecordSection {
  return {
    id: 'neighbours',
    title: 'Neighbours and board',
    blocks: [
      {
        kind: 'table',
        columns: [
          { title: 'Neighbour', weight: 1.2 },
          { title: 'Condition', weight: 2.2 },
          { title: 'Heat W', weight: 0.9, align: 'right' },
          { title: 'Hottest °C', weight: 1, align: 'right' },
          { title: 'Mean °C', weight: 0.9, align: 'right' },
          { title: 'Limit °C', weight: 1, align: 'right' },
          { title: 'Margin K', weight: 1, align: 'right' },
          { title: 'Verdict', weight: 1.7 },
        ],
        rows: board.sources.map(({ ref, limitC }) => {
          const found = hottestOf(result, ref);
          const mean = found?.source.temperatureC ?? null;
          return [
            ref,
            found?.name ?? 'none',
            formatNumber(found?.source.powerW, 3),
            formatNumber(found?.source.maxC, 1),
            formatNumber(mean, 1),
            limitC === null ? 'not stated' : formatNumber(limitC, 1),
            formatNumber(mean === null || limitC === null ? null : limitC - mean, 1),
            limitC === null ? 'not judged' : { verdict: found?.source.verdict ?? ('not evaluated' as const) },
          ];
        }),
        empty: 'No neighbour is on the board.',
      },
      { kind: 'heading', text: 'Board' },
      {
        kind: 'table',
        columns: [
          { title: 'Condition', weight: 3 },
          { title: 'Hottest °C', weight: 1, align: 'right' },
          { title: 'at mm', weight: 1.2, align: 'right' },
          { title: 'Mean °C', weight: 1, align: 'right' },
          { title: 'Laminate limit °C', weight: 1.4, align: 'right' },
          { title: 'Margin K', weight: 1, align: 'right' },
        ],
        rows: result.conditions.map(({ name, board: heat }) => [
          name,
          formatNumber(heat?.maxC, 1),
          heat ? heat.maxAt.map((value) => formatNumber(value, 1)).join(', ') : '–',
          formatNumber(heat?.meanC, 1),
          formatNumber(board.stackup.maxOperatingC, 1),
          formatNumber(heat ? board.stackup.maxOperatingC - heat.maxC : null, 1),
        ]),
        empty: 'There is no operating condition.',
      },
      { kind: 'heading', text: 'Probes' },
      {
        kind: 'table',
        columns: [
          { title: 'Probe', weight: 1.4 },
          { title: 'At mm', weight: 1.2, align: 'right' },
          { title: 'Side', weight: 0.8 },
          { title: 'Temperature °C by condition', weight: 5 },
        ],
        rows: board.probes.map(({ id, at, side }) => [
          id,
          at.map((value) => formatNumber(value, 1)).join(', '),
          side,
          result.conditions
            .map(
              ({ name, probes }) =>
                `${name}: ${formatNumber(probes.find((probe) => probe.id === id)?.temperatureC, 1)}`,
            )
            .join('; ') || 'none',
        ]),
        empty: 'There is no probe.',
      },
    ],
  };
}

/** The condition in which a neighbour is worst off: by verdict, then by temperature. */
function hottestOf(result: RecordInput['result'], ref: string): { name: string; source: SourceResult } | null {
  const seen = result.conditions.flatMap(({ name, sources }) =>
    sources.filter((source) => source.ref === ref).map((source) => ({ name, source })),
  );
  return (
    seen.toSorted(
      (a, b) =>
        severity.indexOf(b.source.verdict) - severity.indexOf(a.source.verdict) ||
        (b.source.temperatureC ?? -Infinity) - (a.source.temperatureC ?? -Infinity),
    )[0] ?? null
  );
}
