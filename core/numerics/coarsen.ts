import { buildLinks, cellCount, nodeCount, type LayeredNetwork } from './layered-network.ts';

/** Lateral conductances of a coarse network are cut: piecewise constant transfer makes them too stiff (over-correction). */
export const lateralShare = 0.7;

/** Node of the coarse network that a node of the fine one is merged into; 2 × 2 columns, layers and extra nodes kept. */
export function coarseNode(fine: LayeredNetwork, coarseColumns: number, coarseCells: number): Int32Array {
  const { columns, rows, layers, extras } = fine;
  const map = new Int32Array(nodeCount(fine));
  for (let j = 0, n = 0; j < rows; j++) {
    for (let i = 0; i < columns; i++) {
      const base = ((j >> 1) * coarseColumns + (i >> 1)) * layers;
      for (let l = 0; l < layers; l++, n++) map[n] = base + l;
    }
  }
  const cells = cellCount(fine);
  for (let e = 0; e < extras; e++) map[cells + e] = coarseCells + e;
  return map;
}

/** The coarse network: vertical, link and anchor terms summed exactly, lateral terms summed and over-corrected. */
export function coarsen(fine: LayeredNetwork): { network: LayeredNetwork; parent: Int32Array } {
  const columns = (fine.columns + 1) >> 1;
  const rows = (fine.rows + 1) >> 1;
  const { layers, extras } = fine;
  const cells = columns * rows * layers;
  const parent = coarseNode(fine, columns, cells);
  const gx = new Float64Array(cells);
  const gy = new Float64Array(cells);
  const gz = new Float64Array(cells);
  const fineSy = fine.columns * layers;
  for (let n = 0; n < cellCount(fine); n++) {
    const to = parent[n]!;
    gz[to]! += fine.gz[n]!;
    if (fine.gx[n] && parent[n + layers] !== to) gx[to]! += lateralShare * fine.gx[n]!;
    if (fine.gy[n] && parent[n + fineSy] !== to) gy[to]! += lateralShare * fine.gy[n]!;
  }
  const pairs: { a: number; b: number; g: number }[] = [];
  const { start, node, g } = fine.links;
  for (let n = 0; n < nodeCount(fine); n++) {
    for (let k = start[n]!; k < start[n + 1]!; k++) {
      if (node[k]! > n) pairs.push({ a: parent[n]!, b: parent[node[k]!]!, g: g[k]! });
    }
  }
  const links = buildLinks(cells + extras, pairs);
  const network = { columns, rows, layers, extras, gx, gy, gz, links, anchor: new Float64Array(cells + extras) };
  return { network, parent };
}
