import type { HeatField } from '#core/thermal/heat-field.ts';

/** A layer's cells with a rim of two, and every empty cell beside the board filled, so that bands reach the board's edge. */
export type PaddedGrid = { columns: number; rows: number; valuesC: number[]; xMm: Float64Array; yMm: Float64Array };

const rim = 2;

const made = new WeakMap<HeatField, Map<string, PaddedGrid | null>>();

/**
 * Made once per field and layer, as bands and isotherms both start from it.
 * @returns null when the field has no layer of that name or no temperature in it
 */
export function paddedGrid(field: HeatField, layerName: string): PaddedGrid | null {
  const ofField = made.get(field) ?? new Map<string, PaddedGrid | null>();
  made.set(field, ofField);
  const known = ofField.get(layerName);
  if (known !== undefined) return known;
  const grid = makeGrid(field, layerName);
  ofField.set(layerName, grid);
  return grid;
}

function makeGrid(field: HeatField, layerName: string): PaddedGrid | null {
  const layer = field.layers.find((candidate) => candidate.name === layerName);
  if (!layer) return null;
  const columns = field.columns + 2 * rim;
  const rows = field.rows + 2 * rim;
  const valuesC = Array.from({ length: columns * rows }, () => NaN);
  for (let row = 0; row < field.rows; row++) {
    for (let column = 0; column < field.columns; column++) {
      valuesC[(row + rim) * columns + column + rim] = layer.temperatureC[row * field.columns + column] ?? NaN;
    }
  }
  if (!valuesC.some((value) => Number.isFinite(value))) return null;
  for (let pass = 0; pass < rim; pass++) spread(valuesC, columns, rows);
  return { columns, rows, valuesC, xMm: centres(field.xEdgesMm), yMm: centres(field.yEdgesMm) };
}

const beside = [
  [1, 0],
  [-1, 0],
  [0, 1],
  [0, -1],
] as const;
const across = [
  [1, 1],
  [1, -1],
  [-1, 1],
  [-1, -1],
] as const;

/** Gives every empty cell the mean of the filled cells beside it; of those across a corner only where it has no other. */
function spread(valuesC: number[], columns: number, rows: number): void {
  const before = valuesC.slice();
  const meanOf = (column: number, row: number, steps: readonly (readonly [number, number])[]): number => {
    let sum = 0;
    let count = 0;
    for (const [dx, dy] of steps) {
      const [x, y] = [column + dx, row + dy];
      if (x < 0 || y < 0 || x >= columns || y >= rows) continue;
      const value = before[y * columns + x] ?? NaN;
      if (!Number.isFinite(value)) continue;
      sum += value;
      count++;
    }
    return count > 0 ? sum / count : NaN;
  };
  for (let row = 0; row < rows; row++) {
    for (let column = 0; column < columns; column++) {
      if (Number.isFinite(before[row * columns + column])) continue;
      const straight = meanOf(column, row, beside);
      valuesC[row * columns + column] = Number.isFinite(straight) ? straight : meanOf(column, row, across);
    }
  }
}

/** Cell centres with the rim, mm. */
function centres(edgesMm: Float64Array): Float64Array {
  const count = edgesMm.length - 1;
  const first = (edgesMm[1] ?? 0) - (edgesMm[0] ?? 0);
  const last = (edgesMm[count] ?? 0) - (edgesMm[count - 1] ?? 0);
  return Float64Array.from({ length: count + 2 * rim }, (_, place) => {
    const index = place - rim;
    if (index < 0) return (edgesMm[0] ?? 0) + (index + 0.5) * first;
    if (index >= count) return (edgesMm[count] ?? 0) + (index - count + 0.5) * last;
    return ((edgesMm[index] ?? 0) + (edgesMm[index + 1] ?? 0)) / 2;
  });
}
