import type { Condition } from '#core/board/condition.ts';
import { formatGiven, formatQuantity } from '#core/format.ts';
import { notStated, stated } from '../stated.ts';
import type { RecordSection } from '../record-document.ts';
import type { RecordInput } from '../record-input.ts';

/** Air, attitude, supplies, loads and fault of every condition. */
export function conditionsSection({ board }: RecordInput): RecordSection {
  return {
    id: 'conditions',
    title: 'Operating conditions',
    blocks: [
      {
        kind: 'table',
        columns: [
          { title: 'Condition', weight: 2.3 },
          { title: 'Ambient °C', weight: 1, align: 'right' },
          { title: 'Box rise K', weight: 1, align: 'right' },
          { title: 'Altitude m', weight: 1, align: 'right' },
          { title: 'Attitude', weight: 1.2 },
          { title: 'Air', weight: 2.4 },
          { title: 'Fault', weight: 1.8 },
        ],
        rows: board.conditions.map((condition) => [
          condition.name,
          formatGiven(condition.ambientC),
          formatGiven(condition.boxRiseK),
          formatGiven(condition.altitudeM),
          condition.orientation,
          airText(condition),
          faultText(condition),
        ]),
        empty: 'There is no operating condition.',
      },
      { kind: 'heading', text: 'Supplies and loads by condition' },
      {
        kind: 'table',
        columns: [
          { title: 'Condition', weight: 2.3 },
          { title: 'Supplies V', weight: 2.4 },
          { title: 'Output currents A', weight: 3 },
          { title: 'Stated heat W', weight: 2 },
        ],
        rows: board.conditions.map((condition) => [
          condition.name,
          board.supplies.map(({ name, maxV }) => `${name} ${stated(condition.supplies[name] ?? maxV)}`).join(', ') ||
            notStated,
          board.regulators
            .filter(({ powerW }) => powerW === null)
            .map(({ ref }) => `${ref} ${stated(condition.loadsA[ref])}`)
            .join(', ') || 'none',
          board.sources
            .filter(({ ref, powerW }) => powerW !== null || condition.powersW[ref] !== undefined)
            .map(({ ref, powerW }) => `${ref} ${stated(condition.powersW[ref] ?? powerW)}`)
            .join(', ') || 'none',
        ]),
        empty: 'There is no operating condition.',
      },
      { kind: 'heading', text: 'Supplies' },
      {
        kind: 'table',
        columns: [
          { title: 'Supply', weight: 3 },
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
    return `fixed film, top ${formatGiven(top)}, bottom ${formatGiven(bottom, 'W/(m²·K)')}`;
  }
  if (air.kind === 'still') return 'still';
  const moving = `${formatQuantity(air.speedMPerS, 'm/s')} towards ${formatGiven(air.towardDeg)}°`;
  return fault?.kind === 'fan-stopped' ? `still: fan stopped (else ${moving})` : moving;
}

function faultText({ fault }: Condition): string {
  if (!fault) return 'none';
  return fault.kind === 'fan-stopped' ? 'fan stopped' : `output of ${fault.ref} shorted`;
}
