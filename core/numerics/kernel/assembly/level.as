/**
 * One grid level in memory: a record of 32-bit words that the host writes, followed anywhere by its arrays (single precision).
 * Columns are coloured like a chess board, c = (i + j) mod 2, and cell (i, j, l) stands at ((c·layers + l)·rows + j)·stride + (i ≫ 1),
 * so that all neighbours of a row of one colour are rows of the other; extra nodes follow the cells. Padding holds zeros, and
 * every array has a guard of a row before and behind, so that no border needs a test.
 */
@inline export function columns(level: usize): i32 { return load<i32>(level, 0); }
@inline export function rows(level: usize): i32 { return load<i32>(level, 4); }
@inline export function layers(level: usize): i32 { return load<i32>(level, 8); }
/** Cells of one colour in a row, rounded up to four. */
@inline export function stride(level: usize): i32 { return load<i32>(level, 12); }
@inline export function extras(level: usize): i32 { return load<i32>(level, 16); }
/** Conductances to the neighbours at i + 1, j + 1 and l + 1. */
@inline export function east(level: usize): usize { return load<u32>(level, 20); }
@inline export function north(level: usize): usize { return load<u32>(level, 24); }
@inline export function below(level: usize): usize { return load<u32>(level, 28); }
@inline export function anchor(level: usize): usize { return load<u32>(level, 32); }
@inline export function diagonal(level: usize): usize { return load<u32>(level, 36); }
/** 1/d of the LDLᵀ factors of every column of layers. */
@inline export function pivot(level: usize): usize { return load<u32>(level, 40); }
@inline export function unknown(level: usize): usize { return load<u32>(level, 44); }
@inline export function right(level: usize): usize { return load<u32>(level, 48); }
/** Nodes that have links: first those of colour 0, then of colour 1, then all extra nodes. */
@inline export function linked(level: usize, colour: i32): i32 { return load<i32>(level + 4 * colour, 52); }
@inline export function linkNode(level: usize): usize { return load<u32>(level, 60); }
@inline export function linkStart(level: usize): usize { return load<u32>(level, 64); }
@inline export function linkTo(level: usize): usize { return load<u32>(level, 68); }
@inline export function linkG(level: usize): usize { return load<u32>(level, 72); }
/** Node of the coarser level that each listed node is merged into. */
@inline export function linkParent(level: usize): usize { return load<u32>(level, 76); }
@inline export function linkSaved(level: usize): usize { return load<u32>(level, 80); }

export const levelBytes: i32 = 96;

@inline export function plane(level: usize): i32 { return rows(level) * stride(level); }
@inline export function cells(level: usize): i32 { return 2 * layers(level) * plane(level); }
/** Whether cells of a colour in row j have even i, so that their western neighbour stands one place back. */
@inline export function evenRow(j: i32, colour: i32): i32 { return 1 - ((j + colour) & 1); }
