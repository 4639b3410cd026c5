import { cellCount, nodeCount, type LayeredNetwork } from './layered-network.ts';

/** Lines gathered into one chunk, so that a large system is never one string. */
const linesPerChunk = 20_000;

/**
 * A network as text in the Matrix Market exchange format (Boisvert, Pozo and Remington, NISTIR 5935, 1996): coordinate, real,
 * symmetric, the lower triangle by rows, every number with all its digits, so that another program solves the same system.
 * Conductances between the same two nodes are one entry; zeros are left out, the diagonal never is.
 * @param diagonal of the matrix, W/K: conductance sums + anchors, as given to `multiply`
 * @param comment lines for the head of the file, without their percent sign
 */
export function* matrixMarket(
  network: LayeredNetwork,
  diagonal: Float64Array,
  comment: readonly string[] = [],
): Generator<string> {
  const n = nodeCount(network);
  let entries = n;
  for (let row = 0; row < n; row++) entries += lowerRow(network, row).size;
  const lines = ['%%MatrixMarket matrix coordinate real symmetric', ...comment.map((line) => `% ${line}`)];
  lines.push(`${n} ${n} ${entries}`);
  for (let row = 0; row < n; row++) {
    for (const [column, g] of lowerRow(network, row)) lines.push(`${row + 1} ${column + 1} ${-g}`);
    lines.push(`${row + 1} ${row + 1} ${diagonal[row]!}`);
    if (lines.length >= linesPerChunk) yield `${lines.splice(0).join('\n')}\n`;
  }
  if (lines.length > 0) yield `${lines.join('\n')}\n`;
}

/** A vector in the same format: a dense array of one column. */
export function* vectorMarket(vector: Float64Array): Generator<string> {
  const lines = ['%%MatrixMarket matrix array real general', `${vector.length} 1`];
  for (const value of vector) {
    lines.push(String(value));
    if (lines.length >= linesPerChunk) yield `${lines.splice(0).join('\n')}\n`;
  }
  if (lines.length > 0) yield `${lines.join('\n')}\n`;
}

/** Conductances of a node to those before it, W/K, in the order of their numbers. */
function lowerRow(network: LayeredNetwork, row: number): Map<number, number> {
  const { columns, layers, gx, gy, gz, links } = network;
  const found: [number, number][] = [];
  if (row < cellCount(network)) {
    const alongY = columns * layers;
    if (row >= alongY) found.push([row - alongY, gy[row - alongY]!]);
    if (row >= layers) found.push([row - layers, gx[row - layers]!]);
    if (row >= 1) found.push([row - 1, gz[row - 1]!]);
  }
  for (let k = links.start[row]!; k < links.start[row + 1]!; k++) {
    if (links.node[k]! < row) found.push([links.node[k]!, links.g[k]!]);
  }
  const merged = new Map<number, number>();
  for (const [column, g] of found.sort((a, b) => a[0] - b[0])) {
    if (g !== 0) merged.set(column, (merged.get(column) ?? 0) + g);
  }
  return merged;
}
