import type { OperatingPoint } from '#core/electrical/operating-point.ts';
import type { HeatInput } from '#core/thermal/solution.ts';

/** What is known of the heat of a condition; the rest is solved as 0 W and keeps every verdict from being a pass. */
export function heatInput(
  points: ReadonlyMap<string, OperatingPoint>,
  sourcesW: ReadonlyMap<string, number | null>,
): HeatInput {
  const regulatorsW = new Map<string, number>();
  for (const { ref, dissipationW } of points.values()) if (dissipationW !== null) regulatorsW.set(ref, dissipationW);
  return { regulatorsW, sourcesW: new Map([...sourcesW].map(([ref, power]) => [ref, power ?? 0])) };
}
