import type { Side } from '#core/board/placement.ts';

type Placement = { at: readonly [number, number]; rotationDeg: number; side: Side };

/** Point of a part's own frame (mm, seen from above the part) on the board; a part on the bottom is mirrored in x. */
export function placedPoint(placement: Placement, x: number, y: number): [number, number] {
  const angle = (placement.rotationDeg * Math.PI) / 180;
  const px = placement.side === 'bottom' ? -x : x;
  const cos = Math.cos(angle);
  const sin = Math.sin(angle);
  return [placement.at[0] + px * cos - y * sin, placement.at[1] + px * sin + y * cos];
}

/** Corners of a rectangle of a part's frame, centred at `centre`, on the board, mm. */
export function placedRectangle(
  placement: Placement,
  centre: readonly [number, number],
  sizeMm: readonly [number, number],
): [number, number][] {
  const [cx, cy] = centre;
  const [w, h] = [sizeMm[0] / 2, sizeMm[1] / 2];
  return [
    placedPoint(placement, cx - w, cy - h),
    placedPoint(placement, cx + w, cy - h),
    placedPoint(placement, cx + w, cy + h),
    placedPoint(placement, cx - w, cy + h),
  ];
}
