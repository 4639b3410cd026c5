import type { BoardLayers } from './board-layers.ts';
import type { CopperMap } from './copper-map.ts';
import { faceConductances } from './face-conductance.ts';

/** Share of each cell that is board. */
export function filledShares({ grid, inside }: CopperMap): Float64Array {
  const { columns, split } = grid;
  const filled = new Float64Array(columns * grid.rows);
  const subColumns = columns * split;
  for (let at = 0; at < inside.length; at++) {
    if (!inside[at]) continue;
    filled[Math.floor(Math.floor(at / subColumns) / split) * columns + Math.floor((at % subColumns) / split)]! += 1;
  }
  return filled.map((count) => count / (split * split));
}

/** Conductances between the cells of a grid, in plane and through, W/K. */
export function gridConductances(map: CopperMap, layers: BoardLayers, filled: Float64Array) {
  const { columns, rows, dxMm, dyMm } = map.grid;
  const size = columns * rows * layers.count;
  const [gx, gy, gz] = [new Float64Array(size), new Float64Array(size), new Float64Array(size)];
  const area = dxMm * dyMm * 1e-6;
  const bare = { net: new Int16Array(map.inside.length), sheet: new Float32Array(map.inside.length) };
  for (let l = 0; l < layers.count; l++) {
    const copper = map.layers[layers.copper.indexOf(l)] ?? bare;
    const face = faceConductances(map, copper, Math.max(layers.laminate[l]!, 1e-7));
    for (let cell = 0; cell < columns * rows; cell++) {
      const n = cell * layers.count + l;
      gx[n] = face.gx[cell]!;
      gy[n] = face.gy[cell]!;
      if (l + 1 < layers.count) gz[n] = layers.through[l]! * area * filled[cell]!;
    }
  }
  return { gx, gy, gz };
}
