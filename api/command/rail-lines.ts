import type { Condition } from '#core/board/condition.ts';
import type { Board } from '#core/board/document.ts';
import { railTable } from '#core/electrical/rail-table.ts';
import { formatNumber } from '#core/format.ts';
import { textTable } from './text-table.ts';

const head = [
  'rail',
  'from',
  'Vin low V',
  'nominal V',
  'high V',
  'Vout V',
  'Iout A',
  'Iin A',
  'headroom V',
  'heat at high W',
  'heat at low W',
  'efficiency %',
  'ground share %',
  'state',
];

/** Rails of one condition: input range, heat and headroom at their own corners, what they waste. */
export function railLines(board: Board, condition: Condition): string[] {
  const rails = railTable(board, condition);
  if (rails.length === 0) return [];
  const percent = (share: number | null) => formatNumber(share === null ? null : share * 100, 2);
  return textTable(
    head,
    rails.map((rail) => [
      rail.net === null ? rail.ref : `${rail.ref} ${rail.net}`,
      rail.source ?? '–',
      formatNumber(rail.inputV.lowest, 2),
      formatNumber(rail.inputV.nominal, 2),
      formatNumber(rail.inputV.highest, 2),
      formatNumber(rail.outputV, 2),
      formatNumber(rail.outputA, 3),
      formatNumber(rail.inputA, 3),
      formatNumber(rail.headroomV, 2),
      formatNumber(rail.heatW, 3),
      formatNumber(rail.lowInputHeatW, 3),
      percent(rail.efficiency),
      percent(rail.quiescentShare),
      rail.state,
    ]),
  );
}
