import type { LayeredNetwork } from '../layered-network.ts';
import { packedIndex, type PlacedLevel } from './place-levels.ts';

/** Links of one level: nodes of colour 0, of colour 1, then all extra nodes, with their links as compressed rows of packed places. */
export type PackedLinks = {
  /** Number of linked cells by colour. */
  counts: [number, number];
  node: Int32Array;
  start: Int32Array;
  to: Int32Array;
  g: Float64Array;
  /** Place of each listed node's merged node on the next level; empty on the coarsest. */
  parent: Int32Array;
};

type Entry = { node: number; to: Map<number, number> };

/** Links of every level: cells merged 2 × 2, links of merged nodes summed, those within one node dropped. */
export function packLinks(network: LayeredNetwork, levels: readonly PlacedLevel[]): PackedLinks[] {
  const { nodes, start, node, g } = network.links;
  let entries = new Map<number, Map<number, number>>();
  for (const n of nodes) {
    const to = new Map<number, number>();
    for (let k = start[n]!; k < start[n + 1]!; k++) to.set(node[k]!, (to.get(node[k]!) ?? 0) + g[k]!);
    entries.set(n, to);
  }
  return levels.map((level, depth) => {
    const coarse = levels[depth + 1];
    const packed = packLevel(level, entries, coarse);
    if (coarse) entries = merge(level, coarse, entries);
    return packed;
  });
}

function merged(level: PlacedLevel, coarse: PlacedLevel, node: number): number {
  const { columns, rows, layers } = level;
  const cells = columns * rows * layers;
  if (node >= cells) return node - cells + coarse.columns * coarse.rows * layers;
  const l = node % layers;
  const column = (node - l) / layers;
  const i = column % columns;
  const j = (column - i) / columns;
  return ((j >> 1) * coarse.columns + (i >> 1)) * layers + l;
}

function merge(level: PlacedLevel, coarse: PlacedLevel, entries: Map<number, Map<number, number>>) {
  const result = new Map<number, Map<number, number>>();
  for (const [node, links] of entries) {
    const a = merged(level, coarse, node);
    const row = result.get(a) ?? new Map<number, number>();
    result.set(a, row);
    for (const [other, g] of links) {
      const b = merged(level, coarse, other);
      if (b !== a) row.set(b, (row.get(b) ?? 0) + g);
    }
  }
  return result;
}

function packLevel(
  level: PlacedLevel,
  entries: Map<number, Map<number, number>>,
  coarse: PlacedLevel | undefined,
): PackedLinks {
  const cells = level.columns * level.rows * level.layers;
  const lists: [Entry[], Entry[]] = [[], []];
  for (const [node, to] of entries) {
    if (node >= cells) continue;
    const column = Math.floor(node / level.layers);
    const colour = ((column % level.columns) + Math.floor(column / level.columns)) & 1;
    lists[colour as 0 | 1].push({ node, to });
  }
  const extras = Array.from({ length: level.extras }, (_, k): Entry => {
    return { node: cells + k, to: entries.get(cells + k) ?? new Map<number, number>() };
  });
  const all = [...lists[0], ...lists[1], ...extras];
  const start = new Int32Array(all.length + 1);
  all.forEach((entry, t) => (start[t + 1] = start[t]! + entry.to.size));
  const to = new Int32Array(start[all.length]!);
  const g = new Float64Array(to.length);
  all.forEach((entry, t) => {
    let q = start[t]!;
    for (const [other, value] of entry.to) {
      to[q] = packedIndex(level, other);
      g[q++] = value;
    }
  });
  return {
    counts: [lists[0].length, lists[1].length],
    node: Int32Array.from(all, (entry) => packedIndex(level, entry.node)),
    start,
    to,
    g,
    parent: coarse
      ? Int32Array.from(all, (entry) => packedIndex(coarse, merged(level, coarse, entry.node)))
      : new Int32Array(0),
  };
}
