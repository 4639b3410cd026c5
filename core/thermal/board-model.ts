import type { Board } from '#core/board/document.ts';
import { placedRectangle } from '#core/geometry/placed-rectangle.ts';
import { networkSolver, type NetworkSolver } from '#core/numerics/kernel/network-solver.ts';
import { buildLinks, type LayeredNetwork } from '#core/numerics/layered-network.ts';
import { boardLayers, type BoardLayers } from './board-layers.ts';
import { buildCellGrid, defaultCellMm, type CellGrid } from './cell-grid.ts';
import { cellWeights, type CellWeights } from './cell-weights.ts';
import { buildCopperMap } from './copper-map.ts';
import { faces, type Face } from './film-areas.ts';
import { filledShares, gridConductances } from './grid-conductances.ts';
import { resolvedCells } from './land-correction.ts';
import { widenFaces, type LandCorrection } from './land-correction.ts';
import { landCorrections } from './land-corrections.ts';
import { packageStar, type PackageNodes } from './package-star.ts';
import { viaPairs } from './via-pairs.ts';

/** A board as a conductance network without its films: built once, solved for every condition. */
export type BoardModel = {
  board: Board;
  grid: CellGrid;
  layers: BoardLayers;
  network: LayeredNetwork;
  solver: NetworkSolver;
  /** The same board on cells of twice the size, once it was asked for; shared by all conditions. */
  coarser: BoardModel | null;
  packages: PackageNodes[];
  sources: { ref: string; side: 'top' | 'bottom'; weights: CellWeights }[];
  sinks: { id: string; layer: number; conductanceWPerK: number; toC: number | 'ambient'; weights: CellWeights }[];
  top: Face;
  bottom: Face;
  /** Share of each cell that is board. */
  filled: Float64Array;
  /** Whether lands are corrected for what the cells misjudge around them. */
  correctLands: boolean;
  /** Pads at least this wide are resolved by the cells and go uncorrected, mm. */
  resolvedMm: number;
};

/** Cells coarser than this are a preview, whose lands go uncorrected unless it is asked for, mm. */
const coarsestCorrectedMm = 1.1;

/**
 * @param options.cellMm cell size in mm; chosen from the board when left out
 * @param options.correctLands by default for cells up to 1.1 mm
 * @param options.resolvedMm by default eight cells; another grid's where two are compared, so that both treat each land alike
 * @throws BoardTooLarge beyond the stated maximum of unknowns
 */
export function buildBoardModel(
  board: Board,
  options: { cellMm?: number | undefined; correctLands?: boolean; resolvedMm?: number } = {},
): BoardModel {
  const layers = boardLayers(board);
  const grid = buildCellGrid(board, options.cellMm ?? defaultCellMm(board, layers.count), layers.count);
  const map = buildCopperMap(board, grid);
  const filled = filledShares(map);
  const cells = grid.columns * grid.rows;
  const node = (cell: number, layer: number) => cell * layers.count + layer;
  const nodeOf = (cell: number, side: 'top' | 'bottom') => node(cell, side === 'top' ? 0 : layers.count - 1);

  const pairs: { a: number; b: number; g: number }[] = viaPairs(board, map, layers);
  const packages: PackageNodes[] = [];
  const correctLands = options.correctLands ?? Math.max(grid.dxMm, grid.dyMm) <= coarsestCorrectedMm;
  const resolvedMm = options.resolvedMm ?? resolvedCells * Math.max(grid.dxMm, grid.dyMm);
  const corrections = correctLands
    ? landCorrections(board, grid, layers, resolvedMm)
    : new Map<string, Map<string, LandCorrection>>();
  let next = cells * layers.count;
  for (const regulator of board.regulators) {
    const model = board.packages[board.parts[regulator.part]?.package ?? ''];
    if (!model) continue;
    const star = packageStar(board, map, regulator, model, corrections, next, nodeOf);
    next += star.used;
    pairs.push(...star.pairs);
    packages.push(star.nodes);
  }
  const network: LayeredNetwork = {
    columns: grid.columns,
    rows: grid.rows,
    layers: layers.count,
    extras: next - cells * layers.count,
    ...gridConductances(map, layers, filled),
    links: buildLinks(next, pairs),
    anchor: new Float64Array(next),
  };
  for (const { ref, lands, side } of packages) {
    lands.forEach(({ name, weights }) => {
      const spread = corrections.get(ref)?.get(name)?.spread ?? 1;
      if (spread !== 1) widenFaces(network, weights, side === 'top' ? 0 : layers.count - 1, spread);
    });
  }
  const sources = board.sources.map((source) => ({
    ref: source.ref,
    side: source.side,
    weights: cellWeights(map, [placedRectangle(source, [0, 0], source.sizeMm)]),
  }));
  const sinks = board.sinks.map((sink) => ({
    id: sink.id,
    layer: layers.copper[board.stackup.copper.findIndex((copper) => copper.name === sink.layer)] ?? 0,
    conductanceWPerK: sink.conductanceWPerK,
    toC: sink.toC,
    weights: cellWeights(map, [placedRectangle({ at: sink.at, rotationDeg: 0, side: 'top' }, [0, 0], sink.sizeMm)]),
  }));
  const { top, bottom } = faces(board, map);
  return {
    board,
    grid,
    layers,
    network,
    solver: networkSolver(network),
    coarser: null,
    packages,
    sources,
    sinks,
    top,
    bottom,
    filled,
    correctLands,
    resolvedMm,
  };
}

/** Gives the memory of a model's solver back; the model is of no use afterwards. */
export function releaseBoardModel(model: BoardModel) {
  model.solver.release();
  if (model.coarser) releaseBoardModel(model.coarser);
}
