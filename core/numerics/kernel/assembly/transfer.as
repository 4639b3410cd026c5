import * as at from './level';
import { linkSum } from './smooth';

/** Four sums of a coarse row, alternating in colour, go to two places of two cells each. */
@inline
export function storeSplit(target: usize, even: usize, odd: usize, four: v128): void {
  const split = v128.shuffle<f32>(four, four, 0, 2, 1, 3);
  store<u64>(target + even, i64x2.extract_lane(split, 0));
  store<u64>(target + odd, i64x2.extract_lane(split, 1));
}

@inline
function residual(level: usize, p: usize, o: usize, back: usize, row: usize, layer: usize, l: i32, layers: i32): v128 {
  const x = at.unknown(level), e = at.east(level), n = at.north(level), z = at.below(level);
  let s = f32x4.sub(v128.load(at.right(level) + p), f32x4.mul(v128.load(at.diagonal(level) + p), v128.load(x + p)));
  s = f32x4.add(s, f32x4.mul(v128.load(e + o - back), v128.load(x + o - back)));
  s = f32x4.add(s, f32x4.mul(v128.load(e + p), v128.load(x + o + 4 - back)));
  s = f32x4.add(s, f32x4.mul(v128.load(n + o - row), v128.load(x + o - row)));
  s = f32x4.add(s, f32x4.mul(v128.load(n + p), v128.load(x + o + row)));
  if (l > 0) s = f32x4.add(s, f32x4.mul(v128.load(z + p - layer), v128.load(x + p - layer)));
  if (l + 1 < layers) s = f32x4.add(s, f32x4.mul(v128.load(z + p), v128.load(x + p + layer)));
  return s;
}

/** Right side of the coarser level: the residual of this one, summed over 2 × 2 columns, layer by layer. */
export function restrict(level: usize, coarse: usize): void {
  const layers = at.layers(level), rows = at.rows(level), stride = at.stride(level), plane = at.plane(level);
  const coarseRows = at.rows(coarse), coarseStride = at.stride(coarse), coarsePlane = at.plane(coarse);
  const row = <usize>(4 * stride), layer = <usize>(4 * plane), colours = <usize>(4 * layers * plane);
  const target = at.right(coarse);
  for (let J = 0; J < coarseRows; J++) {
    for (let l = 0; l < layers; l++) {
      const even = 4 * (((J & 1) * layers + l) * coarsePlane + J * coarseStride);
      const odd = 4 * (((1 - (J & 1)) * layers + l) * coarsePlane + J * coarseStride);
      for (let k = 0; k < stride; k += 4) {
        let sum = f32x4.splat(0);
        for (let j = 2 * J; j < 2 * J + 2 && j < rows; j++) {
          const p = <usize>(4 * (l * plane + j * stride + k));
          sum = f32x4.add(sum, residual(level, p, p + colours, at.evenRow(j, 0) ? 4 : 0, row, layer, l, layers));
          sum = f32x4.add(sum, residual(level, p + colours, p, at.evenRow(j, 1) ? 4 : 0, row, layer, l, layers));
        }
        storeSplit(target, <usize>(even + 2 * k), <usize>(odd + 2 * k), sum);
      }
    }
  }
  const cells = at.cells(level), coarseCells = at.cells(coarse), extras = at.extras(level);
  const x = at.unknown(level);
  for (let e = 0; e < extras; e++) {
    const place = 4 * <usize>(cells + e);
    const own = load<f32>(at.right(level) + place) - load<f32>(at.diagonal(level) + place) * load<f32>(x + place);
    store<f32>(target + 4 * <usize>(coarseCells + e), own);
  }
  const count = at.linked(level, 0) + at.linked(level, 1) + extras;
  const parent = at.linkParent(level);
  for (let t = 0; t < count; t++) {
    const place = target + 4 * <usize>load<i32>(parent + 4 * t);
    store<f32>(place, load<f32>(place) + linkSum(level, t));
  }
}

/** Adds the coarser level's unknowns to this one's, the same to each 2 × 2 columns. */
export function prolong(level: usize, coarse: usize): void {
  const layers = at.layers(level), rows = at.rows(level), stride = at.stride(level), plane = at.plane(level);
  const coarseStride = at.stride(coarse), coarsePlane = at.plane(coarse);
  const colours = <usize>(4 * layers * plane);
  const x = at.unknown(level), source = at.unknown(coarse);
  for (let j = 0; j < rows; j++) {
    const J = j >> 1;
    for (let l = 0; l < layers; l++) {
      const even = 4 * (((J & 1) * layers + l) * coarsePlane + J * coarseStride);
      const odd = 4 * (((1 - (J & 1)) * layers + l) * coarsePlane + J * coarseStride);
      for (let k = 0; k < stride; k += 4) {
        const two = i64x2(load<i64>(source + <usize>(even + 2 * k)), load<i64>(source + <usize>(odd + 2 * k)));
        const four = v128.shuffle<f32>(two, two, 0, 2, 1, 3);
        const p = x + <usize>(4 * (l * plane + j * stride + k));
        v128.store(p, f32x4.add(v128.load(p), four));
        v128.store(p + colours, f32x4.add(v128.load(p + colours), four));
      }
    }
  }
  const cells = at.cells(level), coarseCells = at.cells(coarse);
  for (let e = 0; e < at.extras(level); e++) {
    const p = x + 4 * <usize>(cells + e);
    store<f32>(p, load<f32>(p) + load<f32>(source + 4 * <usize>(coarseCells + e)));
  }
}
