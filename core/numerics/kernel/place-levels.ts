import { cellCount, type LayeredNetwork } from '../layered-network.ts';

/** Dimensions of one grid level, and where its arrays stand in the kernel's memory, bytes. */
export type PlacedLevel = {
  columns: number;
  rows: number;
  layers: number;
  extras: number;
  /** Cells of one colour in a row, rounded up to four. */
  stride: number;
  /** Cells with padding, and extra nodes, rounded up to four. */
  length: number;
  cells: number;
};

/** Place of a cell, or of an extra node, in the arrays of a level. */
export function packedIndex(level: PlacedLevel, node: number): number {
  const { columns, rows, layers, stride, cells } = level;
  const real = columns * rows * layers;
  if (node >= real) return cells + node - real;
  const l = node % layers;
  const column = (node - l) / layers;
  const i = column % columns;
  const j = (column - i) / columns;
  return ((((i + j) & 1) * layers + l) * rows + j) * stride + (i >> 1);
}

const roundUp = (value: number, to: number) => Math.ceil(value / to) * to;

/** Columns of the coarsest level at most: a dense factor of it costs less than the sweeps of one more level. */
const coarsestColumns = 12;

/** The levels of a network, from its own size down by 2 × 2 columns. */
export function placeLevels(network: LayeredNetwork): PlacedLevel[] {
  const levels: PlacedLevel[] = [];
  let { columns, rows } = network;
  const { layers, extras } = network;
  for (;;) {
    // One place more than a row needs, so that what stands before a row is padding.
    const stride = roundUp(Math.ceil(columns / 2) + 1, 4);
    const cells = 2 * layers * rows * stride;
    levels.push({ columns, rows, layers, extras, stride, cells, length: roundUp(cells + extras, 4) });
    if (columns * rows <= coarsestColumns) return levels;
    columns = (columns + 1) >> 1;
    rows = (rows + 1) >> 1;
  }
}

/** Place of every node of a network on its finest level, so that vectors are packed and unpacked by one loop. */
export function packing(network: LayeredNetwork, level: PlacedLevel): Int32Array {
  const { columns, rows, layers, stride, cells } = level;
  const real = cellCount(network);
  const places = new Int32Array(real + network.extras);
  const plane = rows * stride;
  for (let j = 0, node = 0; j < rows; j++) {
    for (let i = 0; i < columns; i++) {
      let place = ((i + j) & 1) * layers * plane + j * stride + (i >> 1);
      for (let l = 0; l < layers; l++, place += plane) places[node++] = place;
    }
  }
  for (let e = 0; e < network.extras; e++) places[real + e] = cells + e;
  return places;
}
