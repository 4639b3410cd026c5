import * as at from './level';
import { storeSplit } from './transfer';

/** Conductances of the coarser level: those through summed exactly, those along summed and multiplied by `share` (over-correction). */
export function coarsen(level: usize, coarse: usize, share: f32): void {
  const layers = at.layers(level),
    rows = at.rows(level),
    stride = at.stride(level),
    plane = at.plane(level);
  const coarseRows = at.rows(coarse),
    coarseStride = at.stride(coarse),
    coarsePlane = at.plane(coarse);
  const colours = <usize>(4 * layers * plane),
    factor = f32x4.splat(share);
  for (let J = 0; J < coarseRows; J++) {
    for (let l = 0; l < layers; l++) {
      const even = 4 * (((J & 1) * layers + l) * coarsePlane + J * coarseStride);
      const odd = 4 * (((1 - (J & 1)) * layers + l) * coarsePlane + J * coarseStride);
      for (let k = 0; k < stride; k += 4) {
        let e = f32x4.splat(0),
          n = f32x4.splat(0),
          z = f32x4.splat(0);
        for (let j = 2 * J; j < 2 * J + 2 && j < rows; j++) {
          const p = <usize>(4 * (l * plane + j * stride + k));
          // The face to the next coarse column is that of the cells of odd i.
          e = f32x4.add(e, v128.load(at.east(level) + p + (at.evenRow(j, 0) ? colours : 0)));
          if (j & 1) n = f32x4.add(v128.load(at.north(level) + p), v128.load(at.north(level) + p + colours));
          z = f32x4.add(z, f32x4.add(v128.load(at.below(level) + p), v128.load(at.below(level) + p + colours)));
        }
        const a = <usize>(even + 2 * k),
          b = <usize>(odd + 2 * k);
        storeSplit(at.east(coarse), a, b, f32x4.mul(e, factor));
        storeSplit(at.north(coarse), a, b, f32x4.mul(n, factor));
        storeSplit(at.below(coarse), a, b, z);
      }
    }
  }
}

/** Sums of the anchors on the coarser level. */
export function coarsenAnchor(level: usize, coarse: usize): void {
  const layers = at.layers(level),
    rows = at.rows(level),
    stride = at.stride(level),
    plane = at.plane(level);
  const coarseRows = at.rows(coarse),
    coarseStride = at.stride(coarse),
    coarsePlane = at.plane(coarse);
  const colours = <usize>(4 * layers * plane),
    a = at.anchor(level),
    target = at.anchor(coarse);
  for (let J = 0; J < coarseRows; J++) {
    for (let l = 0; l < layers; l++) {
      const even = 4 * (((J & 1) * layers + l) * coarsePlane + J * coarseStride);
      const odd = 4 * (((1 - (J & 1)) * layers + l) * coarsePlane + J * coarseStride);
      for (let k = 0; k < stride; k += 4) {
        let sum = f32x4.splat(0);
        for (let j = 2 * J; j < 2 * J + 2 && j < rows; j++) {
          const p = a + <usize>(4 * (l * plane + j * stride + k));
          sum = f32x4.add(sum, f32x4.add(v128.load(p), v128.load(p + colours)));
        }
        storeSplit(target, <usize>(even + 2 * k), <usize>(odd + 2 * k), sum);
      }
    }
  }
  const cells = at.cells(level),
    coarseCells = at.cells(coarse);
  for (let e = 0; e < at.extras(level); e++) {
    store<f32>(target + 4 * <usize>(coarseCells + e), load<f32>(a + 4 * <usize>(cells + e)));
  }
}

/** Diagonal and factors of the columns from conductances and anchors; a node without any conductance stands alone with 1. */
export function factor(level: usize): void {
  const layers = at.layers(level),
    rows = at.rows(level),
    stride = at.stride(level),
    plane = at.plane(level);
  const e = at.east(level),
    n = at.north(level),
    z = at.below(level),
    a = at.anchor(level);
  const diagonal = at.diagonal(level),
    pivot = at.pivot(level);
  const row = <usize>(4 * stride),
    layer = <usize>(4 * plane),
    colours = layers * plane;
  const none = f32x4.splat(0),
    one = f32x4.splat(1);
  for (let c = 0; c < 2; c++) {
    for (let j = 0; j < rows; j++) {
      const back: usize = at.evenRow(j, c) ? 4 : 0;
      for (let l = 0; l < layers; l++) {
        let p = <usize>(4 * (c * colours + l * plane + j * stride));
        let o = <usize>(4 * ((1 - c) * colours + l * plane + j * stride));
        for (let k = 0; k < stride; k += 4) {
          let d = f32x4.add(v128.load(a + p), v128.load(e + p));
          d = f32x4.add(d, f32x4.add(v128.load(e + o - back), v128.load(n + p)));
          d = f32x4.add(d, f32x4.add(v128.load(n + o - row), v128.load(z + p)));
          if (l > 0) d = f32x4.add(d, v128.load(z + p - layer));
          v128.store(diagonal + p, d);
          p += 16;
          o += 16;
        }
      }
    }
  }
  const cells = at.cells(level),
    extras = at.extras(level);
  for (let k = 0; k < extras; k++) {
    store<f32>(diagonal + 4 * <usize>(cells + k), load<f32>(a + 4 * <usize>(cells + k)));
  }
  const count = at.linked(level, 0) + at.linked(level, 1) + extras;
  for (let t = 0; t < count; t++) {
    let sum: f32 = 0;
    const end = load<i32>(at.linkStart(level) + 4 * t + 4);
    for (let q = load<i32>(at.linkStart(level) + 4 * t); q < end; q++) sum += load<f32>(at.linkG(level) + 4 * q);
    const place = diagonal + 4 * <usize>load<i32>(at.linkNode(level) + 4 * t);
    store<f32>(place, load<f32>(place) + sum);
  }
  for (let base = 0; base < 2 * colours; base += colours) {
    for (let k = 0; k < plane; k += 4) {
      let previous = none,
        above = none;
      for (let l = 0; l < layers; l++) {
        const p = <usize>(4 * (base + l * plane + k));
        const sum = v128.load(diagonal + p);
        const d = v128.bitselect(sum, one, f32x4.gt(sum, none));
        v128.store(diagonal + p, d);
        previous = f32x4.div(one, f32x4.sub(d, f32x4.mul(f32x4.mul(above, above), previous)));
        v128.store(pivot + p, previous);
        above = v128.load(z + p);
      }
    }
  }
  for (let k = 0; k < extras; k++) {
    const place = 4 * <usize>(cells + k);
    if (!(load<f32>(diagonal + place) > 0)) store<f32>(diagonal + place, 1);
    store<f32>(pivot + place, 1 / load<f32>(diagonal + place));
  }
}
