import type { Ring } from '#core/geometry/polygon.ts';
import type { CopperMap } from './copper-map.ts';
import { scanFill } from './scan-fill.ts';

/** Share of a shape's area by cell; the shares sum to 1. Off the board: empty. */
export type CellWeights = { cell: Int32Array; weight: Float64Array; areaM2: number };

/**
 * Spreads shapes over the cells by their sub-cells on the board. A shape smaller than a sub-cell goes to the cell of its centre.
 * @param leave whether a sub-cell is left out
 */
export function cellWeights(
  map: CopperMap,
  shapes: readonly Ring[],
  leave?: (subCell: number) => boolean,
): CellWeights {
  const { grid, inside } = map;
  const { columns, split } = grid;
  const counts = new Map<number, number>();
  let total = 0;
  for (const shape of shapes) {
    let met = 0;
    scanFill(grid, [shape], (row, from, to) => {
      for (let column = from; column < to; column++) {
        const at = row * columns * split + column;
        if (!inside[at]) continue;
        met++;
        if (leave?.(at)) continue;
        const cell = Math.floor(row / split) * columns + Math.floor(column / split);
        counts.set(cell, (counts.get(cell) ?? 0) + 1);
        total++;
      }
    });
    if (met === 0) {
      const cell = centreCell(map, shape);
      if (cell === null) continue;
      counts.set(cell, (counts.get(cell) ?? 0) + 1);
      total++;
    }
  }
  const subArea = (grid.dxMm * grid.dyMm * 1e-6) / (split * split);
  return {
    cell: Int32Array.from(counts.keys()),
    weight: Float64Array.from(counts.values(), (count) => count / total),
    areaM2: total * subArea,
  };
}

function centreCell({ grid, inside }: CopperMap, shape: Ring): number | null {
  const x = shape.reduce((sum, point) => sum + point[0], 0) / shape.length;
  const y = shape.reduce((sum, point) => sum + point[1], 0) / shape.length;
  const i = Math.floor(((x - grid.x0Mm) / grid.dxMm) * grid.split);
  const j = Math.floor(((y - grid.y0Mm) / grid.dyMm) * grid.split);
  const subColumns = grid.columns * grid.split;
  if (i < 0 || j < 0 || i >= subColumns || j >= grid.rows * grid.split || !inside[j * subColumns + i]) return null;
  return Math.floor(j / grid.split) * grid.columns + Math.floor(i / grid.split);
}
