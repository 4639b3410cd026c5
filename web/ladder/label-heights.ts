/**
 * Heights of labels as near to the wanted ones as they can be without touching, inside a range.
 * @param wanted from the lowest label (largest y) upwards
 * @param apart least distance of two labels
 */
export function labelHeights(wanted: readonly number[], apart: number, top: number, bottom: number): number[] {
  const placed: number[] = [];
  for (const height of wanted) {
    const below = placed.at(-1) ?? bottom + apart;
    placed.push(Math.min(height, below - apart));
  }
  // What was pushed out at the top pushes back down.
  let above = top - apart;
  for (let index = placed.length - 1; index >= 0; index--) {
    placed[index] = Math.max(placed[index]!, above + apart);
    above = placed[index]!;
  }
  return placed;
}
