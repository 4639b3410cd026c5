import type { Ring } from '#core/geometry/polygon.ts';
import type { CellGrid } from './cell-grid.ts';

/**
 * Visits the runs of sub-cells whose centres lie inside the rings (even-odd, so that holes follow their outer ring).
 * @param visit row of sub-cells, first column, one past the last column
 */
export function scanFill(
  grid: CellGrid,
  rings: readonly Ring[],
  visit: (row: number, from: number, to: number) => void,
) {
  const columns = grid.columns * grid.split;
  const rows = grid.rows * grid.split;
  const sx = grid.dxMm / grid.split;
  const sy = grid.dyMm / grid.split;
  let low = Infinity;
  let high = -Infinity;
  for (const ring of rings) {
    for (const [, y] of ring) {
      low = Math.min(low, y);
      high = Math.max(high, y);
    }
  }
  const first = Math.max(0, Math.floor((low - grid.y0Mm) / sy));
  const last = Math.min(rows - 1, Math.ceil((high - grid.y0Mm) / sy));
  const crossings: number[] = [];
  for (let row = first; row <= last; row++) {
    const y = grid.y0Mm + (row + 0.5) * sy;
    crossings.length = 0;
    for (const ring of rings) {
      for (let i = 0, j = ring.length - 1; i < ring.length; j = i++) {
        const [ax, ay] = ring[j]!;
        const [bx, by] = ring[i]!;
        if (ay > y !== by > y) crossings.push(ax + ((bx - ax) * (y - ay)) / (by - ay));
      }
    }
    crossings.sort((a, b) => a - b);
    for (let k = 0; k + 1 < crossings.length; k += 2) {
      const from = Math.max(0, Math.ceil((crossings[k]! - grid.x0Mm) / sx - 0.5));
      const to = Math.min(columns, Math.ceil((crossings[k + 1]! - grid.x0Mm) / sx - 0.5));
      if (to > from) visit(row, from, to);
    }
  }
}
