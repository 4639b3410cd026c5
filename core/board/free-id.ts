/** First of `p1`, `p2`, … that is not taken. */
export function freeId(prefix: string, taken: readonly string[]): string {
  for (let number = 1; ; number++) {
    const id = `${prefix}${number}`;
    if (!taken.includes(id)) return id;
  }
}
