/**
 * A resistor network on columns × rows × layers cells plus extra nodes: the symmetric positive definite M-matrix
 * A = Laplacian(conductances) + diag(anchor). Cell (i, j, l) is node (j·columns + i)·layers + l, so that a column of
 * layers is contiguous; extra nodes follow the cells.
 */
export type LayeredNetwork = {
  columns: number;
  rows: number;
  layers: number;
  extras: number;
  /** Conductance from node to its neighbour at i + 1, j + 1, l + 1, W/K; 0 at the far edges. */
  gx: Float64Array;
  gy: Float64Array;
  gz: Float64Array;
  /** Any other conductance, between two nodes that are no grid neighbours (or that need a second path). */
  links: Links;
  /** Conductance of each node to the reference, W/K; may be replaced between solutions. */
  anchor: Float64Array;
};

/** Compressed rows: the links of node n are entries start[n] … start[n + 1] − 1, each link stored at both ends. */
export type Links = { start: Int32Array; node: Int32Array; g: Float64Array };

export const cellCount = (network: LayeredNetwork) => network.columns * network.rows * network.layers;
export const nodeCount = (network: LayeredNetwork) => cellCount(network) + network.extras;

/** Compressed rows from a list of pairs; pairs of the same two nodes are added, a pair of one node with itself is dropped. */
export function buildLinks(nodes: number, pairs: readonly { a: number; b: number; g: number }[]): Links {
  const merged = new Map<number, number>();
  for (const { a, b, g } of pairs) {
    if (a === b || g === 0) continue;
    const key = Math.min(a, b) * nodes + Math.max(a, b);
    merged.set(key, (merged.get(key) ?? 0) + g);
  }
  const start = new Int32Array(nodes + 1);
  for (const key of merged.keys()) {
    start[Math.floor(key / nodes) + 1]!++;
    start[(key % nodes) + 1]!++;
  }
  for (let n = 0; n < nodes; n++) start[n + 1]! += start[n]!;
  const fill = start.slice();
  const node = new Int32Array(start[nodes]!);
  const g = new Float64Array(start[nodes]!);
  for (const [key, value] of merged) {
    const a = Math.floor(key / nodes);
    const b = key % nodes;
    node[fill[a]!] = b;
    g[fill[a]!++] = value;
    node[fill[b]!] = a;
    g[fill[b]!++] = value;
  }
  return { start, node, g };
}

/** Sum of the conductances at each node without its anchor, W/K. */
export function conductanceSums(network: LayeredNetwork): Float64Array {
  const { columns, layers, gx, gy, gz, links } = network;
  const sums = new Float64Array(nodeCount(network));
  const cells = cellCount(network);
  const sy = columns * layers;
  for (let n = 0; n < cells; n++) {
    const x = gx[n]!;
    const y = gy[n]!;
    const z = gz[n]!;
    sums[n]! += x + y + z;
    if (x) sums[n + layers]! += x;
    if (y) sums[n + sy]! += y;
    if (z) sums[n + 1]! += z;
  }
  for (let n = 0; n < sums.length; n++) {
    for (let k = links.start[n]!; k < links.start[n + 1]!; k++) sums[n]! += links.g[k]!;
  }
  return sums;
}

/** y = A·x, with `diagonal` = conductance sums + anchor. */
export function multiply(network: LayeredNetwork, diagonal: Float64Array, x: Float64Array, y: Float64Array) {
  const { columns, layers, gx, gy, gz, links } = network;
  const cells = cellCount(network);
  const sy = columns * layers;
  for (let n = 0; n < x.length; n++) y[n] = diagonal[n]! * x[n]!;
  for (let n = 0; n < cells; n++) {
    const here = x[n]!;
    const a = gx[n]!;
    const b = gy[n]!;
    const c = gz[n]!;
    if (a !== 0) {
      y[n]! -= a * x[n + layers]!;
      y[n + layers]! -= a * here;
    }
    if (b !== 0) {
      y[n]! -= b * x[n + sy]!;
      y[n + sy]! -= b * here;
    }
    if (c !== 0) {
      y[n]! -= c * x[n + 1]!;
      y[n + 1]! -= c * here;
    }
  }
  for (let n = 0; n < x.length; n++) {
    for (let k = links.start[n]!; k < links.start[n + 1]!; k++) y[n]! -= links.g[k]! * x[links.node[k]!]!;
  }
}
