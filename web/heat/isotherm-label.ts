import type { Isotherm, MmRing } from './heat-bands.ts';

export type IsothermLabel = { valueC: number; at: readonly [number, number] };

/**
 * One place for the figure of each isotherm: a point of its longest ring inside the board, as far from the labels placed before as it can be.
 * @param inside whether a point lies on the board
 * @param apartMm labels closer than this to another are left out
 */
export function isothermLabels(
  lines: readonly Isotherm[],
  inside: (point: readonly [number, number]) => boolean,
  apartMm: number,
): IsothermLabel[] {
  const placed: IsothermLabel[] = [];
  for (const line of lines) {
    const ring = longest(line.rings);
    if (!ring) continue;
    let best: { at: readonly [number, number]; gap: number } | null = null;
    const stride = Math.max(1, Math.floor(ring.length / 64));
    for (let index = 0; index < ring.length; index += stride) {
      const at = ring[index];
      if (!at || !inside(at)) continue;
      const gap = placed.reduce(
        (least, other) => Math.min(least, Math.hypot(other.at[0] - at[0], other.at[1] - at[1])),
        Infinity,
      );
      if (!best || gap > best.gap) best = { at, gap };
      if (gap === Infinity) break;
    }
    if (best && best.gap >= apartMm) placed.push({ valueC: line.valueC, at: best.at });
  }
  return placed;
}

function longest(rings: readonly MmRing[]): MmRing | undefined {
  return [...rings].sort((a, b) => b.length - a.length)[0];
}
