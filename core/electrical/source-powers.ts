import type { Condition } from '#core/board/condition.ts';
import type { Board } from '#core/board/document.ts';
import type { OperatingPoint } from './operating-point.ts';

/**
 * Heat of every source, W: the condition's power or its own, and the heat of the droppers that name it; null where nothing
 * says how much, or a dropper's operating point is not known.
 */
export function sourcePowers(
  board: Board,
  condition: Condition,
  points: ReadonlyMap<string, OperatingPoint>,
): Map<string, number | null> {
  return new Map(
    board.sources.map((source) => {
      const droppers = board.regulators.filter((regulator) => regulator.dropper?.source === source.ref);
      const own = condition.powersW[source.ref] ?? source.powerW ?? (droppers.length > 0 ? 0 : null);
      const heats = [own, ...droppers.map(({ ref }) => points.get(ref)?.dropperW ?? null)];
      const isKnown = heats.every((heat) => heat !== null);
      return [source.ref, isKnown ? heats.reduce((sum, heat) => sum + heat, 0) : null];
    }),
  );
}
