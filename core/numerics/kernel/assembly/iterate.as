import * as at from './level';
import { cycle } from './cycle';

/** The finest level in double precision: the matrix that is solved. */
let fine: usize = 0;
let e64: usize = 0;
let n64: usize = 0;
let z64: usize = 0;
let d64: usize = 0;
let g64: usize = 0;
let length: i32 = 0;

export function setMatrix(level: usize, east: usize, north: usize, below: usize, diagonal: usize, linkG: usize, nodes: i32): void {
  fine = level;
  e64 = east;
  n64 = north;
  z64 = below;
  d64 = diagonal;
  g64 = linkG;
  length = nodes;
}

/** Diagonal from conductances and the anchors that stand in its place. */
export function addConductances(): void {
  const layers = at.layers(fine), rows = at.rows(fine), stride = at.stride(fine), plane = at.plane(fine);
  const row = <usize>(8 * stride), layer = <usize>(8 * plane), colours = layers * plane;
  for (let c = 0; c < 2; c++) {
    for (let l = 0; l < layers; l++) {
      for (let j = 0; j < rows; j++) {
        const back: usize = at.evenRow(j, c) ? 8 : 0;
        let p = <usize>(8 * (c * colours + l * plane + j * stride));
        let o = <usize>(8 * ((1 - c) * colours + l * plane + j * stride));
        for (let k = 0; k < stride; k += 2) {
          let d = f64x2.add(v128.load(d64 + p), f64x2.add(v128.load(e64 + p), v128.load(e64 + o - back)));
          d = f64x2.add(d, f64x2.add(v128.load(n64 + p), v128.load(n64 + o - row)));
          d = f64x2.add(d, v128.load(z64 + p));
          if (l > 0) d = f64x2.add(d, v128.load(z64 + p - layer));
          v128.store(d64 + p, d);
          p += 16;
          o += 16;
        }
      }
    }
  }
  const count = at.linked(fine, 0) + at.linked(fine, 1) + at.extras(fine);
  for (let t = 0; t < count; t++) {
    const place = d64 + 8 * <usize>load<i32>(at.linkNode(fine) + 4 * t);
    const end = load<i32>(at.linkStart(fine) + 4 * t + 4);
    for (let q = load<i32>(at.linkStart(fine) + 4 * t); q < end; q++) {
      store<f64>(place, load<f64>(place) + load<f64>(g64 + 8 * q));
    }
  }
}

/** y = A·x. */
export function multiply(x: usize, y: usize): void {
  const layers = at.layers(fine), rows = at.rows(fine), stride = at.stride(fine), plane = at.plane(fine);
  const row = <usize>(8 * stride), layer = <usize>(8 * plane), colours = layers * plane;
  for (let c = 0; c < 2; c++) {
    for (let l = 0; l < layers; l++) {
      for (let j = 0; j < rows; j++) {
        const back: usize = at.evenRow(j, c) ? 8 : 0;
        let p = <usize>(8 * (c * colours + l * plane + j * stride));
        let o = <usize>(8 * ((1 - c) * colours + l * plane + j * stride));
        for (let k = 0; k < stride; k += 2) {
          let s = f64x2.mul(v128.load(d64 + p), v128.load(x + p));
          s = f64x2.sub(s, f64x2.mul(v128.load(e64 + o - back), v128.load(x + o - back)));
          s = f64x2.sub(s, f64x2.mul(v128.load(e64 + p), v128.load(x + o + 8 - back)));
          s = f64x2.sub(s, f64x2.mul(v128.load(n64 + o - row), v128.load(x + o - row)));
          s = f64x2.sub(s, f64x2.mul(v128.load(n64 + p), v128.load(x + o + row)));
          if (l > 0) s = f64x2.sub(s, f64x2.mul(v128.load(z64 + p - layer), v128.load(x + p - layer)));
          if (l + 1 < layers) s = f64x2.sub(s, f64x2.mul(v128.load(z64 + p), v128.load(x + p + layer)));
          v128.store(y + p, s);
          p += 16;
          o += 16;
        }
      }
    }
  }
  const cells = at.cells(fine);
  for (let n = cells; n < length; n++) store<f64>(y + 8 * <usize>n, load<f64>(d64 + 8 * <usize>n) * load<f64>(x + 8 * <usize>n));
  const count = at.linked(fine, 0) + at.linked(fine, 1) + at.extras(fine);
  for (let t = 0; t < count; t++) {
    let s: f64 = 0;
    const end = load<i32>(at.linkStart(fine) + 4 * t + 4);
    for (let q = load<i32>(at.linkStart(fine) + 4 * t); q < end; q++) {
      s += load<f64>(g64 + 8 * q) * load<f64>(x + 8 * <usize>load<i32>(at.linkTo(fine) + 4 * q));
    }
    const place = y + 8 * <usize>load<i32>(at.linkNode(fine) + 4 * t);
    store<f64>(place, load<f64>(place) - s);
  }
}

export function dot(a: usize, b: usize): f64 {
  let s = f64x2.splat(0), t = f64x2.splat(0);
  for (let p: usize = 0; p < 8 * <usize>length; p += 32) {
    s = f64x2.add(s, f64x2.mul(v128.load(a + p), v128.load(b + p)));
    t = f64x2.add(t, f64x2.mul(v128.load(a + p + 16), v128.load(b + p + 16)));
  }
  s = f64x2.add(s, t);
  return f64x2.extract_lane(s, 0) + f64x2.extract_lane(s, 1);
}

/** The V-cycle applied to r; its answer, single precision, stays on the finest level. */
export function precondition(r: usize): void {
  const b = at.right(fine);
  for (let n: usize = 0; n < <usize>length; n += 4) {
    const low = f32x4.demote_f64x2_zero(v128.load(r + 8 * n)), high = f32x4.demote_f64x2_zero(v128.load(r + 8 * n + 16));
    v128.store(b + 4 * n, v128.shuffle<f32>(low, high, 0, 1, 4, 5));
  }
  cycle(0, true);
}

@inline
function answer(n: usize): v128 {
  return f64x2.promote_low_f32x4(v128.load64_zero(at.unknown(fine) + 4 * n));
}

/** z·r with z the answer of the V-cycle. */
export function answerDot(r: usize): f64 {
  let s = f64x2.splat(0);
  for (let n: usize = 0; n < <usize>length; n += 2) s = f64x2.add(s, f64x2.mul(answer(n), v128.load(r + 8 * n)));
  return f64x2.extract_lane(s, 0) + f64x2.extract_lane(s, 1);
}

/** p = z + beta·p. */
export function turn(p: usize, beta: f64): void {
  const factor = f64x2.splat(beta);
  for (let n: usize = 0; n < <usize>length; n += 2) {
    v128.store(p + 8 * n, f64x2.add(answer(n), f64x2.mul(factor, v128.load(p + 8 * n))));
  }
}

/** x += alpha·p, r −= alpha·q; returns r·r. */
export function step(x: usize, r: usize, p: usize, q: usize, alpha: f64): f64 {
  const factor = f64x2.splat(alpha);
  let s = f64x2.splat(0);
  for (let n: usize = 0; n < 8 * <usize>length; n += 16) {
    v128.store(x + n, f64x2.add(v128.load(x + n), f64x2.mul(factor, v128.load(p + n))));
    const left = f64x2.sub(v128.load(r + n), f64x2.mul(factor, v128.load(q + n)));
    v128.store(r + n, left);
    s = f64x2.add(s, f64x2.mul(left, left));
  }
  return f64x2.extract_lane(s, 0) + f64x2.extract_lane(s, 1);
}

/** r = b − A·x; returns r·r. */
export function residual(b: usize, x: usize, r: usize): f64 {
  multiply(x, r);
  let s = f64x2.splat(0);
  for (let n: usize = 0; n < 8 * <usize>length; n += 16) {
    const left = f64x2.sub(v128.load(b + n), v128.load(r + n));
    v128.store(r + n, left);
    s = f64x2.add(s, f64x2.mul(left, left));
  }
  return f64x2.extract_lane(s, 0) + f64x2.extract_lane(s, 1);
}
