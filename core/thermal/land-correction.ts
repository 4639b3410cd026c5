import type { Board } from '#core/board/document.ts';
import { boundsOf } from '#core/geometry/polygon.ts';
import { networkSolver } from '#core/numerics/kernel/network-solver.ts';
import { buildLinks, type LayeredNetwork } from '#core/numerics/layered-network.ts';
import type { BoardLayers } from './board-layers.ts';
import type { CellGrid } from './cell-grid.ts';
import { cellWeights, type CellWeights } from './cell-weights.ts';
import { buildCopperMap } from './copper-map.ts';
import { filledShares, gridConductances } from './grid-conductances.ts';
import type { PlacedLand } from './land-placement.ts';
import { solderWPerM2K } from './materials.ts';
import { viaPairs } from './via-pairs.ts';

/** A pad at least this many cells wide is resolved: it needs no correction. */
export const resolvedCells = 8;
/** Board around the land that takes part, mm and cells. */
const marginMm = 2;
const marginCells = 3;
/** Cells of the fine patch, mm. */
const fineMm = 0.13;
/** Film on both faces of a patch, W/(m²·K): it hardly matters over a few millimetres. */
const patchFilm = 10;

/** What the cells around a land need: resistance in series with it, K/W, and a factor on the faces around it. */
export type LandCorrection = { kPerW: number; spread: number };

/** A correction may take this share of the package's own resistance away, not more. */
export const mostTaken = 0.9;

/**
 * What the cells of a grid misjudge of the spreading right under and around a land, K/W, to be added in series with it: the land's
 * own resistance to a cool rim a few millimetres away, on the board's true geometry in fine cells less that in the grid's cells.
 * The idea is the well index of reservoir simulation (Peaceman, SPE J. 18 (1978) 183). It vanishes as the cells shrink.
 * Where the cells hinder more than the package's own resistance can make up for (a land that fills one cell to its edges), the
 * faces around the land's cells are widened instead, until the grid's cells give the true resistance.
 * @param resolvedMm pads at least this wide go without
 */
export function landCorrection(
  board: Board,
  grid: CellGrid,
  layers: BoardLayers,
  land: PlacedLand,
  resolvedMm: number,
): LandCorrection {
  const smallest = Math.min(...land.land.pads.flatMap((pad) => pad.sizeMm));
  const cellMm = Math.max(grid.dxMm, grid.dyMm);
  const factor = Math.min(8, Math.ceil(cellMm / fineMm));
  if (smallest >= resolvedMm || factor < 2) return none;
  const coarse = patchGrid(grid, land.pads.flat());
  if (coarse === null) return none;
  const fine: CellGrid = {
    ...coarse,
    dxMm: coarse.dxMm / factor,
    dyMm: coarse.dyMm / factor,
    columns: coarse.columns * factor,
    rows: coarse.rows * factor,
    split: 2,
  };
  const rim = {
    left: coarse.x0Mm > grid.x0Mm + 1e-9,
    low: coarse.y0Mm > grid.y0Mm + 1e-9,
    right: coarse.x0Mm + coarse.columns * grid.dxMm < grid.x0Mm + grid.columns * grid.dxMm - 1e-9,
    high: coarse.y0Mm + coarse.rows * grid.dyMm < grid.y0Mm + grid.rows * grid.dyMm - 1e-9,
  };
  const wanted = ownResistance(board, fine, layers, land, rim);
  const on = (spread: number) => ownResistance(board, coarse, layers, land, rim, spread);
  const difference = wanted - on(1);
  if (!Number.isFinite(difference)) return none;
  if (difference >= -mostTaken * land.land.kPerW) return { kPerW: difference, spread: 1 };
  const spread = findSpread(on, wanted);
  return { kPerW: Math.max(-mostTaken * land.land.kPerW, wanted - on(spread)), spread };
}

const none: LandCorrection = { kPerW: 0, spread: 1 };
const mostSpread = 64;

/** Factor at which a resistance that falls with it meets the wanted one, by halving on a logarithmic scale; at most 64. */
function findSpread(resistance: (spread: number) => number, wanted: number): number {
  let [low, high] = [1, mostSpread];
  for (let step = 0; step < 12; step++) {
    const middle = Math.sqrt(low * high);
    if (resistance(middle) > wanted) low = middle;
    else high = middle;
  }
  return Math.sqrt(low * high);
}

/** Multiplies the in-plane conductances between a land's cells and the cells beside them, on the land's layer. */
export function widenFaces(
  { columns, rows, layers, gx, gy }: LayeredNetwork,
  land: CellWeights,
  layer: number,
  spread: number,
) {
  const own = new Set(land.cell);
  const widen = (faces: Float64Array, cell: number) => (faces[cell * layers + layer]! *= spread);
  for (const cell of own) {
    const i = cell % columns;
    if (i + 1 < columns && !own.has(cell + 1)) widen(gx, cell);
    if (i > 0 && !own.has(cell - 1)) widen(gx, cell - 1);
    if (cell + columns < columns * rows && !own.has(cell + columns)) widen(gy, cell);
    if (cell >= columns && !own.has(cell - columns)) widen(gy, cell - columns);
  }
}

/** The resistance is an energy of the field, so that its error is the square of this. */
const patchTolerance = 1e-3;

type Rim = { left: boolean; right: boolean; low: boolean; high: boolean };

/** The grid's own cells around the land. */
function patchGrid(grid: CellGrid, points: [number, number][]): CellGrid | null {
  const { minX, minY, maxX, maxY } = boundsOf(points);
  const [mx, my] = [grid.dxMm, grid.dyMm].map((cell) => Math.max(marginMm, marginCells * cell)) as [number, number];
  // A turned land may miss a line of the grid by rounding; that must not take in another row of cells.
  const below = (cells: number) => Math.floor(cells + 1e-6);
  const above = (cells: number) => Math.ceil(cells - 1e-6);
  const i0 = Math.max(0, below((minX - mx - grid.x0Mm) / grid.dxMm));
  const j0 = Math.max(0, below((minY - my - grid.y0Mm) / grid.dyMm));
  const i1 = Math.min(grid.columns, above((maxX + mx - grid.x0Mm) / grid.dxMm));
  const j1 = Math.min(grid.rows, above((maxY + my - grid.y0Mm) / grid.dyMm));
  if (i1 <= i0 || j1 <= j0) return null;
  return {
    ...grid,
    x0Mm: grid.x0Mm + i0 * grid.dxMm,
    y0Mm: grid.y0Mm + j0 * grid.dyMm,
    columns: i1 - i0,
    rows: j1 - j0,
  };
}

/** Rise of the land per watt put into it, with the rim of the patch held cool, K/W. */
function ownResistance(
  board: Board,
  grid: CellGrid,
  layers: BoardLayers,
  land: PlacedLand,
  rim: Rim,
  spread = 1,
): number {
  const map = buildCopperMap(board, grid);
  const weights = cellWeights(map, land.pads);
  if (weights.cell.length === 0) return NaN;
  const { columns, rows } = grid;
  const cells = columns * rows * layers.count;
  const offset = land.layer === 0 ? 0 : layers.count - 1;
  const slug = land.land.kind === 'tab' ? 1 : 0;
  const pairs = viaPairs(board, map, layers);
  weights.cell.forEach((cell, k) => {
    if (slug) {
      pairs.push({ a: cells, b: cell * layers.count + offset, g: solderWPerM2K * weights.areaM2 * weights.weight[k]! });
    }
  });
  const filled = filledShares(map);
  const network: LayeredNetwork = {
    columns,
    rows,
    layers: layers.count,
    extras: slug,
    ...gridConductances(map, layers, filled),
    links: buildLinks(cells + slug, pairs),
    anchor: new Float64Array(cells + slug),
  };
  if (spread !== 1) widenFaces(network, weights, offset, spread);
  anchorRim(network, rim);
  const face = patchFilm * grid.dxMm * grid.dyMm * 1e-6;
  for (let cell = 0; cell < columns * rows; cell++) {
    network.anchor[cell * layers.count]! += face * filled[cell]!;
    network.anchor[cell * layers.count + layers.count - 1]! += face * filled[cell]!;
  }
  const b = new Float64Array(cells + slug);
  if (slug) b[cells] = 1;
  else weights.cell.forEach((cell, k) => (b[cell * layers.count + offset] = weights.weight[k]!));
  const x = new Float64Array(b.length);
  const solver = networkSolver(network);
  const sound = solver.refresh();
  if (sound) solver.solve(b, x, { tolerance: patchTolerance, maximumIterations: 100 });
  solver.release();
  if (!sound) return NaN;
  let rise = 0;
  for (let k = 0; k < x.length; k++) rise += b[k]! * x[k]!;
  return rise;
}

/** Holds the outer side of the rim cells at zero through half a cell; sides where the board ends stay closed. */
function anchorRim({ columns, rows, layers, gx, gy, anchor }: LayeredNetwork, rim: Rim) {
  const at = (i: number, j: number, l: number) => (j * columns + i) * layers + l;
  for (let l = 0; l < layers; l++) {
    for (let j = 0; j < rows && columns > 1; j++) {
      if (rim.left) anchor[at(0, j, l)]! += 2 * gx[at(0, j, l)]!;
      if (rim.right) anchor[at(columns - 1, j, l)]! += 2 * gx[at(columns - 2, j, l)]!;
    }
    for (let i = 0; i < columns && rows > 1; i++) {
      if (rim.low) anchor[at(i, 0, l)]! += 2 * gy[at(i, 0, l)]!;
      if (rim.high) anchor[at(i, rows - 1, l)]! += 2 * gy[at(i, rows - 2, l)]!;
    }
  }
}
