import type { Condition } from '#core/board/condition.ts';
import type { Board } from '#core/board/document.ts';
import type { OperatingPoint } from './operating-point.ts';

/** Heat of every source, W: the condition's power or its own, and the heat of the droppers that name it. */
export function sourcePowers(
  board: Board,
  condition: Condition,
  points: ReadonlyMap<string, OperatingPoint>,
): Map<string, number> {
  const powers = new Map<string, number>();
  for (const source of board.sources) {
    const droppers = board.regulators
      .filter((regulator) => regulator.dropper?.source === source.ref)
      .reduce((sum, regulator) => sum + (points.get(regulator.ref)?.dropperW ?? 0), 0);
    powers.set(source.ref, (condition.powersW[source.ref] ?? source.powerW ?? 0) + droppers);
  }
  return powers;
}
