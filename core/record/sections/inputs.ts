import type { Regulator } from '#core/board/placement.ts';
import { formatGiven } from '#core/format.ts';
import type { RecordSection } from '../record-document.ts';
import type { RecordInput } from '../record-input.ts';

/** What was assumed of every regulator and every other source of heat, and where it comes from. */
export function inputsSection({ board }: RecordInput): RecordSection {
  return {
    id: 'inputs',
    title: 'Regulators and other heat',
    blocks: [
      {
        kind: 'table',
        columns: [
          { title: 'Ref', weight: 0.8 },
          { title: 'Part, package', weight: 2 },
          { title: 'At mm', weight: 1.3, align: 'right' },
          { title: 'Feed', weight: 1.6 },
          { title: 'Output V', weight: 1.2, align: 'right' },
          { title: 'Rated Tj °C', weight: 0.9, align: 'right' },
          { title: 'Source of the part’s values', weight: 3 },
        ],
        rows: board.regulators.map((regulator) => {
          const part = board.parts[regulator.part];
          return [
            regulator.ref,
            part ? `${part.name}, ${board.packages[part.package]?.name ?? part.package}` : regulator.part,
            `${formatGiven(regulator.at[0])}, ${formatGiven(regulator.at[1])} ${regulator.side === 'bottom' ? '(bottom)' : ''}`.trim(),
            feedText(regulator),
            part ? `${formatGiven(part.outputV)} ± ${formatGiven(part.outputTolerancePct, '%')}` : 'not stated',
            formatGiven(part?.junctionMaxC),
            part?.source ?? 'not stated',
          ];
        }),
        empty: 'The board has no regulator.',
      },
      {
        kind: 'table',
        columns: [
          { title: 'Heat source', weight: 1 },
          { title: 'At mm', weight: 1.2, align: 'right' },
          { title: 'Size mm', weight: 1.2, align: 'right' },
          { title: 'Heat W', weight: 2 },
          { title: 'Limit °C', weight: 1, align: 'right' },
        ],
        rows: board.sources.map((source) => [
          source.ref,
          source.at.map((value) => formatGiven(value)).join(', '),
          source.sizeMm.map((value) => formatGiven(value)).join(' × '),
          source.powerW === null ? 'from the droppers that name it' : formatGiven(source.powerW),
          source.limitC === null ? 'not stated' : formatGiven(source.limitC),
        ]),
        empty: 'No other source of heat is on the board.',
      },
    ],
  };
}

function feedText({ feed, dropper, powerW }: Regulator): string {
  if (powerW !== null) return `known dissipation ${formatGiven(powerW, 'W')}`;
  const from = !feed ? 'not stated' : 'supply' in feed ? feed.supply : `output of ${feed.regulator}`;
  if (!dropper) return from;
  const drops = [
    dropper.resistanceOhm !== undefined && formatGiven(dropper.resistanceOhm, 'Ω'),
    dropper.dropV !== undefined && formatGiven(dropper.dropV, 'V'),
  ].filter(Boolean);
  return `${from} through ${drops.join(' and ')}${dropper.source ? ` (${dropper.source})` : ''}`;
}
