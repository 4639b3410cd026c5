import type { Board } from '#core/board/document.ts';
import { placedRectangle } from '#core/geometry/placed-rectangle.ts';
import { buildLinks, type LayeredNetwork } from '#core/numerics/layered-network.ts';
import { buildMultigrid, type Multigrid } from '#core/numerics/multigrid.ts';
import { boardLayers, type BoardLayers } from './board-layers.ts';
import { buildCellGrid, defaultCellMm, type CellGrid } from './cell-grid.ts';
import { cellWeights, type CellWeights } from './cell-weights.ts';
import { buildCopperMap, type CopperMap } from './copper-map.ts';
import { faceConductances } from './face-conductance.ts';
import { faces, type Face } from './film-areas.ts';
import { packageStar, type PackageNodes } from './package-star.ts';
import { viaPairs } from './via-pairs.ts';

/** A board as a conductance network without its films: built once, solved for every condition. */
export type BoardModel = {
  board: Board;
  grid: CellGrid;
  layers: BoardLayers;
  network: LayeredNetwork;
  multigrid: Multigrid;
  packages: PackageNodes[];
  sources: { ref: string; side: 'top' | 'bottom'; weights: CellWeights }[];
  sinks: { id: string; layer: number; conductanceWPerK: number; toC: number | 'ambient'; weights: CellWeights }[];
  top: Face;
  bottom: Face;
  /** Share of each cell that is board. */
  filled: Float64Array;
};

/**
 * @param options.cellMm cell size in mm; chosen from the board when left out
 * @throws BoardTooLarge beyond the stated maximum of unknowns
 */
export function buildBoardModel(board: Board, options: { cellMm?: number | undefined } = {}): BoardModel {
  const layers = boardLayers(board);
  const grid = buildCellGrid(board, options.cellMm ?? defaultCellMm(board, layers.count), layers.count);
  const map = buildCopperMap(board, grid);
  const filled = filledShares(map);
  const cells = grid.columns * grid.rows;
  const node = (cell: number, layer: number) => cell * layers.count + layer;
  const nodeOf = (cell: number, side: 'top' | 'bottom') => node(cell, side === 'top' ? 0 : layers.count - 1);

  const pairs: { a: number; b: number; g: number }[] = viaPairs(board, map, layers);
  const packages: PackageNodes[] = [];
  let next = cells * layers.count;
  for (const regulator of board.regulators) {
    const model = board.packages[board.parts[regulator.part]?.package ?? ''];
    if (!model) continue;
    const star = packageStar(board, map, regulator, model, next, nodeOf);
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
    multigrid: buildMultigrid(network),
    packages,
    sources,
    sinks,
    top,
    bottom,
    filled,
  };
}

function filledShares({ grid, inside }: CopperMap): Float64Array {
  const { columns, split } = grid;
  const filled = new Float64Array(columns * grid.rows);
  const subColumns = columns * split;
  for (let at = 0; at < inside.length; at++) {
    if (!inside[at]) continue;
    filled[Math.floor(Math.floor(at / subColumns) / split) * columns + Math.floor((at % subColumns) / split)]! += 1;
  }
  return filled.map((count) => count / (split * split));
}

function gridConductances(map: CopperMap, layers: BoardLayers, filled: Float64Array) {
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
