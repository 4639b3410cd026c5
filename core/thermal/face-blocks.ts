import type { CellGrid } from './cell-grid.ts';

/** Blocks of cells that the air is followed over, mm: finer than its boundary layer is thick, coarser than copper needs. */
const blockMm = 1.5;

/** Cells of a face gathered into blocks. */
export type FaceBlocks = { grid: CellGrid; blockOf: Int32Array };

export function faceBlocks(grid: CellGrid): FaceBlocks {
  const size = Math.max(1, Math.round(blockMm / Math.max(grid.dxMm, grid.dyMm)));
  const columns = Math.ceil(grid.columns / size);
  const rows = Math.ceil(grid.rows / size);
  const blockOf = new Int32Array(grid.columns * grid.rows);
  for (let cell = 0; cell < blockOf.length; cell++) {
    const i = Math.floor((cell % grid.columns) / size);
    const j = Math.floor(Math.floor(cell / grid.columns) / size);
    blockOf[cell] = j * columns + i;
  }
  return { grid: { ...grid, columns, rows, dxMm: grid.dxMm * size, dyMm: grid.dyMm * size }, blockOf };
}

/** Sums of cell values by block. */
export function sumByBlock({ blockOf, grid }: FaceBlocks, values: ArrayLike<number>): Float64Array {
  const sums = new Float64Array(grid.columns * grid.rows);
  for (let cell = 0; cell < blockOf.length; cell++) sums[blockOf[cell]!]! += values[cell]!;
  return sums;
}
