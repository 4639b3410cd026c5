import * as at from './level';
import { coarsen, coarsenAnchor, factor } from './build';
import { factorDirect, solveDirect } from './direct';
import { sweep, sweepExtras } from './smooth';
import { prolong, restrict } from './transfer';

/** The hierarchy in memory: records of levels one after the other, then what the coarsest level is solved with. */
let levels: usize = 0;
let count: i32 = 0;
let dense: usize = 0;
let index: usize = 0;
let rowOf: usize = 0;
let size: i32 = 0;
let work: usize = 0;

export function setHierarchy(first: usize, number: i32, factors: usize, nodes: usize, rows: usize, nodeCount: i32, space: usize): void {
  levels = first;
  count = number;
  dense = factors;
  index = nodes;
  rowOf = rows;
  size = nodeCount;
  work = space;
}

@inline
function level(depth: i32): usize {
  return levels + <usize>(depth * at.levelBytes);
}

/** Conductances of every coarser level from the finest. */
export function buildLevels(share: f32): void {
  for (let depth = 0; depth + 1 < count; depth++) coarsen(level(depth), level(depth + 1), share);
}

/** Anchors, diagonals and factors of every level from the finest level's anchors; false when not positive definite. */
export function refreshLevels(): bool {
  for (let depth = 0; depth < count; depth++) {
    factor(level(depth));
    if (depth + 1 < count) coarsenAnchor(level(depth), level(depth + 1));
  }
  return factorDirect(level(count - 1), dense, index, rowOf, size);
}

/** The level from which on the next one is visited twice. */
const twice: i32 = 1;

/**
 * One symmetric cycle with two sweeps before and two after; right side and unknowns stand on the finest level. From the second level
 * on the next one is visited twice, which costs little there and keeps errors that many levels share from adding up.
 * @param fresh whether the unknowns start from zero
 */
export function cycle(depth: i32, fresh: bool): void {
  const here = level(depth);
  if (depth == count - 1) {
    solveDirect(here, dense, index, size, work);
    return;
  }
  if (fresh) memory.fill(at.unknown(here), 0, 4 * <usize>(at.cells(here) + at.extras(here)));
  sweep(here, 0, fresh);
  sweep(here, 1, false);
  sweepExtras(here, false);
  sweep(here, 0, false);
  sweep(here, 1, false);
  sweepExtras(here, false);
  restrict(here, level(depth + 1));
  cycle(depth + 1, true);
  if (depth >= twice && depth + 2 < count) cycle(depth + 1, false);
  prolong(here, level(depth + 1));
  sweepExtras(here, true);
  sweep(here, 1, false);
  sweep(here, 0, false);
  sweepExtras(here, true);
  sweep(here, 1, false);
  sweep(here, 0, false);
}
