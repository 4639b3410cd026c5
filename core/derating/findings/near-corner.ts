import { boundsOf } from '#core/geometry/polygon.ts';
import type { FindingRule } from '../finding-context.ts';

const edgeMm = 10;
const tightK = 15;

/** A regulator with little margin in a corner, where its heat can spread one way only. */
export const nearCorner: FindingRule = ({ board, conditions }) => {
  const box = boundsOf(board.outline.points);
  return board.regulators.flatMap((regulator) => {
    const [x, y] = regulator.at;
    const near = [x - box.minX, box.maxX - x, y - box.minY, box.maxY - y].filter((distance) => distance < edgeMm);
    const tight = conditions.some(({ result }) =>
      result.regulators
        .filter((candidate) => candidate.ref === regulator.ref)
        .some((candidate) =>
          candidate.limits.some(
            (limit) => limit.quantity === 'junctionC' && limit.margin !== null && limit.margin < tightK,
          ),
        ),
    );
    if (near.length < 2 || !tight) return [];
    return [
      {
        rule: 'near-corner',
        severity: 'note' as const,
        ref: regulator.ref,
        condition: null,
        message: `${regulator.ref} stands within ${edgeMm} mm of two edges and has less than ${tightK} K of margin.`,
        remedy: 'Away from the corner its heat spreads to more board.',
      },
    ];
  });
};
