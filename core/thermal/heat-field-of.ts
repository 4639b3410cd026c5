import { celsiusOffset } from '#core/units.ts';
import type { BoardModel } from './board-model.ts';
import type { HeatField } from './heat-field.ts';
import type { Rises } from './solve-rises.ts';

/** Temperatures of every copper layer as a picture of cells. */
export function heatField(model: BoardModel, { rise, ambientK }: Rises): HeatField {
  const { grid, layers, filled, board } = model;
  const edges = (count: number, start: number, step: number) =>
    Float64Array.from({ length: count + 1 }, (_, k) => start + k * step);
  return {
    columns: grid.columns,
    rows: grid.rows,
    xEdgesMm: edges(grid.columns, grid.x0Mm, grid.dxMm),
    yEdgesMm: edges(grid.rows, grid.y0Mm, grid.dyMm),
    layers: board.stackup.copper.map((copper, index) => ({
      name: copper.name,
      temperatureC: Float32Array.from(filled, (share, cell) =>
        share > 0 ? rise[cell * layers.count + layers.copper[index]!]! + ambientK - celsiusOffset : NaN,
      ),
    })),
  };
}
