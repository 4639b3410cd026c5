/** Temperatures of every copper layer on the cells of the board, for pictures, probes and isotherms. */
export type HeatField = {
  columns: number;
  rows: number;
  /** Cell borders in mm, rising: columns + 1 values (x) and rows + 1 values (y). */
  xEdgesMm: Float64Array;
  yEdgesMm: Float64Array;
  /** Top to bottom; °C per cell, row-major from the lowest y, NaN where there is no board. */
  layers: { name: string; temperatureC: Float32Array }[];
};
