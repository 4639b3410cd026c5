import type { PackedLinks } from './packed-links.ts';
import type { PlacedLevel } from './place-levels.ts';

/** Records of the levels start here; below, the compiled code may keep its own constants. */
export const firstByte = 1024;
export const levelBytes = 96;

export type MemoryLayout = ReturnType<typeof layOut>;

/** Addresses of everything in memory. */
export function layOut(levels: readonly PlacedLevel[], links: readonly PackedLinks[]) {
  let next = firstByte + levels.length * levelBytes;
  const place = (bytes: number, guard = 0) => {
    next = Math.ceil((next + guard) / 16) * 16;
    const at = next;
    next += bytes + guard;
    return at;
  };
  const placed = levels.map((level, depth) => {
    const guard = 8 * (level.stride + 4);
    const single = () => place(4 * level.length, guard);
    const { node, to } = links[depth]!;
    return {
      east: single(),
      north: single(),
      below: single(),
      anchor: single(),
      diagonal: single(),
      pivot: single(),
      unknown: single(),
      right: single(),
      linkNode: place(4 * node.length),
      linkStart: place(4 * node.length + 4),
      linkTo: place(4 * to.length),
      linkG: place(4 * to.length),
      linkParent: place(4 * node.length),
      linkSaved: place(4 * node.length),
    };
  });
  const finest = levels[0]!;
  const guard = 16 * (finest.stride + 4);
  const double = () => place(8 * finest.length, guard);
  const coarsest = levels.at(-1)!;
  const size = coarsest.columns * coarsest.rows * coarsest.layers + coarsest.extras;
  const result = {
    levels: placed,
    east: double(),
    north: double(),
    below: double(),
    diagonal: double(),
    linkG: place(8 * links[0]!.g.length),
    b: double(),
    x: double(),
    r: double(),
    p: double(),
    q: double(),
    size,
    dense: place(8 * size * size),
    index: place(4 * size),
    rowOf: place(4 * coarsest.length),
    work: place(8 * size),
  };
  return { ...result, bytes: next + 65_536 };
}
