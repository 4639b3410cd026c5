import type { Finding } from '#core/result/result.ts';
import { formatNumber } from '#core/format.ts';
import type { FindingRule } from '../finding-context.ts';

/** Supplies that no condition runs at their highest voltage, and voltages of conditions outside what the supply can give. */
export const supplyCorner: FindingRule = ({ board }) =>
  board.supplies.flatMap((supply): Finding[] => {
    const heats = board.regulators.some(
      ({ feed, powerW }) => powerW === null && feed !== null && 'supply' in feed && feed.supply === supply.name,
    );
    const stated = board.conditions.map((condition) => ({
      name: condition.name,
      volts: condition.supplies[supply.name] ?? supply.maxV,
    }));
    const found = stated
      .filter(({ volts }) => volts > supply.maxV || volts < supply.minV)
      .map(({ name, volts }) => ({
        rule: 'supply-outside-range',
        severity: 'warn' as const,
        ref: supply.name,
        condition: name,
        message: `${supply.name} stands at ${formatNumber(volts, 2)} V, outside its range of ${formatNumber(supply.minV, 2)} to ${formatNumber(supply.maxV, 2)} V.`,
        remedy: 'Correct the voltage of the condition or the range of the supply.',
      }));
    if (!heats || stated.length === 0 || stated.some(({ volts }) => volts >= supply.maxV)) return found;
    return [
      ...found,
      {
        rule: 'no-high-line',
        severity: 'warn',
        ref: supply.name,
        condition: null,
        message: `No condition runs ${supply.name} at its highest ${formatNumber(supply.maxV, 2)} V, where its regulators are hottest.`,
        remedy: 'Add a condition at the highest input, or say why it cannot occur.',
      },
    ];
  });
