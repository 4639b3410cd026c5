import * as at from './level';

/** Right side of one layer of four cells, with what their neighbours of the other colour give them. */
@inline
function gathered(b: usize, x: usize, e: usize, n: usize, own: usize, west: usize, middle: usize, easterly: usize, row: usize): v128 {
  let s = v128.load(b + own);
  s = f32x4.add(s, f32x4.mul(v128.load(e + west), v128.load(x + west)));
  s = f32x4.add(s, f32x4.mul(v128.load(e + own), v128.load(x + easterly)));
  s = f32x4.add(s, f32x4.mul(v128.load(n + middle - row), v128.load(x + middle - row)));
  return f32x4.add(s, f32x4.mul(v128.load(n + own), v128.load(x + middle + row)));
}

/**
 * Half a sweep of red-black line Gauss–Seidel: every column of layers of one colour is solved exactly, its neighbours held.
 * @param fresh whether all unknowns are still 0, so that neighbours need not be read
 */
export function sweep(level: usize, colour: i32, fresh: bool): void {
  const layers = at.layers(level), rows = at.rows(level), stride = at.stride(level), plane = at.plane(level);
  const e = at.east(level), n = at.north(level), z = at.below(level), pivot = at.pivot(level);
  const x = at.unknown(level), b = at.right(level);
  if (!fresh) addLinks(level, colour);
  const row = <usize>(4 * stride), layer = <usize>(4 * plane);
  for (let j = 0; j < rows; j++) {
    const back: usize = at.evenRow(j, colour) ? 4 : 0;
    let own = <usize>(4 * (colour * layers * plane + j * stride));
    let other = <usize>(4 * ((1 - colour) * layers * plane + j * stride));
    for (let k = 0; k < stride; k += 4) {
      let p = own, o = other;
      let s = fresh ? v128.load(b + p) : gathered(b, x, e, n, p, o - back, o, o + 4 - back, row);
      let carried = f32x4.mul(s, v128.load(pivot + p));
      v128.store(x + p, carried);
      for (let l = 1; l < layers; l++) {
        p += layer;
        o += layer;
        s = fresh ? v128.load(b + p) : gathered(b, x, e, n, p, o - back, o, o + 4 - back, row);
        s = f32x4.add(s, f32x4.mul(v128.load(z + p - layer), carried));
        carried = f32x4.mul(s, v128.load(pivot + p));
        v128.store(x + p, carried);
      }
      for (let l = 1; l < layers; l++) {
        p -= layer;
        carried = f32x4.add(v128.load(x + p), f32x4.mul(f32x4.mul(v128.load(z + p), v128.load(pivot + p)), carried));
        v128.store(x + p, carried);
      }
      own += 16;
      other += 16;
    }
  }
  if (!fresh) restoreLinks(level, colour);
}

/** Links stay on the right side with the values from before the sweep, which keeps the sweep symmetric. */
function addLinks(level: usize, colour: i32): void {
  const first = colour ? at.linked(level, 0) : 0, count = at.linked(level, colour);
  const node = at.linkNode(level), saved = at.linkSaved(level), b = at.right(level);
  for (let t = first; t < first + count; t++) {
    const place = b + 4 * <usize>load<i32>(node + 4 * t);
    const before = load<f32>(place);
    store<f32>(saved + 4 * t, before);
    store<f32>(place, before + linkSum(level, t));
  }
}

function restoreLinks(level: usize, colour: i32): void {
  const first = colour ? at.linked(level, 0) : 0, count = at.linked(level, colour);
  const node = at.linkNode(level), saved = at.linkSaved(level), b = at.right(level);
  for (let t = first; t < first + count; t++) {
    store<f32>(b + 4 * <usize>load<i32>(node + 4 * t), load<f32>(saved + 4 * t));
  }
}

/** Σ g·x over the links of entry t of the list. */
export function linkSum(level: usize, t: i32): f32 {
  const start = at.linkStart(level), to = at.linkTo(level), g = at.linkG(level), x = at.unknown(level);
  let s: f32 = 0;
  const end = load<i32>(start + 4 * t + 4);
  for (let q = load<i32>(start + 4 * t); q < end; q++) {
    s += load<f32>(g + 4 * q) * load<f32>(x + 4 * <usize>load<i32>(to + 4 * q));
  }
  return s;
}

/** Gauss–Seidel over the extra nodes, forward or backward. */
export function sweepExtras(level: usize, backward: bool): void {
  const first = at.linked(level, 0) + at.linked(level, 1), count = at.extras(level), cells = at.cells(level);
  const x = at.unknown(level), b = at.right(level), pivot = at.pivot(level);
  for (let k = 0; k < count; k++) {
    const one = backward ? count - 1 - k : k;
    const place = 4 * <usize>(cells + one);
    store<f32>(x + place, (load<f32>(b + place) + linkSum(level, first + one)) * load<f32>(pivot + place));
  }
}
