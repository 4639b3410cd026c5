/** To the nanometre, so that 0.1 + 0.2 stays 0.3 and no minus zero is left. */
export function tidyMm(valueMm: number): number {
  return Math.round(valueMm * 1e6) / 1e6 + 0;
}
