import { lateralShare } from '../coarsen.ts';
import { nodeCount, type LayeredNetwork } from '../layered-network.ts';
import type { RunningKernel } from './kernel.ts';
import { firstByte, levelBytes, type MemoryLayout } from './lay-out.ts';
import type { PackedLinks } from './packed-links.ts';
import { packing, type PlacedLevel } from './place-levels.ts';

/** Values of the first nodes to their places; the rest keep theirs. */
export function pack(places: Int32Array, from: Float64Array, to: Float64Array) {
  for (let n = 0; n < from.length; n++) to[places[n]!] = from[n]!;
}

export function narrow(from: Float64Array, to: Float32Array) {
  for (let n = 0; n < from.length; n++) to[n] = from[n]!;
}

/** Writes levels, links and conductances of a network into the kernel's memory and lets it build its coarser levels. */
export function writeNetwork(
  network: LayeredNetwork,
  levels: readonly PlacedLevel[],
  links: readonly PackedLinks[],
  places: Int32Array,
  laid: MemoryLayout,
  { kernel, buffer }: RunningKernel,
) {
  levels.forEach((level, depth) => {
    const at = laid.levels[depth]!;
    const link = links[depth]!;
    const { columns, rows, layers, stride, extras } = level;
    const record = [
      columns,
      rows,
      layers,
      stride,
      extras,
      at.east,
      at.north,
      at.below,
      at.anchor,
      at.diagonal,
      at.pivot,
    ];
    record.push(at.unknown, at.right, link.counts[0], link.counts[1]);
    record.push(at.linkNode, at.linkStart, at.linkTo, at.linkG, at.linkParent, at.linkSaved);
    new Int32Array(buffer, firstByte + depth * levelBytes, levelBytes / 4).set(record);
    new Int32Array(buffer, at.linkNode, link.node.length).set(link.node);
    new Int32Array(buffer, at.linkStart, link.start.length).set(link.start);
    new Int32Array(buffer, at.linkTo, link.to.length).set(link.to);
    new Float32Array(buffer, at.linkG, link.g.length).set(link.g);
    new Int32Array(buffer, at.linkParent, link.parent.length).set(link.parent);
  });
  const { length } = levels[0]!;
  for (const [from, single, double] of [
    [network.gx, laid.levels[0]!.east, laid.east],
    [network.gy, laid.levels[0]!.north, laid.north],
    [network.gz, laid.levels[0]!.below, laid.below],
  ] as const) {
    pack(places, from, new Float64Array(buffer, double, length));
    narrow(new Float64Array(buffer, double, length), new Float32Array(buffer, single, length));
  }
  new Float64Array(buffer, laid.linkG, links[0]!.g.length).set(links[0]!.g);
  const index = coarsestNodes(network, levels);
  new Int32Array(buffer, laid.index, laid.size).set(index);
  const rowOf = new Int32Array(buffer, laid.rowOf, levels.at(-1)!.length);
  index.forEach((place, row) => (rowOf[place] = row));
  kernel.setMatrix(firstByte, laid.east, laid.north, laid.below, laid.diagonal, laid.linkG, length);
  kernel.setHierarchy(firstByte, levels.length, laid.dense, laid.index, laid.rowOf, laid.size, laid.work);
  kernel.buildLevels(lateralShare);
}

/** Places of the coarsest level's real nodes. */
function coarsestNodes(network: LayeredNetwork, levels: readonly PlacedLevel[]): Int32Array {
  const level = levels.at(-1)!;
  const { columns, rows } = level;
  const none = new Float64Array(0);
  const links = { nodes: new Int32Array(0), start: new Int32Array(0), node: new Int32Array(0), g: none };
  const small = { ...network, columns, rows, gx: none, gy: none, gz: none, anchor: none, links };
  return packing(small, level).slice(0, nodeCount(small));
}
