import type { Board } from '#core/board/document.ts';
import type { BoardLayers } from './board-layers.ts';
import type { CopperMap } from './copper-map.ts';
import { barrelConductanceLength, viaCentres } from './via-conductance.ts';

/**
 * Barrels as conductances between the cells of the copper layers where they meet copper of their own net; layers of other
 * nets in between are passed through a clearance.
 */
export function viaPairs(board: Board, map: CopperMap, layers: BoardLayers): { a: number; b: number; g: number }[] {
  const { grid } = map;
  const order = board.stackup.copper.map((copper) => copper.name);
  const pairs: { a: number; b: number; g: number }[] = [];
  for (const via of board.viaFields) {
    const number = map.netNumber(via.net);
    const conductanceLength = barrelConductanceLength(via);
    const reach = via.drillMm / 2 + via.platingUm * 1e-3;
    for (const [x, y] of viaCentres(via)) {
      const i = Math.floor((x - grid.x0Mm) / grid.dxMm);
      const j = Math.floor((y - grid.y0Mm) / grid.dyMm);
      if (i < 0 || j < 0 || i >= grid.columns || j >= grid.rows) continue;
      const cell = j * grid.columns + i;
      let last = -1;
      for (let layer = order.indexOf(via.from); layer <= order.indexOf(via.to); layer++) {
        if (!meets(map, layer, number, x, y, reach)) continue;
        if (last >= 0) {
          const [a, b] = [layers.copper[last]!, layers.copper[layer]!];
          const length = layers.depth[b]! - layers.depth[a]!;
          pairs.push({ a: cell * layers.count + a, b: cell * layers.count + b, g: conductanceLength / length });
        }
        last = layer;
      }
    }
  }
  return pairs;
}

/** Whether copper of the net lies under the hole or at its rim. */
function meets(
  { grid, layers, inside }: CopperMap,
  layer: number,
  number: number,
  x: number,
  y: number,
  reach: number,
) {
  const { net } = layers[layer]!;
  const columns = grid.columns * grid.split;
  const rows = grid.rows * grid.split;
  for (const [dx, dy] of [
    [0, 0],
    [reach, 0],
    [-reach, 0],
    [0, reach],
    [0, -reach],
  ] as const) {
    const i = Math.floor(((x + dx - grid.x0Mm) / grid.dxMm) * grid.split);
    const j = Math.floor(((y + dy - grid.y0Mm) / grid.dyMm) * grid.split);
    if (i < 0 || j < 0 || i >= columns || j >= rows) continue;
    if (inside[j * columns + i] && net[j * columns + i] === number) return true;
  }
  return false;
}
