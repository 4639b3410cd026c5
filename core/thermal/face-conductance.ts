import type { CopperMap, LayerCopper } from './copper-map.ts';

/** In-plane conductances of one copper layer between neighbouring cells, W/K: x faces (columns − 1 used per row) and y faces. */
export type FaceConductances = { gx: Float64Array; gy: Float64Array };

/**
 * Each face from the fine geometry between the two cell centres, in its own direction: the geometric mean of the lower
 * bound (sub-cells in series along each line, lines in parallel) and the upper bound (across in parallel, then in series).
 * The two are the classical bounds of a resistor network (isothermal against adiabatic cuts); a slot becomes one weak
 * face, a trace conducts along and not across. Where two sub-cells belong to different nets the step between them is laminate.
 * @param laminate sheet conductance of the laminate's share, W/K, everywhere on the board
 */
export function faceConductances(map: CopperMap, layer: LayerCopper, laminate: number): FaceConductances {
  const { columns, rows, split, dxMm, dyMm } = map.grid;
  const gx = new Float64Array(columns * rows);
  const gy = new Float64Array(columns * rows);
  const subColumns = columns * split;
  const half = split / 2;
  for (let j = 0; j < rows; j++) {
    for (let i = 0; i < columns; i++) {
      const start = j * split * subColumns + i * split;
      if (i + 1 < columns) {
        gx[j * columns + i] = between(map, layer, laminate, start + half, 1, subColumns) * (dyMm / dxMm);
      }
      if (j + 1 < rows) {
        gy[j * columns + i] = between(map, layer, laminate, start + half * subColumns, subColumns, 1) * (dxMm / dyMm);
      }
    }
  }
  return { gx, gy };
}

/** Conductance of the split × split sub-cells from `start`, along `along`, as if they were square. */
function between(
  map: CopperMap,
  { net, sheet }: LayerCopper,
  laminate: number,
  start: number,
  along: number,
  across: number,
) {
  const { inside } = map;
  const n = map.grid.split;
  let lower = 0;
  let upperResistance = 0;
  for (let line = 0; line < n; line++) {
    let resistance = 0;
    let at = start + line * across;
    for (let step = 0; step < n; step++, at += along) {
      if (!inside[at]) {
        resistance = Infinity;
        break;
      }
      resistance += 1 / (sheet[at]! + laminate);
      if (step > 0 && parted(net[at - along]!, net[at]!)) resistance += 1 / laminate;
    }
    lower += 1 / resistance;
  }
  if (lower === 0) return 0;
  for (let step = 0; step < n; step++) {
    let conductance = 0;
    let joined = step === 0;
    let at = start + step * along;
    for (let line = 0; line < n; line++, at += across) {
      if (!inside[at]) continue;
      conductance += sheet[at]! + laminate;
      if (!joined && inside[at - along] && !parted(net[at - along]!, net[at]!)) joined = true;
    }
    upperResistance += 1 / conductance + (joined ? 0 : 1 / (n * laminate));
  }
  return Math.sqrt(lower / upperResistance);
}

/** Copper of two nets that touches on the raster is parted by a gap that the raster is too coarse to show. */
const parted = (a: number, b: number) => a !== b && a !== 0 && b !== 0;
