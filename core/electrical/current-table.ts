/**
 * Value at an output current from a table of [current A, value], straight between the points, constant before the first
 * and after the last.
 */
export function atCurrent(table: readonly (readonly [number, number])[], currentA: number): number {
  const after = table.findIndex(([current]) => current >= currentA);
  if (after === 0) return table[0]![1];
  if (after < 0) return table.at(-1)![1];
  const [i0, v0] = table[after - 1]!;
  const [i1, v1] = table[after]!;
  return v0 + ((v1 - v0) * (currentA - i0)) / (i1 - i0);
}
