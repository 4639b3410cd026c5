import type { FindingRule } from '../finding-context.ts';
import { formatNumber } from '#core/format.ts';

/** The board itself above the laminate's maximum operating temperature. */
export const laminateOver: FindingRule = ({ board, conditions }) =>
  conditions.flatMap(({ condition, result }) => {
    const limit = board.stackup.maxOperatingC;
    if (!result.board || result.board.maxC <= limit) return [];
    const [x, y] = result.board.maxAt;
    return [
      {
        rule: 'laminate-over',
        severity: 'warn' as const,
        ref: null,
        condition: condition.name,
        message: `The board reaches ${formatNumber(result.board.maxC, 1)} °C at ${formatNumber(x, 1)}, ${formatNumber(y, 1)} mm; its laminate is rated ${formatNumber(limit, 0)} °C.`,
        remedy: 'Spread the heat or use a laminate with a higher maximum operating temperature.',
      },
    ];
  });
