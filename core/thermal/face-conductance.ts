import type { CopperMap, LayerCopper } from './copper-map.ts';
import { clearanceMm } from './materials.ts';

/** In-plane conductances of one copper layer between neighbouring cells, W/K: x faces (columns − 1 used per row) and y faces. */
export type FaceConductances = { gx: Float64Array; gy: Float64Array };

/**
 * Each face from the fine geometry between the two cell centres, in its own direction: the geometric mean of the lower
 * bound (sub-cells in series along each line, lines in parallel) and the upper bound (across in parallel, then in series).
 * The two are the classical bounds of a resistor network (isothermal against adiabatic cuts); a slot becomes one weak
 * face, a trace conducts along and not across. Where two sub-cells belong to different nets the step between them is a gap of laminate.
 * @param laminate sheet conductance of the laminate's share, W/K, everywhere on the board
 */
export function faceConductances(map: CopperMap, layer: LayerCopper, laminate: number): FaceConductances {
  const { columns, rows, split, dxMm, dyMm } = map.grid;
  const gx = new Float64Array(columns * rows);
  const gy = new Float64Array(columns * rows);
  const subColumns = columns * split;
  const half = split / 2;
  const same = uniformCells(map, layer);
  const alike = (a: number, b: number) => same[a] === same[b] && layer.net[first(a)] === layer.net[first(b)];
  const first = (cell: number) => Math.floor(cell / columns) * split * subColumns + (cell % columns) * split;
  // A gap is as wide as the clearance, however fine the sub-cells that show it as a mere step are.
  const gapX = (clearanceMm * split) / dxMm / laminate;
  const gapY = (clearanceMm * split) / dyMm / laminate;
  for (let j = 0; j < rows; j++) {
    for (let i = 0; i < columns; i++) {
      const start = j * split * subColumns + i * split;
      const cell = j * columns + i;
      if (i + 1 < columns) {
        // Most faces lie in plain copper or bare laminate, where the fine geometry has nothing to say.
        if (alike(cell, cell + 1)) gx[cell] = (same[cell]! + laminate) * (dyMm / dxMm);
        else gx[cell] = between(map, layer, laminate, gapX, start + half, 1, subColumns) * (dyMm / dxMm);
      }
      if (j + 1 < rows) {
        if (alike(cell, cell + columns)) gy[cell] = (same[cell]! + laminate) * (dxMm / dyMm);
        else gy[cell] = between(map, layer, laminate, gapY, start + half * subColumns, subColumns, 1) * (dxMm / dyMm);
      }
    }
  }
  return { gx, gy };
}

/** Sheet conductance of the cells that are board, of one net and of one sheet throughout; NaN for the others. */
function uniformCells({ grid, inside }: CopperMap, { net, sheet }: LayerCopper): Float64Array {
  const { columns, rows, split } = grid;
  const subColumns = columns * split;
  const same = new Float64Array(columns * rows);
  for (let cell = 0; cell < same.length; cell++) {
    const start = Math.floor(cell / columns) * split * subColumns + (cell % columns) * split;
    const [s, n] = [sheet[start]!, net[start]!];
    let plain = true;
    for (let line = 0; line < split && plain; line++) {
      const end = start + line * subColumns + split;
      for (let at = end - split; at < end; at++) {
        if (sheet[at] !== s || net[at] !== n || !inside[at]) {
          plain = false;
          break;
        }
      }
    }
    same[cell] = plain ? s : NaN;
  }
  return same;
}

/** Conductance of the split × split sub-cells from `start`, along `along`, as if they were square; `gap` is the resistance of a gap one sub-cell long. */
function between(
  map: CopperMap,
  { net, sheet }: LayerCopper,
  laminate: number,
  gap: number,
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
      if (parted(net[at - along]!, net[at]!)) resistance += step > 0 ? gap : gap / 2;
    }
    // A step right at a cell centre belongs half to each side.
    if (parted(net[at - along]!, net[at]!)) resistance += gap / 2;
    lower += 1 / resistance;
  }
  if (lower === 0) return 0;
  for (let step = 0; step <= n; step++) {
    let conductance = 0;
    let joined = false;
    let at = start + step * along;
    for (let line = 0; line < n; line++, at += across) {
      if (!inside[at]) continue;
      conductance += sheet[at]! + laminate;
      if (!joined && inside[at - along] && !parted(net[at - along]!, net[at]!)) joined = true;
    }
    if (step < n) upperResistance += 1 / conductance;
    if (!joined) upperResistance += (step > 0 && step < n ? gap : gap / 2) / n;
  }
  return Math.sqrt(lower / upperResistance);
}

/** Copper of two nets that touches on the raster is parted by a gap that the raster is too coarse to show. */
const parted = (a: number, b: number) => a !== b && a !== 0 && b !== 0;
