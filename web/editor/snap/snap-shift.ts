import { tidyMm } from '#core/board/edits/tidy-mm.ts';
import type { Point } from '#core/board/outline.ts';
import type { SnapLine } from './snap-lines.ts';

/** Screen distance within which an object's line draws, px. */
export const snapReachPx = 8;

/**
 * How far the nearest line of another object is from any of the moving lines, per axis.
 * @param moving lines of what is moved, where the hand has it now, mm
 * @param reachMm farther lines do not draw
 * @returns shift along x and y, mm; null for an axis on which nothing is near
 */
export function snapShift(
  moving: readonly Pick<SnapLine, 'axis' | 'at'>[],
  lines: readonly SnapLine[],
  reachMm: number,
): [number | null, number | null] {
  const best: [number | null, number | null] = [null, null];
  for (const own of moving) {
    for (const line of lines) {
      if (line.axis !== own.axis) continue;
      const shift = line.at - own.at;
      const before = best[own.axis];
      if (Math.abs(shift) <= reachMm && (before === null || Math.abs(shift) < Math.abs(before))) best[own.axis] = shift;
    }
  }
  return best;
}

/** Puts a point on near lines of objects; an axis without one goes where `otherwise` says. */
export function snapPoint(
  at: Point,
  lines: readonly SnapLine[],
  reachMm: number,
  otherwise: (at: Point) => Point,
): Point {
  const [dx, dy] = snapShift(
    [
      { axis: 0, at: at[0] },
      { axis: 1, at: at[1] },
    ],
    lines,
    reachMm,
  );
  const [x, y] = otherwise(at);
  return [dx === null ? x : tidyMm(at[0] + dx), dy === null ? y : tidyMm(at[1] + dy)];
}
