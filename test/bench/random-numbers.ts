/** Pseudo-random numbers from 0 to 1 of a seed (a 32-bit linear congruential generator with a mixed output): the same on every machine. */
export function randomNumbers(seed: number): () => number {
  let state = seed >>> 0;
  return () => {
    state = (Math.imul(state, 1664525) + 1013904223) >>> 0;
    let mixed = state ^ (state >>> 16);
    mixed = Math.imul(mixed, 0x45d9f3b) >>> 0;
    return ((mixed ^ (mixed >>> 16)) >>> 0) / 2 ** 32;
  };
}
