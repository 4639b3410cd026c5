import type { HeatField } from '#core/thermal/heat-field.ts';

/** Temperature of the cell at a point of a layer, °C; null off the board or where the layer is not known. */
export function temperatureAt(
  field: HeatField,
  layerName: string,
  [xMm, yMm]: readonly [number, number],
): number | null {
  const layer = field.layers.find((candidate) => candidate.name === layerName);
  const column = cellOf(field.xEdgesMm, xMm);
  const row = cellOf(field.yEdgesMm, yMm);
  if (!layer || column === null || row === null) return null;
  const value = layer.temperatureC[row * field.columns + column] ?? NaN;
  return Number.isFinite(value) ? value : null;
}

/** Index of the cell that holds a place, by bisection; null outside. */
function cellOf(edgesMm: Float64Array, place: number): number | null {
  const last = edgesMm.length - 1;
  if (!(place >= (edgesMm[0] ?? NaN)) || !(place <= (edgesMm[last] ?? NaN))) return null;
  let low = 0;
  let high = last;
  while (high - low > 1) {
    const middle = (low + high) >> 1;
    if ((edgesMm[middle] ?? 0) <= place) low = middle;
    else high = middle;
  }
  return low;
}

/** Coolest and hottest cell of a layer, °C; null where there is no temperature. */
export function temperatureRange(field: HeatField, layerName: string): { minC: number; maxC: number } | null {
  const layer = field.layers.find((candidate) => candidate.name === layerName);
  let minC = Infinity;
  let maxC = -Infinity;
  for (const value of layer?.temperatureC ?? []) {
    if (value < minC) minC = value;
    if (value > maxC) maxC = value;
  }
  return maxC >= minC ? { minC, maxC } : null;
}
