import type { Board } from '#core/board/document.ts';
import { boundsOf, polygonArea } from '#core/geometry/polygon.ts';

/** Uniform cells over the outline's bounding box, each split into `split` × `split` sub-cells for the copper's fine shape. */
export type CellGrid = {
  x0Mm: number;
  y0Mm: number;
  dxMm: number;
  dyMm: number;
  columns: number;
  rows: number;
  split: number;
};

/** Unknowns aimed at by the default cell size, and the most that are accepted at all. */
const usualUnknowns = 120_000;
export const maximumUnknowns = 2_500_000;
const finestCellMm = 0.25;
const finestSubCellMm = 0.14;

/** The board asks for more unknowns than the stated maximum. */
export class BoardTooLarge extends Error {
  override name = 'BoardTooLarge';
}

/** Cell size in mm that keeps a board near the usual number of unknowns; from 0.25 mm. */
export function defaultCellMm(board: Board, layers: number): number {
  const area = polygonArea(board.outline.points);
  return Math.max(finestCellMm, Math.sqrt((area * layers) / usualUnknowns));
}

/** @throws BoardTooLarge when columns × rows × layers passes `maximumUnknowns`. */
export function buildCellGrid(board: Board, cellMm: number, layers: number): CellGrid {
  const { minX, minY, maxX, maxY } = boundsOf(board.outline.points);
  const columns = Math.max(1, Math.ceil((maxX - minX) / cellMm - 1e-9));
  const rows = Math.max(1, Math.ceil((maxY - minY) / cellMm - 1e-9));
  const unknowns = columns * rows * layers;
  if (unknowns > maximumUnknowns) {
    throw new BoardTooLarge(
      `The board asks for ${unknowns} unknowns at a cell of ${cellMm} mm; at most ${maximumUnknowns} are solved. Use a larger cell.`,
    );
  }
  const split = Math.min(8, Math.max(2, 2 * Math.round(cellMm / finestSubCellMm / 2)));
  return { x0Mm: minX, y0Mm: minY, dxMm: (maxX - minX) / columns, dyMm: (maxY - minY) / rows, columns, rows, split };
}
