import type { Isotherm, MmRing } from './heat-bands.ts';

type Mm = readonly [number, number];
export type IsothermLabel = { valueC: number; at: Mm };

/**
 * One place for the figure of each isotherm: a point of its longest ring inside the board, as far from the labels placed before as it can be.
 * @param free whether the figure of a line may stand at a point
 * @param otherwise where the figure of a line may stand if no free point is left; nowhere when left out
 * @param apartMm labels closer than this to another are left out
 */
export function isothermLabels(
  lines: readonly Isotherm[],
  free: (point: Mm, line: Isotherm) => boolean,
  apartMm: number,
  otherwise: (point: Mm, line: Isotherm) => boolean = () => false,
): IsothermLabel[] {
  const placed: IsothermLabel[] = [];
  for (const line of lines) {
    const ring = longest(line.rings);
    if (!ring) continue;
    const best =
      furthest(ring, (point) => free(point, line), placed) ?? furthest(ring, (point) => otherwise(point, line), placed);
    if (best && best.gap >= apartMm) placed.push({ valueC: line.valueC, at: best.at });
  }
  return placed;
}

/** Point of the ring where a figure may stand, as far from the others as can be; the first one while there are none. */
function furthest(ring: MmRing, free: (point: Mm) => boolean, placed: readonly IsothermLabel[]) {
  let best: { at: Mm; gap: number } | null = null;
  const stride = Math.max(1, Math.floor(ring.length / 64));
  for (let index = 0; index < ring.length; index += stride) {
    const at = ring[index];
    if (!at || !free(at)) continue;
    const gaps = placed.map((other) => Math.hypot(other.at[0] - at[0], other.at[1] - at[1]));
    const gap = Math.min(Infinity, ...gaps);
    if (!best || gap > best.gap) best = { at, gap };
  }
  return best;
}

function longest(rings: readonly MmRing[]): MmRing | undefined {
  return [...rings].sort((a, b) => b.length - a.length)[0];
}
