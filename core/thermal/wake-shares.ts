const steps = 4096;

/** ∫₀ᵛ (1 − s³)^⅓ ds ÷ ∫₀¹ by midpoints: the kernel below after ξ/x = (1 − s³)^{4/3}, which takes its singularity away. */
const integral = (() => {
  const sums = new Float64Array(steps + 1);
  for (let k = 0; k < steps; k++) sums[k + 1] = sums[k]! + Math.cbrt(1 - ((k + 0.5) / steps) ** 3);
  const total = sums[steps]!;
  return sums.map((sum) => sum / total);
})();

/**
 * Share of a wall's rise at x that uniform heat flux between the leading edge and u·x causes, u from 0 to 1.
 *
 * For any flux q(ξ) on a laminar flat plate, Tw(x) − T∞ = (0.623/k)·Pr^−⅓·Re_x^−½ ∫₀ˣ [1 − (ξ/x)^¾]^−⅔ q(ξ) dξ
 * (Kays and Crawford, Convective Heat and Mass Transfer, external laminar flow, from memory; Pr 0.5 to 10, Re_x below 5e5).
 * Uniform q makes the integral 3.533·q·x, hence the local Nu = 0.453·Re^½·Pr^⅓ of uniform flux.
 */
export function wakeShareUpTo(u: number): number {
  const v = Math.cbrt(1 - Math.min(1, Math.max(0, u)) ** 0.75) * steps;
  const k = Math.min(steps - 1, Math.floor(v));
  return 1 - (integral[k]! + (v - k) * (integral[k + 1]! - integral[k]!));
}

/**
 * Shares by equal cells along the flow: entry n·(n + 1)/2 + k is the share of the k-th cell upstream (0: the cell itself) in
 * the rise at the centre of a cell that has n cells upstream; each row sums to 1.
 */
export function wakeShares(longest: number): Float64Array {
  const shares = new Float64Array(((longest + 1) * (longest + 2)) / 2);
  for (let n = 0; n <= longest; n++) {
    let nearer = 1;
    for (let k = 0; k <= n; k++) {
      const farther = wakeShareUpTo((n - k) / (n + 0.5));
      shares[(n * (n + 1)) / 2 + k] = nearer - farther;
      nearer = farther;
    }
  }
  return shares;
}
