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

/**
 * Compressed rows: the links of node n are entries start[n] … start[n + 1] − 1, each link stored at both ends; `nodes` lists
 * the nodes that have any.
 */
export type Links = { nodes: Int32Array; start: Int32Array; node: Int32Array; g: Float64Array };

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
  const nodesWith = Int32Array.from({ length: nodes }, (_, n) => n).filter((n) => start[n + 1]! > start[n]!);
  return { nodes: nodesWith, start, node, g };
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
  // Conductances are 0 at every far edge, so that inside the array no border needs a test.
  for (let n = sy; n < cells - sy; n++) {
    y[n] =
      diagonal[n]! * x[n]! -
      gx[n - layers]! * x[n - layers]! -
      gx[n]! * x[n + layers]! -
      gy[n - sy]! * x[n - sy]! -
      gy[n]! * x[n + sy]! -
      gz[n - 1]! * x[n - 1]! -
      gz[n]! * x[n + 1]!;
  }
  const rim = (from: number, to: number) => {
    for (let n = from; n < to; n++) {
      let s = diagonal[n]! * x[n]!;
      if (n >= layers) s -= gx[n - layers]! * x[n - layers]!;
      if (n + layers < cells) s -= gx[n]! * x[n + layers]!;
      if (n >= sy) s -= gy[n - sy]! * x[n - sy]!;
      if (n + sy < cells) s -= gy[n]! * x[n + sy]!;
      if (n >= 1) s -= gz[n - 1]! * x[n - 1]!;
      if (n + 1 < cells) s -= gz[n]! * x[n + 1]!;
      y[n] = s;
    }
  };
  rim(0, Math.min(sy, cells));
  rim(Math.max(sy, cells - sy), cells);
  for (let n = cells; n < x.length; n++) y[n] = diagonal[n]! * x[n]!;
  const { nodes, start, node, g } = links;
  for (let at = 0; at < nodes.length; at++) {
    const n = nodes[at]!;
    let s = 0;
    for (let k = start[n]!; k < start[n + 1]!; k++) s += g[k]! * x[node[k]!]!;
    y[n]! -= s;
  }
}
