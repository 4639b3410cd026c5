/** A share as per cent with one decimal and a true minus sign. */
export const percent = (share: number) => `${share < 0 ? '−' : ''}${Math.abs(100 * share).toFixed(1)} %`;
