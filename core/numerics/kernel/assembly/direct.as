import * as at from './level';

/** Takes a conductance between two places off the lower triangle. */
@inline
function join(dense: usize, rowOf: usize, size: i32, a: i32, b: i32, g: f32): void {
  const r = load<i32>(rowOf + 4 * a), s = load<i32>(rowOf + 4 * b);
  const place = dense + 8 * <usize>(max(r, s) * size + min(r, s));
  store<f64>(place, load<f64>(place) - <f64>g);
}

/**
 * Dense Cholesky factor of the coarsest level, lower triangle by rows in double precision. `index` lists the places of its nodes,
 * `rowOf` is the reverse.
 * @returns whether the matrix is positive definite
 */
export function factorDirect(level: usize, dense: usize, index: usize, rowOf: usize, size: i32): bool {
  memory.fill(dense, 0, 8 * <usize>(size * size));
  const layers = at.layers(level), stride = at.stride(level), plane = at.plane(level), cells = at.cells(level);
  for (let r = 0; r < size; r++) {
    const n = load<i32>(index + 4 * r);
    const d = load<f32>(at.diagonal(level) + 4 * <usize>n);
    store<f64>(dense + 8 * <usize>(r * size + r), d > 0 ? <f64>d : 1);
    if (n >= cells) continue;
    const colour = n / (layers * plane), layer = (n / plane) % layers, j = (n % plane) / stride, k = n % stride;
    const other = ((1 - colour) * layers + layer) * plane + j * stride + k;
    const e = load<f32>(at.east(level) + 4 * <usize>n);
    const north = load<f32>(at.north(level) + 4 * <usize>n), below = load<f32>(at.below(level) + 4 * <usize>n);
    if (e != 0) join(dense, rowOf, size, n, other + 1 - at.evenRow(j, colour), e);
    if (north != 0) join(dense, rowOf, size, n, other + stride, north);
    if (below != 0) join(dense, rowOf, size, n, n + plane, below);
  }
  const count = at.linked(level, 0) + at.linked(level, 1) + at.extras(level);
  for (let t = 0; t < count; t++) {
    const n = load<i32>(at.linkNode(level) + 4 * t), end = load<i32>(at.linkStart(level) + 4 * t + 4);
    for (let q = load<i32>(at.linkStart(level) + 4 * t); q < end; q++) {
      const to = load<i32>(at.linkTo(level) + 4 * q);
      // Each link stands at both of its ends.
      if (n < to) join(dense, rowOf, size, n, to, load<f32>(at.linkG(level) + 4 * q));
    }
  }
  for (let j = 0; j < size; j++) {
    const own = dense + 8 * <usize>(j * size);
    let d = load<f64>(own + 8 * j);
    for (let k = 0; k < j; k++) d -= load<f64>(own + 8 * k) * load<f64>(own + 8 * k);
    if (!(d > 0)) return false;
    const root = sqrt(d);
    store<f64>(own + 8 * j, root);
    for (let i = j + 1; i < size; i++) {
      const line = dense + 8 * <usize>(i * size);
      let s = load<f64>(line + 8 * j);
      for (let k = 0; k < j; k++) s -= load<f64>(line + 8 * k) * load<f64>(own + 8 * k);
      store<f64>(line + 8 * j, s / root);
    }
  }
  return true;
}

/** Solves on the coarsest level: its right side to its unknowns. */
export function solveDirect(level: usize, dense: usize, index: usize, size: i32, work: usize): void {
  for (let i = 0; i < size; i++) {
    const line = dense + 8 * <usize>(i * size);
    let s = <f64>load<f32>(at.right(level) + 4 * <usize>load<i32>(index + 4 * i));
    for (let k = 0; k < i; k++) s -= load<f64>(line + 8 * k) * load<f64>(work + 8 * k);
    store<f64>(work + 8 * i, s / load<f64>(line + 8 * i));
  }
  for (let i = size - 1; i >= 0; i--) {
    const line = dense + 8 * <usize>(i * size);
    const value = load<f64>(work + 8 * i) / load<f64>(line + 8 * i);
    store<f64>(work + 8 * i, value);
    for (let k = 0; k < i; k++) store<f64>(work + 8 * k, load<f64>(work + 8 * k) - load<f64>(line + 8 * k) * value);
    store<f32>(at.unknown(level) + 4 * <usize>load<i32>(index + 4 * i), <f32>value);
  }
}
