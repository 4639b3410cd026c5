/** Number in a sentence: fixed decimals, true minus sign. */
export function fixed(value: number, decimals: number): string {
  return value.toFixed(decimals).replace('-', '−');
}
