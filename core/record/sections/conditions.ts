import type { Condition } from '#core/board/condition.ts';
import { formatGiven, formatQuantity } from '#core/format.ts';
import type { RecordSection } from '../record-document.ts';
import type { RecordInput } from '../record-input.ts';

export function conditionsSection({ board }: RecordInput): RecordSection {
  return {
    id: 'conditions',
    title: 'Operating conditions',
    blocks: [
      {
        kind: 'table',
        columns: [
          { title: 'Condition', weight: 2 },
          { title: 'Ambient °C', weight: 0.9, align: 'right' },
          { title: 'Box rise K', weight: 0.8, align: 'right' },
          { title: 'Altitude m', weight: 0.9, align: 'right' },
          { title: 'Attitude', weight: 1 },
          { title: 'Air', weight: 1.5 },
          { title: 'Supplies', weight: 2 },
          { title: 'Fault', weight: 1.4 },
        ],
        rows: board.conditions.map((condition) => [
          condition.name,
          formatGiven(condition.ambientC),
          formatGiven(condition.boxRiseK),
          formatGiven(condition.altitudeM),
          condition.orientation,
          airText(condition),
          board.supplies
            .map(({ name, maxV }) => `${name} ${formatGiven(condition.supplies[name] ?? maxV, 'V')}`)
            .join(', ') || 'none',
          faultText(condition),
        ]),
        empty: 'There is no operating condition.',
      },
      {
        kind: 'table',
        columns: [
          { title: 'Supply', weight: 2 },
          { title: 'Lowest V', weight: 1, align: 'right' },
          { title: 'Nominal V', weight: 1, align: 'right' },
          { title: 'Highest V', weight: 1, align: 'right' },
        ],
        rows: board.supplies.map(({ name, minV, nominalV, maxV }) => [
          name,
          formatGiven(minV),
          formatGiven(nominalV),
          formatGiven(maxV),
        ]),
        empty: 'No supply is stated.',
      },
    ],
  };
}

function airText({ air, filmWPerM2K, fault }: Condition): string {
  if (filmWPerM2K !== null) {
    const [top, bottom] =
      typeof filmWPerM2K === 'number' ? [filmWPerM2K, filmWPerM2K] : [filmWPerM2K.top, filmWPerM2K.bottom];
    return `fixed film ${formatGiven(top)} / ${formatGiven(bottom, 'W/(m²·K)')}`;
  }
  if (air.kind === 'still') return 'still';
  const moving = `${formatQuantity(air.speedMPerS, 'm/s')} towards ${formatGiven(air.towardDeg)}°`;
  return fault?.kind === 'fan-stopped' ? `still (fan stopped; ${moving} otherwise)` : moving;
}

function faultText({ fault }: Condition): string {
  if (!fault) return 'none';
  return fault.kind === 'fan-stopped' ? 'fan stopped' : `output of ${fault.ref} shorted`;
}
