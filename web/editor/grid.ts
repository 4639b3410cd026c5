import { tidyMm } from '#core/board/edits/tidy-mm.ts';
import type { Point } from '#core/board/outline.ts';

/** Steps of the snap grid that can be chosen, mm. */
export const gridSteps = [0.1, 0.25, 0.5, 1, 2.5, 5] as const;
/** Step of the arrow keys with Alt, mm. */
export const fineStepMm = 0.1;

/** Nearest point of the grid; free of binary dust, so that 0.3 stays 0.3. */
export function snapped(point: readonly [number, number], stepMm: number): Point {
  return [onStep(point[0], stepMm), onStep(point[1], stepMm)];
}

export function onStep(valueMm: number, stepMm: number): number {
  return tidyMm(Math.round(valueMm / stepMm) * stepMm);
}

/** Step of an arrow key: the grid, ten times it with Shift, 0.1 mm with Alt. */
export function nudgeStep(gridMm: number, keys: { shift: boolean; alt: boolean }): number {
  if (keys.alt) return fineStepMm;
  return keys.shift ? gridMm * 10 : gridMm;
}

/** Distance between drawn grid lines: the chosen step, coarsened until lines stand at least `apartPx` apart. */
export function drawnGridStep(gridMm: number, pxPerMm: number, apartPx = 9): number {
  let step = gridMm;
  for (const factor of [2, 5, 10, 20, 50, 100, 200, 500, 1000]) {
    if (step * pxPerMm >= apartPx) break;
    step = gridMm * factor;
  }
  return step;
}

/** Distance between figures on the ruler: 1, 2 or 5 times a power of ten, at least `apartPx` apart. */
export function rulerStep(pxPerMm: number, apartPx = 60): number {
  const least = apartPx / pxPerMm;
  const power = 10 ** Math.floor(Math.log10(least));
  const factor = [1, 2, 5, 10].find((candidate) => candidate * power >= least) ?? 10;
  return factor * power;
}
