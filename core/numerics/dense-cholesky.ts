/** Cholesky factor of a dense symmetric positive definite matrix, row-major lower triangle in place; false when it is not. */
export function factorDense(a: Float64Array, n: number): boolean {
  for (let j = 0; j < n; j++) {
    let d = a[j * n + j]!;
    for (let k = 0; k < j; k++) d -= a[j * n + k]! ** 2;
    if (!(d > 0)) return false;
    const root = Math.sqrt(d);
    a[j * n + j] = root;
    for (let i = j + 1; i < n; i++) {
      let s = a[i * n + j]!;
      for (let k = 0; k < j; k++) s -= a[i * n + k]! * a[j * n + k]!;
      a[i * n + j] = s / root;
    }
  }
  return true;
}

/** Solves L·Lᵀ·x = b in place. */
export function solveDense(a: Float64Array, n: number, x: Float64Array) {
  for (let i = 0; i < n; i++) {
    let s = x[i]!;
    for (let k = 0; k < i; k++) s -= a[i * n + k]! * x[k]!;
    x[i] = s / a[i * n + i]!;
  }
  for (let i = n - 1; i >= 0; i--) {
    let s = x[i]!;
    for (let k = i + 1; k < n; k++) s -= a[k * n + i]! * x[k]!;
    x[i] = s / a[i * n + i]!;
  }
}
