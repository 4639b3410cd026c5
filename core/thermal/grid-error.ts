/**
 * Grid convergence index after Roache (J. Fluids Eng. 116 (1994) 405) for a refinement ratio of 2.
 * @param values of the same rise on the production grid and on one or two grids 2 and 4 times coarser, K
 * @returns band around the production value, K: safety factor 1.25 where three grids show an order between 0.5 and 3,
 * else factor 3 with order 1
 */
export function gridError(values: readonly number[]): number {
  const [fine, medium, coarse] = values;
  if (fine === undefined || medium === undefined) return NaN;
  const near = Math.abs(medium - fine);
  if (coarse !== undefined) {
    const order = Math.log2(Math.abs((coarse - medium) / (medium - fine)));
    if ((coarse - medium) * (medium - fine) > 0 && order >= 0.5 && order <= 3) return (1.25 * near) / (2 ** order - 1);
  }
  return 3 * near;
}
