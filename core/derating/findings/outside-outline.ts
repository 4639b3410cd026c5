import { placedRectangle } from '#core/geometry/placed-rectangle.ts';
import { polygonContains } from '#core/geometry/polygon.ts';
import type { FindingRule } from '../finding-context.ts';
import { footprints } from '../footprints.ts';

/** A part whose body or lands leave the board, or lie in a cut-out. */
export const outsideOutline: FindingRule = ({ board }) => {
  const { points, cutouts } = board.outline;
  const onBoard = ([x, y]: readonly [number, number]) =>
    polygonContains(points, x, y) && !cutouts.some((cutout) => polygonContains(cutout, x, y));
  return footprints(board)
    .filter(({ placement, size, centre }) =>
      // A hair inside the edge, so that a part flush with it is on the board.
      placedRectangle(placement, centre, [size[0] * 0.999, size[1] * 0.999]).some((corner) => !onBoard(corner)),
    )
    .map(({ ref }) => ({
      rule: 'outside-outline',
      severity: 'stop' as const,
      ref,
      condition: null,
      message: `${ref} does not lie wholly on the board.`,
      remedy: 'Move it inside the outline and clear of cut-outs.',
    }));
};
