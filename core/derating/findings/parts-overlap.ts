import { placedRectangle } from '#core/geometry/placed-rectangle.ts';
import { polygonsOverlap } from '#core/geometry/ring-checks.ts';
import type { FindingRule } from '../finding-context.ts';
import { footprints } from '../footprints.ts';

/** Two parts of one side that stand on each other. */
export const partsOverlap: FindingRule = ({ board }) => {
  const shapes = footprints(board).map((footprint) => ({
    ref: footprint.ref,
    side: footprint.placement.side,
    ring: placedRectangle(footprint.placement, footprint.centre, [
      footprint.size[0] * 0.999,
      footprint.size[1] * 0.999,
    ]),
  }));
  return shapes.flatMap((a, index) =>
    shapes
      .slice(index + 1)
      .filter((b) => a.side === b.side && polygonsOverlap(a.ring, b.ring))
      .map((b) => ({
        rule: 'parts-overlap',
        severity: 'stop' as const,
        ref: a.ref,
        condition: null,
        message: `${a.ref} and ${b.ref} overlap.`,
        remedy: `Move ${a.ref} or ${b.ref}.`,
      })),
  );
};
