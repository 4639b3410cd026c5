import type { Board } from '#core/board/document.ts';
import type { CellGrid } from './cell-grid.ts';
import { growMask } from './grow-mask.ts';
import { placedLands } from './land-placement.ts';
import { clearanceMm, copperWPerMK, patternedShare } from './materials.ts';
import { scanFill } from './scan-fill.ts';
import { viaCentres } from './via-conductance.ts';

/** Copper of one layer on the sub-cells: net number (0: bare) and sheet conductance k·t, W/K. */
export type LayerCopper = { net: Int16Array; sheet: Float32Array };

/** Net-labelled copper of every layer on the sub-cells of a grid, row-major from the lowest y. */
export type CopperMap = {
  grid: CellGrid;
  /** 1 where there is board. */
  inside: Uint8Array;
  layers: LayerCopper[];
  /** Number of a net; copper of one net joins, of two nets never. */
  netNumber: (net: string) => number;
};

const traceNet = '\u0000traces';

/** Paints traces, planes, pours and lands, in this order; traces and planes keep their clearance to copper of other nets. */
export function buildCopperMap(board: Board, grid: CellGrid): CopperMap {
  const columns = grid.columns * grid.split;
  const size = columns * grid.rows * grid.split;
  const numbers = new Map<string, number>();
  const netNumber = (net: string) => {
    const known = numbers.get(net);
    if (known !== undefined) return known;
    numbers.set(net, numbers.size + 1);
    return numbers.size;
  };
  const inside = new Uint8Array(size);
  scanFill(grid, [board.outline.points], (row, from, to) => inside.fill(1, row * columns + from, row * columns + to));
  for (const cutout of board.outline.cutouts) {
    scanFill(grid, [cutout], (row, from, to) => inside.fill(0, row * columns + from, row * columns + to));
  }
  const lands = board.regulators.flatMap((regulator) => placedLands(board, regulator));
  const layers = board.stackup.copper.map((layer, index): LayerCopper => {
    const net = new Int16Array(size);
    const sheet = new Float32Array(size);
    const full = copperWPerMK * layer.thicknessUm * 1e-6;
    const paint = (row: number, from: number, to: number, number: number, value: number) => {
      for (let at = row * columns + from; at < row * columns + to; at++) {
        if (!inside[at] || (net[at] === number && sheet[at]! >= value)) continue;
        net[at] = number;
        sheet[at] = value;
      }
    };
    if (layer.traces && layer.traces.coverage > 0) {
      const barred = clearance(board, grid, inside, index, traceNet);
      const value = full * patternedShare(layer.traces.coverage);
      paintFree(paint, barred, columns, netNumber(traceNet), value);
    }
    if (layer.plane && layer.plane.coverage > 0) {
      const barred = planeBars(board, grid, inside, index, layer.plane.net, layer.plane.insetMm);
      const value = full * patternedShare(layer.plane.coverage);
      paintFree(paint, barred, columns, netNumber(layer.plane.net), value);
    }
    for (const pour of board.pours) {
      if (pour.layer !== layer.name || pour.coverage === 0) continue;
      const value = full * patternedShare(pour.coverage);
      const number = netNumber(pour.net);
      scanFill(grid, [pour.points, ...pour.holes], (row, from, to) => paint(row, from, to, number, value));
    }
    for (const land of lands) {
      if (land.layer !== index) continue;
      const number = netNumber(land.net);
      for (const pad of land.pads) scanFill(grid, [pad], (row, from, to) => paint(row, from, to, number, full));
    }
    return { net, sheet };
  });
  return { grid, inside, layers, netNumber };
}

type Paint = (row: number, from: number, to: number, number: number, value: number) => void;

function paintFree(paint: Paint, barred: Uint8Array, columns: number, number: number, value: number) {
  for (let at = 0; at < barred.length; at++) {
    if (!barred[at]) paint(Math.floor(at / columns), at % columns, (at % columns) + 1, number, value);
  }
}

/** Sub-cells that a plane must leave: its inset from every edge, and the clearance to copper of other nets on its layer. */
function planeBars(board: Board, grid: CellGrid, inside: Uint8Array, layer: number, net: string, insetMm: number) {
  const outside = inside.map((value) => 1 - value);
  const bars = clearance(board, grid, inside, layer, net);
  const edge = growMask(outside, grid.columns * grid.split, Math.round(insetMm / subCellMm(grid)), true);
  for (let at = 0; at < bars.length; at++) bars[at]! |= edge[at]!;
  return bars;
}

const subCellMm = (grid: CellGrid) => Math.max(grid.dxMm, grid.dyMm) / grid.split;

/** Sub-cells within the clearance of pours, lands and vias of other nets on a layer. */
function clearance(board: Board, grid: CellGrid, inside: Uint8Array, layer: number, net: string): Uint8Array {
  const columns = grid.columns * grid.split;
  const foreign = new Uint8Array(inside.length);
  const mark = (row: number, from: number, to: number) => foreign.fill(1, row * columns + from, row * columns + to);
  const layerName = board.stackup.copper[layer]!.name;
  for (const pour of board.pours) {
    if (pour.layer === layerName && pour.net !== net) scanFill(grid, [pour.points, ...pour.holes], mark);
  }
  for (const regulator of board.regulators) {
    for (const land of placedLands(board, regulator)) {
      if (land.layer === layer && land.net !== net) for (const pad of land.pads) scanFill(grid, [pad], mark);
    }
  }
  const order = board.stackup.copper.map((copper) => copper.name);
  for (const via of board.viaFields) {
    if (via.net === net || order.indexOf(via.from) > layer || order.indexOf(via.to) < layer) continue;
    const half = via.drillMm / 2 + via.platingUm * 1e-3;
    for (const [x, y] of viaCentres(via)) {
      scanFill(
        grid,
        [
          [
            [x - half, y - half],
            [x + half, y - half],
            [x + half, y + half],
            [x - half, y + half],
          ],
        ],
        mark,
      );
    }
  }
  return growMask(foreign, columns, Math.round(clearanceMm / subCellMm(grid)), false);
}
