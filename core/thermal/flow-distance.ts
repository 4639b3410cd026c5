import type { CellGrid } from './cell-grid.ts';

/** Distance of each cell's near and far side from the edge of the board that the air meets first, m. */
export function flowDistances(grid: CellGrid, towardDeg: number): { near: Float64Array; far: Float64Array } {
  const { columns, rows, dxMm, dyMm } = grid;
  const angle = (towardDeg * Math.PI) / 180;
  const [ux, uy] = [Math.cos(angle), Math.sin(angle)];
  const step = (Math.abs(ux) * dxMm + Math.abs(uy) * dyMm) * 1e-3;
  const near = new Float64Array(columns * rows);
  const far = new Float64Array(columns * rows);
  const upstream = (position: number, size: number, direction: number) =>
    Math.abs(direction) < 1e-9 ? Infinity : (direction > 0 ? position : size - position) / Math.abs(direction);
  for (let j = 0; j < rows; j++) {
    for (let i = 0; i < columns; i++) {
      const run = Math.min(upstream((i + 0.5) * dxMm, columns * dxMm, ux), upstream((j + 0.5) * dyMm, rows * dyMm, uy));
      const cell = j * columns + i;
      near[cell] = Math.max(0, run * 1e-3 - step / 2);
      far[cell] = near[cell]! + step;
    }
  }
  return { near, far };
}
